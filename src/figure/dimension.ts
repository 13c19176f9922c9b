import type { PathShape } from './figure.js';
import { type Point, polyline } from './point.js';

/** A slender filled arrowhead, px. */
const HEAD = { length: 6, breadth: 3.8 } as const;

/** Weight of dimension lines and of the thinner lines that lead to them, px. */
export const DIMENSION_WIDTH = 0.8;

/** Room on either side of the figure in its gap, px. */
export const GAP_MARGIN = 5;

/** A filled arrowhead with its point at `tip`, coming from the side of `tail`. */
export function arrowhead(tip: Point, tail: Point): PathShape {
  const length = Math.hypot(tip.x - tail.x, tip.y - tail.y);
  const along = { x: (tail.x - tip.x) / length, y: (tail.y - tip.y) / length };
  const barb = (side: number): Point => ({
    x: tip.x + along.x * HEAD.length - along.y * side * (HEAD.breadth / 2),
    y: tip.y + along.y * HEAD.length + along.x * side * (HEAD.breadth / 2),
  });
  return { kind: 'path', d: polyline([tip, barb(1), barb(-1)], true), fill: 'ink' };
}

/** A thin straight line of a dimension. */
export function dimensionLine(from: Point, to: Point): PathShape {
  return { kind: 'path', d: polyline([from, to]), line: 'ink', width: DIMENSION_WIDTH };
}

/** A thin line that leads from the outline to a dimension, or from a detail to its place. */
export function extensionLine(from: Point, to: Point): PathShape {
  return { kind: 'path', d: polyline([from, to]), line: 'ink2', width: 0.7 };
}

/** A dimension line from arrow to arrow with a gap for its figure about the place `at` (0 to 1 on the way). */
export function brokenDimension(from: Point, to: Point, at: number, gap: number): readonly PathShape[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const on = (distance: number): Point => ({
    x: from.x + ((to.x - from.x) * distance) / length,
    y: from.y + ((to.y - from.y) * distance) / length,
  });
  return [
    dimensionLine(from, on(at * length - gap / 2)),
    dimensionLine(on(at * length + gap / 2), to),
    arrowhead(from, to),
    arrowhead(to, from),
  ];
}
