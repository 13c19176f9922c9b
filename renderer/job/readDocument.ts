import { readJob, type JobResult } from '../../src/job/read.js';
import type { Library } from '../../src/job/readMaterials.js';
import type { StockRow } from '../../src/material/material.js';
import type { StockLists } from '../../src/material/sizes.js';
import { readStockRows } from '../../src/material/stock.js';
import { valueAt, withValue, type JobDocument } from './keyPath.js';

/** A name that no list of a file can have, since it holds a character that cannot be printed. */
const OWN_LIST = '\u0000own list';

/** Sound lists of the user's own by identity: a document's list is a new one only when it was changed. */
const known = new WeakMap<object, readonly StockRow[] | null>();

/** The rows of a list of the user's own, read once; null where it holds a mistake. */
function rowsOf(list: object): readonly StockRow[] | null {
  const before = known.get(list);
  if (before !== undefined) return before;
  const read = readStockRows(list, 'sizes.stock');
  const rows = read.ok ? read.rows : null;
  known.set(list, rows);
  return rows;
}

/**
 * `readJob` for a document that is read at every key stroke: a long stock list of the user's own is read when it comes,
 * and not again. The brief does not hold the units of its rows.
 */
export function readDocument(document: JobDocument, library: Library, lists: StockLists): JobResult {
  const list = valueAt(document, 'sizes.stock');
  const rows = Array.isArray(list) ? rowsOf(list) : null;
  if (rows === null) return readJob(document, library, lists);
  const named = withValue(document, { path: 'sizes', value: { stock: OWN_LIST } });
  return readJob(named, library, new Map(lists).set(OWN_LIST, rows));
}
