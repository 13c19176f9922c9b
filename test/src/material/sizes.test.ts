import { describe, expect, it } from 'vitest';
import { newReading, openFields } from '../../../src/material/reading.js';
import { collectSizes, optionalSizes, type StockLists } from '../../../src/material/sizes.js';

const ROWS = [{ outerDiameter: 0.05, wall: 0.001, pricePerMetre: null }];
const STOCK: StockLists = new Map([['metric-precision', ROWS]]);

function read(value: unknown, stock: StockLists = STOCK): { sizes: unknown; messages: string[] } {
  const reading = newReading();
  const sizes = collectSizes(value, 'sizes', reading, stock);
  return { sizes, messages: reading.problems.map(({ message }) => message) };
}

describe('a choice of sizes', () => {
  it.each([
    ['any', 'any'],
    [{ stock: 'metric-precision' }, { stock: ROWS }],
    [{ stock: [{ outerDiameter: '50 mm', wall: '1 mm' }] }, { stock: ROWS }],
  ])('is read: %j', (value, sizes) => {
    expect(read(value)).toEqual({ sizes, messages: [] });
  });

  const choice = '"any" or { "stock": … } with the id or the rows of a stock list';
  it.each([
    [undefined, `sizes: is missing; expected ${choice}`],
    ['some', `sizes: "some" is not a choice of sizes; expected ${choice}`],
    [[], `sizes: a list is not a choice of sizes; expected ${choice}`],
    [{ stock: 'metric-precison' }, 'sizes.stock: "metric-precison" is not a stock list; expected "metric-precision"'],
    [{ stock: 'x-y-z' }, 'sizes.stock: "x-y-z" is not a stock list; expected one of metric-precision'],
    [{}, 'sizes.stock: is missing; expected a list of 1 to 20000 sizes with outerDiameter and wall'],
  ])('is refused: %j', (value, message) => {
    expect(read(value).messages).toEqual([message]);
  });

  it('tells an unknown key and the missing one together', () => {
    expect(read({ stocks: 'metric-precision' }).messages).toEqual([
      'sizes.stocks: "stocks" is not a key of a choice of sizes; expected "stock"',
      'sizes.stock: is missing; expected a list of 1 to 20000 sizes with outerDiameter and wall',
    ]);
  });

  it('asks for rows where there are no lists', () => {
    expect(read({ stock: 'metric' }, new Map()).messages).toEqual([
      'sizes.stock: "metric" is not a stock list; expected the rows of a stock list',
    ]);
  });

  it('may be left out', () => {
    const fields = openFields({ sizes: 'any' }, '', 'a thing', ['sizes'], newReading());
    if (fields === null) throw new Error('not opened');
    expect(optionalSizes(fields, 'sizes', STOCK)).toBe('any');
    expect(optionalSizes(fields, 'other', STOCK)).toBeNull();
  });
});
