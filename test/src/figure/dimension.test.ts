import { describe, expect, it } from 'vitest';
import { arrowhead, brokenDimension } from '../../../src/figure/dimension.js';
import type { PathShape } from '../../../src/figure/figure.js';

function points({ d }: PathShape): [number, number][] {
  return Array.from(d.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g), ([, x, y]) => [Number(x), Number(y)]);
}

describe('arrowhead', () => {
  it('is filled and slender, 6 long and 3.8 broad, its point at the tip', () => {
    const head = arrowhead({ x: 10, y: 20 }, { x: 50, y: 20 });
    expect(points(head)).toEqual([
      [10, 20],
      [16, 21.9],
      [16, 18.1],
    ]);
    expect(head).toMatchObject({ fill: 'ink' });
    expect(head.line).toBeUndefined();
  });

  it('turns with its line', () => {
    const [, one = [0, 0], other = [0, 0]] = points(arrowhead({ x: 0, y: 0 }, { x: 3, y: 4 }));
    expect(Math.hypot(one[0] - other[0], one[1] - other[1])).toBeCloseTo(3.8, 1);
    expect((one[0] + other[0]) / 2).toBeCloseTo(3.6, 1);
    expect((one[1] + other[1]) / 2).toBeCloseTo(4.8, 1);
  });
});

describe('brokenDimension', () => {
  it('leaves a gap about the place of its figure, with an arrow at each end', () => {
    const [first, second, ...heads] = brokenDimension({ x: 0, y: 5 }, { x: 100, y: 5 }, 0.25, 20);
    expect(points(first!)).toEqual([
      [0, 5],
      [15, 5],
    ]);
    expect(points(second!)).toEqual([
      [35, 5],
      [100, 5],
    ]);
    expect(heads.map((head) => points(head)[0])).toEqual([
      [0, 5],
      [100, 5],
    ]);
  });
});
