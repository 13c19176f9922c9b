import type { StockRow } from './material.js';

/** Sizes that agree to a nanometre are the same size, whatever unit each was given in. */
function sizeKey(row: StockRow): string {
  const lengths = 'bore' in row ? [row.bore] : [row.outerDiameter, row.wall];
  return lengths.map((length) => Math.round(length * 1e9)).join(' × ');
}

function priceOf(row: StockRow): number {
  return 'bore' in row || row.pricePerMetre === null ? Infinity : row.pricePerMetre;
}

/**
 * Entries whose size is listed more than once are kept once, where the first of them stood, at the lowest price given.
 * @param rowOf the row of an entry
 */
export function keepOnce<T>(entries: readonly T[], rowOf: (entry: T) => StockRow): readonly T[] {
  const kept = new Map<string, T>();
  for (const entry of entries) {
    const key = sizeKey(rowOf(entry));
    const before = kept.get(key);
    if (before === undefined || priceOf(rowOf(entry)) < priceOf(rowOf(before))) kept.set(key, entry);
  }
  return Array.from(kept.values());
}
