import { listField } from '../material/field.js';
import type { Material, Metal } from '../material/material.js';
import { collectMetal } from '../material/metal.js';
import { joinPath } from '../material/problem.js';
import { refuseValue, type Fields } from '../material/reading.js';
import type { StockLists } from '../material/sizes.js';
import { nearest } from '../quantity/nearest.js';
import { JOB_RANGES } from './ranges.js';
import { refuseRepeats } from './unique.js';

/** The shipped records by id. */
export type Library = ReadonlyMap<string, Metal>;

const ENTRIES = 'materials, library ids or records';

function fromLibrary(id: string, path: string, job: Fields, library: Library): Material | null {
  const record = library.get(id);
  if (record !== undefined) return record;
  const near = nearest(id.slice(0, 80), Array.from(library.keys()));
  const expected = near ? `"${near}"` : `a material record or one of ${Array.from(library.keys()).join(', ')}`;
  refuseValue(job.reading, path, id, 'is not a material of the library', expected);
  return null;
}

function collectMaterial(
  entry: unknown,
  path: string,
  job: Fields,
  library: Library,
  stock: StockLists,
): Material | null {
  if (typeof entry === 'string') return fromLibrary(entry, path, job, library);
  if (typeof entry === 'object' && entry !== null) return collectMetal(entry, path, job.reading, stock);
  refuseValue(job.reading, path, entry, 'is not a material', 'an id of the library or a material record');
  return null;
}

/** The id that an entry states, for the messages of `hold` and `pick` even where its record failed; '' if none. */
function statedId(entry: unknown): string {
  if (typeof entry === 'string') return entry;
  const id = typeof entry === 'object' && entry !== null && 'id' in entry ? entry.id : '';
  return typeof id === 'string' ? id : '';
}

/** Reads `materials`: the records, and every id that the list states. Meaningless where problems were noted. */
export function collectMaterials(
  job: Fields,
  library: Library,
  stock: StockLists,
): { readonly materials: readonly Material[]; readonly ids: readonly string[] } {
  const raw = listField(job, 'materials', ENTRIES, 1, JOB_RANGES.materials);
  const read = raw.map((entry, index) => collectMaterial(entry, joinPath('materials', index), job, library, stock));
  const ids = raw.map(statedId);
  refuseRepeats(ids, 'materials', '', job.reading);
  return { materials: read.filter((material) => material !== null), ids };
}
