import { expect, it } from 'vitest';
import { frontFigure } from '../../../../src/figure/front.js';
import { bandsOf, heightAt } from '../../../../src/figure/front/bands.js';
import { inputOf, measure, reportOf } from './fronts.js';

const LINE = [
  { x: 10, y: 100 },
  { x: 20, y: 60 },
  { x: 40, y: 50 },
];

it('a line has a height between its ends alone', () => {
  expect([5, 10, 15, 20, 30, 40, 41].map((x) => heightAt(LINE, x))).toEqual([null, 100, 80, 60, 55, 50, null]);
});

it('a band holds every point of its members', () => {
  const { curves } = frontFigure(inputOf(reportOf(12, 'twist')), measure);
  const bands = bandsOf(curves);
  expect(bands).toHaveLength(5);
  for (const { family, lightest, heaviest } of bands)
    for (const { x, y } of curves.filter(({ mark }) => mark.family === family).flatMap(({ points }) => points)) {
      expect(y).toBeLessThanOrEqual((heightAt(lightest, x) ?? 0) + 1e-6);
      expect(y).toBeGreaterThanOrEqual((heightAt(heaviest, x) ?? Infinity) - 1e-6);
    }
});
