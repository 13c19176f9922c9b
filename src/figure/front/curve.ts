import type { FrontPoint } from '../../report/report.js';
import type { Mark } from '../marker.js';

/** A point of a front on the drawing. */
export interface DrawnPoint {
  readonly point: FrontPoint;
  /** what mass is traded against, in shown units */
  readonly value: number;
  /** in shown units */
  readonly mass: number;
  /** px */
  readonly x: number;
  readonly y: number;
}

/** One material's front, from the tightest point to the loosest. */
export interface Curve {
  readonly material: string;
  readonly name: string;
  readonly mark: Mark;
  readonly points: readonly DrawnPoint[];
  /** indices of the points that carry the material's mark: the loosest first, the others in turn well apart */
  readonly marked: readonly number[];
  /** folded into its family's band */
  readonly folded: boolean;
}

/** Marks along a line stand at least so far apart, px. */
const APART = 44;

/** Whether a stretch of a curve, from a point to the next, is beaten by no other material. */
export function isStrong({ points }: Pick<Curve, 'points'>, index: number): boolean {
  const [here, next] = [points[index], points[index + 1]];
  return here?.point.dominated === false && next?.point.dominated === false;
}

/** Above so many lines each has its mark at its end alone: more would hide the lines. */
const MANY = 12;

/**
 * Where the marks of a line stand, the loosest end first.
 * @param lines how many lines the drawing has
 */
export function markedPoints(points: readonly Pick<DrawnPoint, 'x' | 'y'>[], lines: number): readonly number[] {
  if (lines > MANY) return points.length === 0 ? [] : [points.length - 1];
  const marked: number[] = [];
  let last: Pick<DrawnPoint, 'x' | 'y'> | null = null;
  for (let index = points.length - 1; index >= 0; index -= 1) {
    const point = points[index]!;
    if (last !== null && Math.hypot(point.x - last.x, point.y - last.y) < APART) continue;
    marked.push(index);
    last = point;
  }
  return marked;
}
