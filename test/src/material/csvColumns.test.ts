import { describe, expect, it } from 'vitest';
import { readColumns } from '../../../src/material/csvColumns.js';

const messages = (...cells: readonly string[]): readonly string[] =>
  readColumns(cells, 'shop.csv, line 1').problems.map(({ message }) => message);

describe('the titles of a CSV stock list', () => {
  it.each([
    ['outer diameter (mm)', 'mm'],
    ['Outside Diameter [in]', 'in'],
    ['OD, mm', 'mm'],
    ['O.D. mm', 'mm'],
    ['outer_dia (inches)', 'inches'],
    ['outerDiameter', null],
    ['od', null],
  ])('know the diameter in %j', (title, unit) => {
    expect(readColumns([title, 'wall'], '').columns.outerDiameter).toEqual({ index: 0, title, unit });
  });

  it.each([
    ['Wall', null],
    ['wall thickness (mm)', 'mm'],
    ['T [mm]', 'mm'],
    ['WT in', 'in'],
  ])('know the wall in %j', (title, unit) => {
    expect(readColumns(['od', title], '').columns.wall).toEqual({ index: 1, title, unit });
  });

  it.each(['price per metre', 'Price per meter (EUR)', 'price (EUR/m)', 'price/m'])('know the price in %j', (title) => {
    const { columns, problems } = readColumns(['note', 'od', 'wall', title], '');
    expect(problems).toEqual([]);
    expect(columns.pricePerMetre?.index).toBe(3);
  });

  it.each(['inner diameter (mm)', 'ID', 'gauge', 'part number', 'mass per metre', ''])('pass over %j', (title) => {
    expect(messages('od', 'wall', title)).toEqual([]);
  });

  const titles = 'expected a line of titles such as "outer diameter (mm), wall (mm)"';
  it.each([
    [['od'], [`shop.csv, line 1: has no column "wall"; ${titles}`]],
    [
      ['12', '3'],
      [
        `shop.csv, line 1: has no column "outer diameter"; ${titles}`,
        `shop.csv, line 1: has no column "wall"; ${titles}`,
      ],
    ],
    [
      ['outer diametre', 'wall'],
      ['shop.csv, line 1: "outer diametre" is not a known column; expected "outer diameter" or another title'],
    ],
    [
      ['od (kg)', 'wall [inn]'],
      [
        'shop.csv, line 1: "od (kg)" names no unit of length; expected a unit such as "km"',
        'shop.csv, line 1: "wall [inn]" names no unit of length; expected a unit such as "in"',
      ],
    ],
    [
      ['od', 'wall', 'OD'],
      ['shop.csv, line 1: "OD" is a second column for outer diameter; expected one column for each'],
    ],
    [
      ['od', 'wall', 'price per foot'],
      ['shop.csv, line 1: "price per foot" is not a price per metre; expected "price per metre" or another title'],
    ],
    [
      ['od', 'wall', 'price (EUR/ft)'],
      ['shop.csv, line 1: "price (EUR/ft)" is not a price per metre; expected "price per metre" or another title'],
    ],
  ])('are refused: %j', (cells, expected) => {
    expect(messages(...cells)).toEqual(expected);
  });

  it('are not read where they are as long as a file', () => {
    expect(messages('od', 'wall', '( '.repeat(200_000))).toEqual([]);
  });
});
