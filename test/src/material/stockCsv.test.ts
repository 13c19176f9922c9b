import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readStockRows } from '../../../src/material/stock.js';
import { readStockCsv } from '../../../src/material/stockCsv.js';
import { messagesOf } from './sample.js';

const messages = (text: string): readonly string[] => messagesOf(readStockCsv(text, 'shop.csv'));
const tube = (outerDiameter: number, wall: number, pricePerMetre: number | null = null): object => ({
  outerDiameter,
  wall,
  pricePerMetre,
});

describe('a CSV stock list', () => {
  it.each([
    ['outer diameter (mm),wall (mm)\n50,1.5\n40,1\n', [tube(0.05, 0.0015), tube(0.04, 0.001)]],
    ['od,wall\n50 mm,1.5 mm\n2 in,0.1 in', [tube(0.05, 0.0015), tube(0.0508, 0.00254)]],
    ['wall [in],OD (mm)\n0.1,50\n2 mm,40', [tube(0.05, 0.00254), tube(0.04, 0.002)]],
    ['OD, mm;wall mm;price per metre\n50,5;1,5;3,25\n40;1;\n', [tube(0.0505, 0.0015, 3.25), tube(0.04, 0.001)]],
    ['od (mm)\twall (mm)\n50,5\t1,5\n', [tube(0.0505, 0.0015)]],
    ['"OD, mm","wall, mm",price/m\r\n"50","1.5",9.5\r\n', [tube(0.05, 0.0015, 9.5)]],
    ['\ufeff# our shop\r\n\r\nod,wall\r\n# thin\r\n50 mm,1 mm\r\n', [tube(0.05, 0.001)]],
    ['od (mm),wall (mm),price/m\n50,1,9\n5e1,1.0,7\n50,1,8', [tube(0.05, 0.001, 7)]],
  ])('is read: %j', (text, rows) => {
    const result = readStockCsv(text, 'shop.csv');
    expect(messagesOf(result)).toEqual([]);
    expect(result.ok && result.rows).toEqual(rows);
  });

  it('gives its rows in the words of a job file too, which read back to the same', () => {
    const result = readStockCsv('OD in;wall mm;price/m\n2;1,5;9\n50,5 mm;1;\n', 'shop.csv');
    if (!result.ok) throw new Error('refused');
    expect(result.entries).toEqual([
      { outerDiameter: '2 in', wall: '1.5 mm', pricePerMetre: 9 },
      { outerDiameter: '50.5 mm', wall: '1 mm' },
    ]);
    const again = readStockRows(result.entries, 'sizes.stock');
    expect(again.ok && again.rows).toEqual(result.rows);
  });
});

const CONTENT = 'expected a line of titles and 1 to 20000 sizes';
const REFUSED: readonly (readonly [string, readonly string[]])[] = [
  ['', [`shop.csv: is empty; ${CONTENT}`]],
  ['# nothing\n\n', [`shop.csv: is empty; ${CONTENT}`]],
  ['od,wall\n', [`shop.csv: holds no size; ${CONTENT}`]],
  ['od,wall\n1 in,"0.1 in\n', ['shop.csv, line 2: opens a quote that is never closed; expected quotes in pairs']],
  [
    'od,wall\n\n50,1.5 mm\n50 mm,\n50 mm\n',
    [
      'shop.csv, line 3, column "od": "50" has no unit; expected a length such as "1.5 mm", or the unit in the title',
      'shop.csv, line 4, column "wall": "" is empty; expected a length such as "1.4 m"',
      'shop.csv, line 5, column "wall": "" is empty; expected a length such as "1.4 m"',
    ],
  ],
  [
    'od (mm),wall (mm)\nx,1 kg\n50,25\n-50,1\n50,-1\n0,0\n1e400,1\n',
    [
      'shop.csv, line 2, column "od (mm)": "x" does not begin with a number; expected a length such as "1.4 m"',
      'shop.csv, line 2, column "wall (mm)": "1 kg" is a mass; expected a length such as "1.4 m"',
      'shop.csv, line 3, column "wall (mm)": "25" leaves no bore; expected a wall under half the diameter',
      'shop.csv, line 4, column "od (mm)": "-50" is out of range; expected a length from 0.001 mm to 100 m, such as "50 mm"',
      'shop.csv, line 5, column "wall (mm)": "-1" is out of range; expected a length from 0.001 mm to 100 m, such as "50 mm"',
      'shop.csv, line 6, column "od (mm)": "0" is out of range; expected a length from 0.001 mm to 100 m, such as "50 mm"',
      'shop.csv, line 6, column "wall (mm)": "0" is out of range; expected a length from 0.001 mm to 100 m, such as "50 mm"',
      'shop.csv, line 7, column "od (mm)": "1e400 mm" is too large a number; expected a length such as "1.4 m"',
    ],
  ],
  [
    'od (mm),wall (mm)\n50,5,1,5\n',
    [
      'shop.csv, line 2: has 4 cells; expected 2 as in the titles (a decimal comma needs semicolons or tabs between columns)',
    ],
  ],
  [
    'od (mm),wall (mm)\n"50,5",1\n',
    ['shop.csv, line 2, column "od (mm)": "50,5" has a decimal comma: use a point; expected a length such as "1.4 m"'],
  ],
  [
    'od (mm);wall (mm);price/m\n1.050,5;1;€3\n50;1;-3',
    [
      'shop.csv, line 2, column "od (mm)": "1.050,5" has a decimal comma: use a point; expected a length such as "1.4 m"',
      'shop.csv, line 2, column "price/m": "€3" is not a price; expected a number from 0 to 1000000000',
      'shop.csv, line 3, column "price/m": "-3" is not a price; expected a number from 0 to 1000000000',
    ],
  ],
];

describe('a faulty CSV stock list', () => {
  it.each(REFUSED)('is refused: %j', (text, expected) => {
    expect(messages(text)).toEqual(expected);
  });

  it('is told by twenty mistakes where it holds more', () => {
    const told = messages(`od (mm),wall (mm)\n${'x,1\n'.repeat(57)}`);
    expect(told).toHaveLength(21);
    expect(told[20]).toBe('shop.csv: and 37 more mistakes');
  });

  it('is limited in its rows', () => {
    const list = (count: number): string => `od (mm),wall (mm)\n${'50,1\n'.repeat(count)}`;
    expect(messages(list(20_000))).toEqual([]);
    expect(messages(list(20_001))).toEqual([`shop.csv: holds 20001 rows; ${CONTENT}`]);
  });

  it('takes no long time over one long cell', () => {
    const digits = '1'.repeat(1_000_000);
    const start = performance.now();
    expect(messages(`od (mm),wall (mm)\n${digits}x,1`)[0]).toMatch(/is longer than 100 characters/);
    expect(messages(digits + ', '.repeat(500_000))).not.toEqual([]);
    expect(performance.now() - start).toBeLessThan(5000);
  });

  it('is never thrown at', () => {
    const piece = fc.constantFrom('od', 'wall', ' (mm)', ',', ';', '\t', '\n', '"', '#', '50', '1.5', ' in', '\u0000');
    const text = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc.array(piece, { maxLength: 60 }).map((all) => all.join('')),
    );
    fc.assert(
      fc.property(text, (csv) => {
        const result = readStockCsv(csv, 'shop.csv');
        expect(result.ok).toBe(messagesOf(result).length === 0);
      }),
      { numRuns: 500 },
    );
  });
});
