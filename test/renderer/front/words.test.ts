import { expect, it } from 'vitest';
import { frontSummary, lineNames, pointFigures, rungWords, tubeWords } from '../../../renderer/front/words.js';
import { frontFigure } from '../../../src/figure/front.js';
import { inputOf, measure, reportOf } from '../../src/figure/front/fronts.js';

const report = reportOf(5, 'twist');
const figure = frontFigure(inputOf(report), measure);
const beaten = figure.curves.flatMap(({ points }) => points).find(({ point }) => point.dominated);

it('names a line without its form, unless two would bear one name', () => {
  const materials = ['Steel A, tube', 'Steel B, drawn', 'Steel B, welded'].map((name, i) => ({ id: String(i), name }));
  expect([...lineNames(materials).values()]).toEqual(['Steel A', 'Steel B, drawn', 'Steel B, welded']);
});

it('says a tube and what governs it', () => {
  if (beaten === undefined) throw new Error('no point is beaten');
  expect(tubeWords(beaten, 'SI')).toMatch(/^\d+\.\d+ × \d+\.\d+, [a-z ]+ governs$/);
  expect(pointFigures(beaten)[1]).toBe(beaten.mass.toFixed(3));
});

it('reads a rung out', () => {
  if (beaten === undefined) throw new Error('no point is beaten');
  expect(rungWords('Metal', beaten, figure, 'SI')).toMatch(
    /^Metal: twist [\d.]+ deg, [\d.]+ kg; [\d.]+ × [\d.]+, [a-z ]+ governs; another material is lighter$/,
  );
});

it('sums the drawing up', () => {
  const summary = frontSummary(figure);
  expect(summary).toContain('Mass against twist, deg, for Metal number 0, tube, ');
  expect(summary).toContain('Limit: twist at most 3 deg. pick ');
  expect(frontSummary({ ...figure, curves: [] })).toBe('Mass against twist, deg: no material has a front yet.');
});
