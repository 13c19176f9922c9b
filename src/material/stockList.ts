import { choiceField, numberField, textField } from './field.js';
import type { StockRow } from './material.js';
import type { Problem } from './problem.js';
import { newReading, openFields, type Fields } from './reading.js';
import { collectStockRows } from './stock.js';

/** A stock list of its own: sizes that can be bought, m, and who says so. */
export interface StockList {
  readonly id: string;
  readonly name: string;
  /** where the sizes come from, and the rule by which they were chosen */
  readonly source: string;
  readonly rows: readonly StockRow[];
}

/** A stock list as read, or every mistake in it. */
export type StockListResult =
  { readonly ok: true; readonly list: StockList } | { readonly ok: false; readonly problems: readonly Problem[] };

const KEYS = ['format', 'version', 'id', 'name', 'source', 'rows'];

/** Reads a stock list document, { "format": "wringwall-stock", "version": 1, "id", "name", "source", "rows" }. */
export function readStockList(document: unknown): StockListResult {
  const reading = newReading();
  const fields = openFields(document, '', 'a stock list', KEYS, reading);
  const list = fields === null ? null : listOf(fields);
  return list !== null && reading.problems.length === 0
    ? { ok: true, list }
    : { ok: false, problems: reading.problems };
}

function listOf(fields: Fields): StockList {
  choiceField(fields, 'format', ['wringwall-stock']);
  numberField(fields, 'version', { atLeast: 1, atMost: 1 });
  return {
    id: textField(fields, 'id', { longest: 80 }),
    name: textField(fields, 'name', { longest: 200 }),
    source: textField(fields, 'source', { longest: 4000, lines: true }),
    rows: collectStockRows(fields.own.get('rows'), 'rows', fields.reading),
  };
}
