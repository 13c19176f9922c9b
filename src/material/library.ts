import type { Metal } from './material.js';
import { readMetal } from './metal.js';
import type { Problem } from './problem.js';
import { readStockList, type StockList } from './stockList.js';
import { NO_STOCK, type StockLists } from './sizes.js';

/** The shipped records or lists are wrong: a fault of the installation, not of the user's job. */
export class LibraryError extends Error {
  /** stable, for callers that branch on it */
  readonly code = 'bad-library';

  readonly problems: readonly Problem[];

  constructor(problems: readonly Problem[]) {
    super(`the shipped library cannot be read: ${problems.map(({ message }) => message).join('; ')}`);
    this.name = 'LibraryError';
    this.problems = problems;
  }
}

function twice(id: string): Problem {
  return { path: 'id', value: id, expected: 'an id of its own', message: `id: "${id}" is used by two entries` };
}

/** Entries by id, in the order given; a fault in one, or an id used twice, is thrown with all others. */
function byId<T extends { readonly id: string }>(entries: readonly T[], faults: readonly Problem[]): Map<string, T> {
  const map = new Map<string, T>();
  const doubles = entries.filter(({ id }, index) => entries.findIndex((other) => other.id === id) !== index);
  const problems = [...faults, ...doubles.map(({ id }) => twice(id))];
  if (problems.length > 0) throw new LibraryError(problems);
  for (const entry of entries) map.set(entry.id, entry);
  return map;
}

/**
 * The library of materials by id, in the order given.
 * @param records metal records as parsed from their files
 * @throws LibraryError where a record is wrong or an id is used twice
 */
export function buildLibrary(records: readonly unknown[], stock: StockLists = NO_STOCK): Map<string, Metal> {
  const results = records.map((record) => readMetal(record, '', stock));
  const metals = results.flatMap((result) => (result.ok ? [result.metal] : []));
  return byId(
    metals,
    results.flatMap((result) => (result.ok ? [] : result.problems)),
  );
}

/**
 * The shipped stock lists by id, in the order given.
 * @param documents stock lists as parsed from their files
 * @throws LibraryError where a list is wrong or an id is used twice
 */
export function buildStockLists(documents: readonly unknown[]): Map<string, StockList> {
  const results = documents.map(readStockList);
  const lists = results.flatMap((result) => (result.ok ? [result.list] : []));
  return byId(
    lists,
    results.flatMap((result) => (result.ok ? [] : result.problems)),
  );
}

/** The rows of stock lists by id, as `readMetal` and the job reader want them. */
export function rowsById(lists: ReadonlyMap<string, StockList>): StockLists {
  return new Map(Array.from(lists, ([id, { rows }]) => [id, rows]));
}
