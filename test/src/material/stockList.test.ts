import { describe, expect, it } from 'vitest';
import { readStockList } from '../../../src/material/stockList.js';
import { messagesOf } from './sample.js';

const DOCUMENT = {
  format: 'wringwall-stock',
  version: 1,
  id: 'shop',
  name: 'The shop',
  source: 'invented',
  rows: [{ outerDiameter: '50 mm', wall: '1 mm' }],
};

describe('a stock list document', () => {
  it('is read', () => {
    expect(readStockList(DOCUMENT)).toEqual({
      ok: true,
      list: {
        id: 'shop',
        name: 'The shop',
        source: 'invented',
        rows: [{ outerDiameter: 0.05, wall: 0.001, pricePerMetre: null }],
      },
    });
  });

  it.each([
    [{ format: 'wringwall-job' }, 'format: "wringwall-job" is not known; expected "wringwall-stock"'],
    [{ version: 2 }, 'version: 2 is out of range; expected a number from 1 to 1'],
    [{ id: 3 }, 'id: 3 is not text; expected text of 1 to 80 characters'],
    [{ row: [] }, 'row: "row" is not a key of a stock list; expected "rows"'],
    [{ rows: [3] }, 'rows.0: 3 is not an object; expected a stock size'],
  ])('is refused: %j', (change, message) => {
    expect(messagesOf(readStockList({ ...DOCUMENT, ...change }))).toEqual([message]);
  });

  it('is refused where it is none', () => {
    expect(messagesOf(readStockList(null))).toEqual(['null is not an object; expected a stock list']);
  });
});
