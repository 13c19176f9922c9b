import type { Component } from 'vue';
import FrontStation from '../front/FrontStation.vue';
import LineUpStation from '../lineup/LineUpStation.vue';
import WallMapStation from '../map/WallMapStation.vue';
import PickStation from '../pick/PickStation.vue';

/*
 * The wall map's station is wired in here and nowhere else: its component in place of null gives it the middle's lower
 * half, the number 3, and moves pick and line-up to 4 and 5.
 */
export const WALL_MAP: Component | null = WallMapStation;

/** A station beside the brief. */
export interface Station {
  readonly area: 'front' | 'map' | 'pick' | 'lineup';
  readonly component: Component;
  /** its key with Alt */
  readonly number: number;
}

/** The stations beside the brief, by number; the brief is 1. */
export function stationsWith(wallMap: Component | null): readonly Station[] {
  const all: readonly (readonly [Station['area'], Component | null])[] = [
    ['front', FrontStation],
    ['map', wallMap],
    ['pick', PickStation],
    ['lineup', LineUpStation],
  ];
  return all
    .flatMap(([area, component]) => (component === null ? [] : [{ area, component }]))
    .map((station, index) => ({ ...station, number: index + 2 }));
}

/** In one column the answer comes before the drawings. */
export function inOneColumn(stations: readonly Station[]): readonly Station[] {
  return [...stations.filter(({ area }) => area === 'pick'), ...stations.filter(({ area }) => area !== 'pick')];
}
