import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plainText, splitCsv } from '../../../src/material/csv.js';

describe('splitting CSV', () => {
  it.each([
    [
      'a,b\n1,2\n',
      [
        [1, 'a', 'b'],
        [2, '1', '2'],
      ],
    ],
    [
      'a,b\n1,2',
      [
        [1, 'a', 'b'],
        [2, '1', '2'],
      ],
    ],
    [
      'a,b\n\n# a note, "with\n , \n1,',
      [
        [1, 'a', 'b'],
        [5, '1', ''],
      ],
    ],
    [
      '"a ""b""", " c , d"\nx,y',
      [
        [1, 'a "b"', 'c , d'],
        [2, 'x', 'y'],
      ],
    ],
    [
      '"two\nlines",b\nc,d',
      [
        [1, 'two\nlines', 'b'],
        [3, 'c', 'd'],
      ],
    ],
    [' a b , c', [[1, 'a b', 'c']]],
    ['a"b,c', [[1, 'a"b', 'c']]],
    ['""', [[1, '']]],
    ['', []],
  ])('gives the cells of %j with their lines', (text, records) => {
    expect(splitCsv(text, ',')).toEqual({
      ok: true,
      records: records.map(([line, ...cells]) => ({ line, cells })),
    });
  });

  it.each([
    ['a;b,c', ';'],
    ['a\tb,c', '\t'],
  ] as const)('parts %j at its separator alone', (text, separator) => {
    expect(splitCsv(text, separator)).toEqual({ ok: true, records: [{ line: 1, cells: ['a', 'b,c'] }] });
  });

  it.each([
    ['a,b\n\n"c,d\ne', 3, 'opens a quote that is never closed'],
    ['a,b\n"c"d,e', 2, 'goes on after a closing quote'],
  ])('refuses %j with the line', (text, line, wrong) => {
    expect(splitCsv(text, ',')).toEqual({ ok: false, line, wrong });
  });

  it('takes any line end, and drops a byte order mark', () => {
    expect(plainText('\ufeffa\r\nb\rc\n')).toBe('a\nb\nc\n');
  });

  it('gives back what was quoted', () => {
    const cell = fc.string({ minLength: 1 }).map((text) => `x${text}x`.replaceAll('\r', ''));
    const records = fc.array(fc.array(cell, { minLength: 1 }), { minLength: 1 });
    fc.assert(
      fc.property(records, (rows) => {
        const text = rows.map((row) => row.map((one) => `"${one.replaceAll('"', '""')}"`).join(';')).join('\n');
        const split = splitCsv(text, ';');
        expect(split.ok && split.records.map(({ cells }) => cells)).toEqual(rows);
      }),
    );
  });
});
