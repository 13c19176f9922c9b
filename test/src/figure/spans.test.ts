import { describe, expect, it } from 'vitest';
import { insideCircle, shared, without } from '../../../src/figure/spans.js';

describe('insideCircle', () => {
  const line = { x: 0, y: 0, dx: 1, dy: 0 };

  it('is the chord of a circle that the line crosses', () => {
    expect(insideCircle(line, { x: 10, y: 3, r: 5 })).toEqual([6, 14]);
    expect(insideCircle(line, { x: 10, y: -3, r: 5 })).toEqual([6, 14]);
  });

  it('is nothing where the line misses or touches, or the circle is none', () => {
    expect(insideCircle(line, { x: 10, y: 6, r: 5 })).toBeNull();
    expect(insideCircle(line, { x: 10, y: 5, r: 5 })).toBeNull();
    expect(insideCircle(line, { x: 10, y: 0, r: -5 })).toBeNull();
  });
});

describe('stretches', () => {
  it('share what lies in both', () => {
    expect(shared([0, 4], [2, 6])).toEqual([2, 4]);
    expect(shared([0, 2], [2, 6])).toBeNull();
    expect(shared(null, [2, 6])).toBeNull();
  });

  it('without another are none, one or two', () => {
    expect(without([0, 10], [4, 6])).toEqual([
      [0, 4],
      [6, 10],
    ]);
    expect(without([0, 10], [-1, 6])).toEqual([[6, 10]]);
    expect(without([0, 10], [-1, 11])).toEqual([]);
    expect(without([0, 10], null)).toEqual([[0, 10]]);
    expect(without(null, [4, 6])).toEqual([]);
  });
});
