import type { Metal } from '../../src/material/material.js';
import { documentOf, isObject, without, type JobDocument } from '../job/keyPath.js';

/** A material that can be ticked. */
export interface MaterialRow {
  readonly id: string;
  readonly name: string;
  readonly family: string;
  /** its place in the job's list; null where it is not ticked */
  readonly index: number | null;
}

/** A family and its materials, in the order of the list. */
export interface MaterialGroup {
  readonly family: string;
  readonly rows: readonly MaterialRow[];
}

/** The id that an entry of the job's list states. */
export function entryId(entry: unknown): string {
  const id = typeof entry === 'string' ? entry : documentOf(entry)['id'];
  return typeof id === 'string' ? id : '';
}

/** The job's list as entered. */
export function entriesOf(materials: unknown): readonly unknown[] {
  return Array.isArray(materials) ? (materials as readonly unknown[]) : [];
}

function said(record: JobDocument, key: string, otherwise: string): string {
  const value = record[key];
  return typeof value === 'string' && value !== '' ? value : otherwise;
}

function rowOf(entry: unknown, index: number | null, library: ReadonlyMap<string, Metal>): MaterialRow {
  const id = entryId(entry);
  const record = isObject(entry) ? entry : {};
  const shipped = library.get(id);
  const name = said(record, 'name', shipped?.name ?? id);
  return { id, name, family: said(record, 'family', shipped?.family ?? 'other'), index };
}

/**
 * The materials of the job with those of the library that are to be shown beside them, by family. Families come in the
 * order in which job and library first name them.
 * @param unticked entries to show though the job no longer lists them, by id
 * @param all whether to show the whole library
 */
export function materialGroups(
  entries: readonly unknown[],
  library: ReadonlyMap<string, Metal>,
  unticked: ReadonlyMap<string, unknown>,
  all: boolean,
): readonly MaterialGroup[] {
  const ticked = entries.map((entry, index) => rowOf(entry, index, library));
  const own = new Set(ticked.map(({ id }) => id));
  const order = Array.from(library.keys());
  const shown = [...(all ? order : order.filter((id) => unticked.has(id))), ...unticked.keys()];
  const rest = Array.from(new Set(shown))
    .filter((id) => !own.has(id))
    .map((id) => rowOf(unticked.get(id) ?? id, null, library));
  const place = ({ id, index }: MaterialRow): number =>
    library.has(id) ? order.indexOf(id) : order.length + (index ?? 0);
  const rows = [...ticked, ...rest];
  const families = Array.from(new Set(rows.map(({ family }) => family)));
  return families.map((family) => ({
    family,
    rows: rows.filter((row) => row.family === family).sort((one, other) => place(one) - place(other)),
  }));
}

/** The record of an entry with another price; the bare id again where the record says no more than the library's. */
export function withPrice(entry: unknown, price: unknown, records: ReadonlyMap<string, JobDocument>): unknown {
  const shipped = records.get(entryId(entry));
  const record = without(isObject(entry) ? entry : (shipped ?? {}), 'pricePerKilogram');
  if (price !== undefined) return { ...record, pricePerKilogram: price };
  return shipped !== undefined && JSON.stringify(shipped) === JSON.stringify(record) ? entryId(entry) : record;
}

/** The entries with one more: behind those of its family that stand before it in the library, or else at the end. */
export function withEntry(
  entries: readonly unknown[],
  entry: unknown,
  library: ReadonlyMap<string, Metal>,
): readonly unknown[] {
  const order = Array.from(library.keys());
  const { id, family } = rowOf(entry, null, library);
  const later = (other: unknown): boolean => {
    const row = rowOf(other, null, library);
    return row.family === family && order.indexOf(row.id) > order.indexOf(id);
  };
  const at = library.has(id) ? entries.findIndex(later) : -1;
  return at < 0 ? [...entries, entry] : entries.toSpliced(at, 0, entry);
}
