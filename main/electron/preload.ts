import { contextBridge, ipcRenderer } from 'electron';
import { exposedTo } from './exposed.js';

contextBridge.exposeInMainWorld('wringwall', exposedTo(ipcRenderer));
