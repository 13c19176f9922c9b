import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MOST_ROWS, readStockRows } from '../../../src/material/stock.js';
import { messagesOf } from './sample.js';

const size = (outerDiameter: string, wall: string): object => ({ outerDiameter, wall });

describe('the rows of a stock list', () => {
  it('are read in their order, once each, with the units of those that are kept', () => {
    const result = readStockRows(
      [size('50 mm', '1 mm'), size('50 mm', '0.1 cm'), size('2 in', '0.1 in')],
      'sizes.stock',
    );
    expect(result).toEqual({
      ok: true,
      rows: [
        { outerDiameter: 0.05, wall: 0.001, pricePerMetre: null },
        { outerDiameter: 0.0508, wall: 0.00254, pricePerMetre: null },
      ],
      units: {
        'sizes.stock.0.outerDiameter': 'mm',
        'sizes.stock.0.wall': 'mm',
        'sizes.stock.1.outerDiameter': 'in',
        'sizes.stock.1.wall': 'in',
      },
    });
  });

  it('may mix tubes and mandrels', () => {
    const result = readStockRows([{ bore: '40 mm' }, size('50 mm', '1 mm')], '');
    expect(result.ok && result.rows).toEqual([
      { bore: 0.04 },
      { outerDiameter: 0.05, wall: 0.001, pricePerMetre: null },
    ]);
  });

  const expected = `expected a list of 1 to ${MOST_ROWS} sizes with outerDiameter and wall`;
  it.each([
    [undefined, `s: is missing; ${expected}`],
    ['x', `s: "x" is not a stock list; ${expected}`],
    [{}, `s: an object is not a stock list; ${expected}`],
    [[], `s: a list holds no size; ${expected}`],
    [[{ bore: '40 mm' }], `s: a list holds mandrels only; ${expected}`],
    [[3], 's.0: 3 is not an object; expected a stock size'],
  ])('are refused: %j', (value, message) => {
    expect(messagesOf(readStockRows(value, 's'))).toEqual([message]);
  });

  it('are limited in number', () => {
    const rows = (count: number): unknown => Array.from({ length: count }, (_, i) => size(`${10 + i} mm`, '1 mm'));
    expect(readStockRows(rows(MOST_ROWS), 's').ok).toBe(true);
    expect(messagesOf(readStockRows(rows(MOST_ROWS + 1), 's'))).toEqual([
      `s: a list holds ${MOST_ROWS + 1} rows; ${expected}`,
    ]);
  });

  it('are told by twenty mistakes where they hold more', () => {
    const messages = messagesOf(
      readStockRows(
        Array.from({ length: 30 }, () => 3),
        's',
      ),
    );
    expect(messages).toHaveLength(21);
    expect(messages[20]).toBe(`s: a list holds 10 more mistakes; ${expected}`);
  });

  it('never throw', () => {
    const keys = fc.constantFrom('outerDiameter', 'wall', 'bore', 'gauge', 'pricePerMetre', '__proto__');
    const row = fc.dictionary(keys, fc.oneof(fc.jsonValue(), fc.constantFrom('50 mm', '1 in', '0 mm')));
    fc.assert(
      fc.property(fc.oneof(fc.jsonValue(), fc.array(row)), (value) => {
        const result = readStockRows(value, 's');
        expect(result.ok).toBe(messagesOf(result).length === 0);
      }),
    );
  });
});
