import { describe, expect, it } from 'vitest';
import { hatchStrokes, isInside } from '../../../src/figure/hatch.js';

const square = (at: number, size: number) => [
  { x: at, y: at },
  { x: at + size, y: at },
  { x: at + size, y: at + size },
  { x: at, y: at + size },
];

describe('hatching', () => {
  const rings = [square(0.1, 100), square(30.1, 40)];

  it('lies inside, clear of holes, at 45 degrees and evenly apart', () => {
    const strokes = hatchStrokes(rings, 7);
    expect(strokes.length).toBeGreaterThan(20);
    for (const [a, b] of strokes) {
      expect(b.x - a.x).toBeCloseTo(a.y - b.y, 9);
      expect(isInside({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 }, rings)).toBe(true);
      expect((a.x + a.y) / (7 * Math.SQRT2)).toBeCloseTo(Math.round((a.x + a.y) / (7 * Math.SQRT2)), 9);
    }
  });

  it('covers an area of its pitch times its length', () => {
    const length = hatchStrokes(rings, 2).reduce((sum, [a, b]) => sum + Math.hypot(b.x - a.x, b.y - a.y), 0);
    expect(length * 2).toBeGreaterThan(0.97 * (100 * 100 - 40 * 40));
    expect(length * 2).toBeLessThan(1.03 * (100 * 100 - 40 * 40));
  });

  it('is nothing where there is no ring', () => {
    expect(hatchStrokes([], 7)).toEqual([]);
  });
});
