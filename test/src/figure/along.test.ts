import { describe, expect, it } from 'vitest';
import { forbiddenStrokes, Walked } from '../../../src/figure/along.js';

describe('a line by its length', () => {
  const line = new Walked([
    { x: 0, y: 0 },
    { x: 3, y: 4 },
    { x: 3, y: 14 },
  ]);

  it('knows where it is and which way it goes', () => {
    expect(line.length).toBe(15);
    expect(line.at(2.5)).toEqual({ x: 1.5, y: 2, dx: 0.6, dy: 0.8 });
    expect(line.at(10)).toEqual({ x: 3, y: 9, dx: 0, dy: 1 });
  });

  it('gives places at a pitch', () => {
    expect(line.every(5).map(({ y }) => y)).toEqual([2, 6.5, 11.5]);
  });
});

describe('strokes of a limit', () => {
  it('are 5 px long, 7 px apart and at 45 degrees, on the left as y goes up', () => {
    const strokes = forbiddenStrokes(
      new Walked([
        { x: 0, y: 100 },
        { x: 70, y: 100 },
      ]),
    );
    expect(strokes.map(([from]) => from.x)).toEqual([3.5, 10.5, 17.5, 24.5, 31.5, 38.5, 45.5, 52.5, 59.5, 66.5]);
    for (const [from, to] of strokes) {
      expect(Math.hypot(to.x - from.x, to.y - from.y)).toBeCloseTo(5, 12);
      expect(from.y - to.y).toBeCloseTo(Math.abs(to.x - from.x), 12);
    }
  });
});
