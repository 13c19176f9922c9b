import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Polygon } from '../../../src/sizing/polygon.js';
import { real } from './jobs.js';

function square(): Polygon {
  const polygon = new Polygon(20);
  polygon.rectangle(0, 2, 0, 1);
  return polygon;
}

function corners({ x, y, count }: Polygon): [number, number][] {
  return Array.from({ length: count }, (_, i) => [x[i]!, y[i]!]);
}

/** Shoelace formula. */
function area(polygon: Polygon): number {
  const all = corners(polygon);
  const twice = all.map(([x, y], i) => {
    const [nextX, nextY] = all[(i + 1) % all.length]!;
    return x * nextY - nextX * y;
  });
  return twice.reduce((sum, part) => sum + part, 0) / 2;
}

describe('a polygon', () => {
  it('begins as a rectangle, anticlockwise', () => {
    expect(corners(square())).toEqual([
      [0, 0],
      [2, 0],
      [2, 1],
      [0, 1],
    ]);
    expect(area(square())).toBe(2);
  });

  it('keeps the side where a·x + b·y ≤ c', () => {
    const polygon = square();
    expect(polygon.cut(1, 1, 1)).toBe(true);
    expect(area(polygon)).toBeCloseTo(0.5, 15);
    expect(Math.max(...corners(polygon).map(([x, y]) => x + y))).toBeCloseTo(1, 15);
  });

  it('stays whole under a cut that misses it, and goes under one that takes all', () => {
    const polygon = square();
    expect(polygon.cut(1, 0, 3)).toBe(true);
    expect(polygon.count).toBe(4);
    expect(polygon.cut(1, 0, -1e-9)).toBe(false);
    expect(polygon.count).toBe(0);
    expect(polygon.cut(1, 0, 5)).toBe(false);
  });

  it('keeps an edge that a cut only touches', () => {
    const polygon = square();
    expect(polygon.cut(-1, 0, -2)).toBe(true);
    expect(corners(polygon).every(([x]) => x === 2)).toBe(true);
    expect(area(polygon)).toBe(0);
  });

  it('drops nothing for a cut that is not a number', () => {
    const polygon = square();
    expect(polygon.cut(Number.NaN, 1, 0)).toBe(true);
    expect(polygon.cut(1, 1, Number.POSITIVE_INFINITY)).toBe(true);
    expect(area(polygon)).toBe(2);
  });

  it('can be begun again after it has gone', () => {
    const polygon = square();
    polygon.cut(1, 0, -1);
    polygon.rectangle(-1, 1, -1, 1);
    expect(area(polygon)).toBe(4);
  });

  it('finds its lowest corner', () => {
    const polygon = square();
    expect(corners(polygon)[polygon.lowest(1, 2)]).toEqual([0, 0]);
    expect(corners(polygon)[polygon.lowest(-1, 2)]).toEqual([2, 0]);
    expect(corners(polygon)[polygon.lowest(-1, -2)]).toEqual([2, 1]);
  });

  it('holds exactly the points that all its cuts hold', () => {
    const cuts = fc.array(fc.tuple(real(-1, 1), real(-1, 1), real(-0.5, 2)), { maxLength: 12 });
    const agrees = fc.property(cuts, real(0, 2), real(0, 1), (all, px, py) => {
      const polygon = square();
      const left = all.every(([a, b, c]) => polygon.cut(a, b, c));
      const held = all.every(([a, b, c]) => a * px + b * py <= c - 1e-12);
      if (held) expect(left).toBe(true);
      // of a point that is held, every cut through it leaves something on either side, within rounding
      for (const [a, b] of [
        [1, 0],
        [0, 1],
        [1, 1],
        [1, -1],
      ] as const) {
        const values = corners(polygon).map(([x, y]) => a * x + b * y);
        if (!held) continue;
        expect(Math.min(...values)).toBeLessThanOrEqual(a * px + b * py + 1e-9);
        expect(Math.max(...values)).toBeGreaterThanOrEqual(a * px + b * py - 1e-9);
      }
      for (const [x, y] of corners(polygon)) {
        for (const [a, b, c] of left ? all : []) expect(a * x + b * y).toBeLessThanOrEqual(c + 1e-9);
      }
    });
    fc.assert(agrees, { numRuns: 500, seed: 8, endOnFailure: true });
  });
});
