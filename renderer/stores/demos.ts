import { defineStore } from 'pinia';
import { shallowRef } from 'vue';
import type { JobDocument } from '../job/keyPath.js';

/** The jobs that ship with the app for a first look, the one to show first leading. */
export const useDemos = defineStore('demos', () => ({ list: shallowRef<readonly JobDocument[]>([]) }));
