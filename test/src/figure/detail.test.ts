import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DETAIL_WALL, detailFactor, wallDetail, wallFaces } from '../../../src/figure/detail.js';

const glass = { x: 218, y: 58, r: 46 };

function points(d: string): [number, number][] {
  return Array.from(d.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g), ([, x, y]) => [Number(x), Number(y)]);
}

describe('detailFactor', () => {
  it('shows any wall from a hundredth of a pixel to a hundred pixels 18 to 30 px thick', () => {
    fc.assert(
      fc.property(fc.double({ min: -2, max: 2, noNaN: true }), (power) => {
        const wall = 10 ** power;
        const seen = detailFactor(wall) * wall;
        expect(seen).toBeGreaterThanOrEqual(DETAIL_WALL.least);
        expect(seen).toBeLessThanOrEqual(DETAIL_WALL.most);
      }),
    );
  });

  it.each([
    [2.2, 10],
    [22, 1],
    [11.4, 2],
    [0.19, 120],
  ])('is easily said: a wall of %d px is drawn %d times as large', (wall, factor) => {
    expect(detailFactor(wall)).toBe(factor);
  });
});

describe('wallDetail', () => {
  it('hatches what is material inside the glass, and nothing else', () => {
    const detail = { glass, wall: 22, outerRadius: 560 };
    const { inner, outer } = wallFaces(detail);
    expect(outer.x - inner.x).toBe(22);
    const axis = outer.x - 560;
    const [hatching] = wallDetail(detail);
    const ends = hatching?.kind === 'path' ? points(hatching.d) : [];
    expect(ends.length).toBeGreaterThan(20);
    for (const [x, y] of ends) {
      const radius = Math.hypot(x - axis, y - glass.y);
      expect(radius).toBeLessThanOrEqual(560.02);
      expect(radius).toBeGreaterThanOrEqual(537.98);
      expect(Math.hypot(x - glass.x, y - glass.y)).toBeLessThanOrEqual(glass.r + 0.02);
    }
  });

  it('draws both faces from rim to rim, and one where there is no bore', () => {
    const arcs = (wall: number, outerRadius: number) =>
      wallDetail({ glass, wall, outerRadius }).filter((shape) => shape.kind === 'path' && shape.d.includes('A'));
    expect(arcs(22, 560)).toHaveLength(2);
    expect(arcs(28, 28)).toHaveLength(0);
    for (const arc of arcs(22, 560)) {
      const [, x = '', y = ''] = /^M(-?[\d.]+) (-?[\d.]+)A/.exec(arc.kind === 'path' ? arc.d : '') ?? [];
      expect(Math.hypot(Number(x) - glass.x, Number(y) - glass.y)).toBeCloseTo(glass.r, 1);
    }
  });
});
