import { nearest } from '../quantity/nearest.js';
import type { Sizes, StockRow } from './material.js';
import { joinPath } from './problem.js';
import { openFields, refuseValue, type Fields, type Reading } from './reading.js';
import { collectStockRows } from './stock.js';

/** The rows of the shipped stock lists, by id. */
export type StockLists = ReadonlyMap<string, readonly StockRow[]>;

/** No shipped list at all. */
export const NO_STOCK: StockLists = new Map();

const EXPECTED = '"any" or { "stock": … } with the id or the rows of a stock list';

/**
 * Reads `sizes` of a job or a record: "any", or a stock list by id or by its rows. "any" where it fails, with the
 * problem noted.
 */
export function collectSizes(value: unknown, path: string, reading: Reading, stock: StockLists): Sizes {
  if (value === 'any') return 'any';
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    refuseValue(reading, path, value, 'is not a choice of sizes', EXPECTED);
    return 'any';
  }
  const fields = openFields(value, path, 'a choice of sizes', ['stock'], reading);
  const list = fields?.own.get('stock');
  const key = joinPath(path, 'stock');
  return {
    stock: typeof list === 'string' ? namedRows(list, key, reading, stock) : collectStockRows(list, key, reading),
  };
}

/** `sizes` of an object that may leave it out (null). */
export function optionalSizes(fields: Fields, key: string, stock: StockLists): Sizes | null {
  const value = fields.own.get(key);
  return value === undefined ? null : collectSizes(value, joinPath(fields.path, key), fields.reading, stock);
}

function namedRows(id: string, path: string, reading: Reading, stock: StockLists): readonly StockRow[] {
  const rows = stock.get(id);
  if (rows !== undefined) return rows;
  const known = Array.from(stock.keys());
  const near = nearest(id.slice(0, 80), known);
  const expected = near ? `"${near}"` : known.length > 0 ? `one of ${known.join(', ')}` : 'the rows of a stock list';
  refuseValue(reading, path, id, 'is not a stock list', expected);
  return [];
}
