import type { Area } from './mapSheet.js';
import type { Point } from './point.js';

/** The pieces of a line that lie in a rectangle. */
export function clipped(line: readonly Point[], area: Area): readonly (readonly Point[])[] {
  const pieces: Point[][] = [];
  let last: Point | null = null;
  for (let i = 0; i + 1 < line.length; i++) {
    const seen = clippedSegment(line[i] as Point, line[i + 1] as Point, area);
    if (seen === null) continue;
    const [from, to] = seen;
    const piece = pieces[pieces.length - 1];
    if (piece !== undefined && last !== null && from.x === last.x && from.y === last.y) piece.push(to);
    else pieces.push([from, to]);
    last = to;
  }
  return pieces;
}

/** Liang & Barsky 1984, from memory. */
function clippedSegment(p: Point, q: Point, { left, top, right, bottom }: Area): readonly [Point, Point] | null {
  const [dx, dy] = [q.x - p.x, q.y - p.y];
  let [s0, s1] = [0, 1];
  const sides: readonly (readonly [number, number])[] = [
    [-dx, p.x - left],
    [dx, right - p.x],
    [-dy, p.y - top],
    [dy, bottom - p.y],
  ];
  for (const [slope, room] of sides) {
    if (slope === 0 && room < 0) return null;
    if (slope < 0) s0 = Math.max(s0, room / slope);
    if (slope > 0) s1 = Math.min(s1, room / slope);
  }
  if (s0 >= s1) return null;
  const on = (s: number): Point => ({ x: p.x + s * dx, y: p.y + s * dy });
  return [s0 === 0 ? p : on(s0), s1 === 1 ? q : on(s1)];
}
