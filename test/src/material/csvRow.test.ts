import { describe, expect, it } from 'vitest';
import type { Columns } from '../../../src/material/csvColumns.js';
import { readCsvRow } from '../../../src/material/csvRow.js';
import type { Problem } from '../../../src/material/problem.js';

const COLUMNS: Columns = {
  wall: { index: 0, title: 'wall', unit: null },
  outerDiameter: { index: 2, title: 'OD (mm)', unit: 'mm' },
  pricePerMetre: { index: 3, title: 'price/m', unit: null },
};

function read(cells: readonly string[], decimalComma: boolean): { read: unknown; messages: string[] } {
  const problems: Problem[] = [];
  const row = readCsvRow({ line: 7, cells }, COLUMNS, decimalComma, 'shop.csv', problems);
  return { read: row, messages: problems.map(({ message }) => message) };
}

describe('a row of a CSV stock list', () => {
  it('finds its cells by their columns, and their units in the cell, else in the title', () => {
    expect(read(['0.1 in', 'note', '50', '9.5'], false)).toEqual({
      read: {
        row: { outerDiameter: 0.05, wall: 0.00254, pricePerMetre: 9.5 },
        entry: { outerDiameter: '50 mm', wall: '0.1 in', pricePerMetre: 9.5 },
      },
      messages: [],
    });
  });

  it('reads decimal commas where it may', () => {
    const cells = ['1,5 mm', '', '50,5', '9,5'];
    expect(read(cells, true)).toMatchObject({
      read: { row: { outerDiameter: 0.0505, wall: 0.0015, pricePerMetre: 9.5 } },
      messages: [],
    });
    expect(read(cells, false).messages).toHaveLength(3);
  });

  it('names the line and the column of every mistake', () => {
    expect(read(['1.5', '', 'x', '-1'], false).messages).toEqual([
      'shop.csv, line 7, column "OD (mm)": "x" does not begin with a number; expected a length such as "1.4 m"',
      'shop.csv, line 7, column "wall": "1.5" has no unit; expected a length such as "1.5 mm", or the unit in the title',
      'shop.csv, line 7, column "price/m": "-1" is not a price; expected a number from 0 to 1000000000',
    ]);
  });

  it('has no price where the cell is empty or not there', () => {
    expect(read(['1 mm', '', '50', ''], false)).toMatchObject({ read: { row: { pricePerMetre: null } }, messages: [] });
    expect(read(['1 mm', '', '50'], false)).toMatchObject({ read: { row: { pricePerMetre: null } }, messages: [] });
  });
});
