import { expect, it } from 'vitest';
import { markedPoints } from '../../../../src/figure/front/curve.js';

it('marks stand at the loose end and well apart from it on', () => {
  const points = Array.from({ length: 41 }, (_, i) => ({ x: 10 * i, y: 400 - 10 * i }));
  const marked = markedPoints(points, 3);
  expect(marked[0]).toBe(40);
  for (const [at, index] of marked.slice(1).entries()) {
    const [here, before] = [points[index]!, points[marked[at]!]!];
    expect(Math.hypot(here.x - before.x, here.y - before.y)).toBeGreaterThanOrEqual(44);
  }
  expect(marked.length).toBeGreaterThan(8);
});

it('marks stand at the end alone where there are many lines', () => {
  const points = Array.from({ length: 41 }, (_, i) => ({ x: 10 * i, y: 0 }));
  expect(markedPoints(points, 40)).toEqual([40]);
  expect(markedPoints([], 40)).toEqual([]);
});
