import type { DesignMap } from '../sizing/map.js';
import type { Shape } from './figure.js';
import { hatchStrokes } from './hatch.js';
import type { MapSheet } from './mapSheet.js';
import { type Point, polyline } from './point.js';

/** Distance between strokes of the region, px across. */
const PITCH = 7;

/** The region's rings on the sheet. */
export function ringsOf({ region }: DesignMap, sheet: MapSheet): readonly (readonly Point[])[] {
  return region.map(({ points }) => points.map((size) => sheet.at(size)));
}

/** The region where every limit holds: a faint ground, hatched at 45 degrees. Rings of holes run the other way round. */
export function regionShapes(rings: readonly (readonly Point[])[]): readonly Shape[] {
  if (rings.length === 0) return [];
  const strokes = hatchStrokes(rings, PITCH).map((stroke) => polyline(stroke));
  return [
    { kind: 'path', d: rings.map((ring) => polyline(ring, true)).join(''), fill: 'faintFill' },
    { kind: 'path', d: strokes.join(''), line: 'hair', width: 0.9 },
  ];
}
