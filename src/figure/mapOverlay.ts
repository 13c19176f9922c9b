import type { MapCurve } from '../sizing/map.js';
import type { Figure, Label, Shape } from './figure.js';
import { captionLabel, dimensionLabel, textWidth } from './label.js';
import { piecesOf } from './mapCurves.js';
import type { Area, MapSheet } from './mapSheet.js';
import { type Point, polyline } from './point.js';

/** How near the pointer must be to a curve to be on it, px. */
const NEAR = 9;
/** Weight of the curve under the pointer, px: a curve that is strong already is made stronger. */
const WIDTH = { closing: 2.4, other: 1.6 } as const;
const SIZE = 11;
const LINE = 14;
/** How far a note lies from its place, px. */
const AWAY = { x: 14, y: 12 } as const;
const RADIUS = 3.6;

/** A place on the map with what is said of it, a line each; the first is a value, the rest are words. */
export interface MapNote {
  readonly at: Point;
  readonly lines: readonly string[];
}

/** What lies over a wall map while it is used. */
export interface MapOverlay {
  /** the curve under the pointer */
  readonly curve: MapCurve | null;
  readonly pointer: MapNote | null;
  readonly trial: MapNote | null;
}

/** The curve that the pointer is on, or null. */
export function curveAt(curves: readonly MapCurve[], sheet: MapSheet, { x, y }: Point): MapCurve | null {
  let [best, least]: [MapCurve | null, number] = [null, NEAR];
  for (const curve of curves) {
    for (const { points } of piecesOf(curve, sheet)) {
      for (let i = 0; i + 1 < points.length; i++) {
        const away = distance(x, y, points[i] as Point, points[i + 1] as Point);
        if (away < least) [best, least] = [curve, away];
      }
    }
  }
  return best;
}

function distance(x: number, y: number, p: Point, q: Point): number {
  const [dx, dy] = [q.x - p.x, q.y - p.y];
  const length = dx * dx + dy * dy;
  const s = length === 0 ? 0 : Math.min(Math.max(((x - p.x) * dx + (y - p.y) * dy) / length, 0), 1);
  return Math.hypot(x - p.x - s * dx, y - p.y - s * dy);
}

/** The curve under the pointer made strong, what the pointer is at, and the tube on trial with hairlines to both axes. */
export function overlayFigure({ curve, pointer, trial }: MapOverlay, sheet: MapSheet): Figure {
  const notes = [trial, pointer].filter((note) => note !== null);
  const placed = notes.map((note, i) => noteAt(note, sheet.plot, i > 0 ? (notes[0] as MapNote) : null));
  return {
    width: sheet.width,
    height: sheet.height,
    description: '',
    shapes: [
      ...(curve === null ? [] : strong(curve, sheet)),
      ...(trial === null ? [] : trialMark(trial.at, sheet.plot)),
      ...placed.map(({ ground }) => ground),
    ],
    labels: placed.flatMap(({ labels }) => labels),
  };
}

function strong(curve: MapCurve, sheet: MapSheet): readonly Shape[] {
  const width = curve.closing ? WIDTH.closing : WIDTH.other;
  return piecesOf(curve, sheet).map(({ points }) => ({ kind: 'path', d: polyline(points), line: 'ink', width }));
}

function trialMark({ x, y }: Point, { left, bottom }: Area): readonly Shape[] {
  const hairs = polyline([
    { x: left, y },
    { x, y },
    { x, y: bottom },
  ]);
  return [
    { kind: 'path', d: hairs, line: 'ink', width: 0.8, stroke: 'dotted' },
    { kind: 'circle', x, y, r: RADIUS, line: 'ink', fill: 'ink', width: 1.2 },
  ];
}

interface PlacedNote {
  readonly ground: Shape;
  readonly labels: readonly Label[];
}

/** A note beside its place, on paper, inside the plot; of two at one place the second goes to the other side. */
function noteAt({ at, lines }: MapNote, { left, top, right, bottom }: Area, other: MapNote | null): PlacedNote {
  const width = Math.max(...lines.map((text, i) => textWidth(text, SIZE, i === 0 ? 'mono' : 'sans'))) + 8;
  const height = LINE * lines.length + 4;
  const beside = at.x + AWAY.x + width <= right + 40 ? at.x + AWAY.x : at.x - AWAY.x - width;
  const over = at.y - AWAY.y - height;
  const under = at.y + AWAY.y;
  const close = other !== null && Math.abs(other.at.x - at.x) < width && Math.abs(other.at.y - at.y) < 2 * height;
  const above = close ? at.y < other.at.y : true;
  const y = Math.min(Math.max(above && over >= top ? over : under, top), bottom - height);
  const x = Math.max(beside, left + 2);
  const corners = [
    { x, y },
    { x: x + width, y },
    { x: x + width, y: y + height },
    { x, y: y + height },
  ];
  const labels = lines.map((text, i) => {
    const base = y + LINE * (i + 1) - 2;
    return i === 0
      ? dimensionLabel(text, x + 4, base, { anchor: 'start', size: SIZE })
      : captionLabel(text, x + 4, base, { anchor: 'start', size: SIZE, tone: 'ink' });
  });
  return { ground: { kind: 'path', d: polyline(corners, true), fill: 'paper', line: 'hair', width: 0.8 }, labels };
}
