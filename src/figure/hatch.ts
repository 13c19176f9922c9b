import type { Point } from './point.js';

/** Strokes at 45 degrees, rising to the right, over the inside of rings (inside an odd number of them), px apart across. */
export function hatchStrokes(
  rings: readonly (readonly Point[])[],
  pitch: number,
): readonly (readonly [Point, Point])[] {
  const apart = pitch * Math.SQRT2;
  const sums = rings.flatMap((ring) => ring.map(({ x, y }) => x + y));
  if (sums.length === 0) return [];
  const first = Math.ceil(Math.min(...sums) / apart);
  const last = Math.floor(Math.max(...sums) / apart);
  const strokes: (readonly [Point, Point])[] = [];
  for (let i = first; i <= last; i++) {
    const sum = i * apart;
    const xs = rings.flatMap((ring) => meetings(ring, sum)).sort((a, b) => a - b);
    for (let k = 0; k + 1 < xs.length; k += 2) {
      const [a, b] = [xs[k] as number, xs[k + 1] as number];
      if (b - a > 1)
        strokes.push([
          { x: a, y: sum - a },
          { x: b, y: sum - b },
        ]);
    }
  }
  return strokes;
}

/** Where the line x + y = sum meets a ring, by x. */
function meetings(ring: readonly Point[], sum: number): number[] {
  return ring.flatMap((p, i) => {
    const q = ring[(i + 1) % ring.length] as Point;
    const [a, b] = [p.x + p.y - sum, q.x + q.y - sum];
    return a > 0 === b > 0 ? [] : [p.x + (a / (a - b)) * (q.x - p.x)];
  });
}

/** Whether a place lies inside an odd number of rings. */
export function isInside({ x, y }: Point, rings: readonly (readonly Point[])[]): boolean {
  let odd = false;
  for (const ring of rings) {
    for (let i = 0; i < ring.length; i++) {
      const [p, q] = [ring[i] as Point, ring[(i + 1) % ring.length] as Point];
      if (p.y > y !== q.y > y && x < p.x + ((y - p.y) / (q.y - p.y)) * (q.x - p.x)) odd = !odd;
    }
  }
  return odd;
}
