import type { LineUpRow } from './rows.js';

export type SortColumn = 'material' | 'size' | 'mass' | 'twist' | 'governs' | 'cost';

/** What the rows are sorted by. */
export interface Sorting {
  readonly by: SortColumn;
  readonly descending: boolean;
}

/** The order of ranks. */
export const BY_RANK: Sorting = { by: 'mass', descending: false };

type Value = number | string | null;

const VALUES: Readonly<Record<SortColumn, (row: LineUpRow) => Value>> = {
  material: ({ name }) => name,
  size: ({ design }) => design?.outerDiameter ?? null,
  mass: ({ design }) => design?.mass ?? null,
  twist: ({ design }) => design?.twist ?? null,
  governs: ({ texts }) => texts?.governs ?? null,
  cost: ({ design }) => design?.cost ?? null,
};

function compare(a: Value, b: Value): number {
  if (typeof a === 'string' && typeof b === 'string') return a.localeCompare(b, 'en-GB', { numeric: true });
  return typeof a === 'number' && typeof b === 'number' ? a - b : 0;
}

/** A click on a heading: the other way round where it is the one already, else upwards. */
export function sortedBy(sorting: Sorting, by: SortColumn): Sorting {
  return { by, descending: sorting.by === by && !sorting.descending };
}

/** Rows sorted; those without a rank stay after the rest, those without a value after those that have one. */
export function sortRows(rows: readonly LineUpRow[], { by, descending }: Sorting): readonly LineUpRow[] {
  const valueOf = VALUES[by];
  const missing = (row: LineUpRow): number => (row.rank === null ? 2 : 0) + (valueOf(row) === null ? 1 : 0);
  return [...rows].sort((a, b) => {
    const apart = missing(a) - missing(b);
    if (apart !== 0) return apart;
    const order = compare(valueOf(a), valueOf(b));
    return descending ? -order : order;
  });
}
