import type { Point } from './point.js';

/** A place on a line and which way the line goes there, of length 1. */
export interface Along extends Point {
  readonly dx: number;
  readonly dy: number;
}

/** A line by the length along it, px. */
export class Walked {
  readonly length: number;
  private readonly lengths: readonly number[];

  constructor(readonly points: readonly Point[]) {
    const lengths = [0];
    for (let i = 1; i < points.length; i++) {
      const [p, q] = [points[i - 1] as Point, points[i] as Point];
      lengths.push((lengths[i - 1] as number) + Math.hypot(q.x - p.x, q.y - p.y));
    }
    this.lengths = lengths;
    this.length = lengths[lengths.length - 1] ?? 0;
  }

  /** The place so far along. */
  at(distance: number): Along {
    const { lengths, points } = this;
    let [low, high] = [0, points.length - 1];
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if ((lengths[middle] as number) <= distance) low = middle;
      else high = middle;
    }
    const [p, q] = [points[low] as Point, points[high] as Point];
    const length = Math.max((lengths[high] as number) - (lengths[low] as number), 1e-9);
    const [dx, dy] = [(q.x - p.x) / length, (q.y - p.y) / length];
    const on = distance - (lengths[low] as number);
    return { x: p.x + on * dx, y: p.y + on * dy, dx, dy };
  }

  /** Places at a pitch, from half a pitch on. */
  every(pitch: number): readonly Along[] {
    const count = Math.floor(this.length / pitch + 0.5);
    return Array.from({ length: count }, (_, i) => this.at(Math.min((i + 0.5) * pitch, this.length)));
  }
}

/** Length and pitch of the strokes on the side of a limit that is not allowed, px. */
const STROKE = { length: 5, pitch: 7 } as const;

/** Short strokes at 45 degrees to a limit, on its left as y goes up: the side that is not allowed. */
export function forbiddenStrokes(line: Walked): readonly (readonly [Point, Point])[] {
  const reach = STROKE.length * Math.SQRT1_2;
  return line.every(STROKE.pitch).map(({ x, y, dx, dy }) => [
    { x, y },
    { x: x + reach * (dy + dx), y: y + reach * (dy - dx) },
  ]);
}
