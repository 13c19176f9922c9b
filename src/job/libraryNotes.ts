import type { Material } from '../material/material.js';
import { clip } from '../material/problem.js';
import type { Library } from './readMaterials.js';

/** The numbers of a record; its name, source and sizes are the user's own to change. */
function numbersThatDiffer(own: Material, shipped: Material): readonly string[] {
  const mine = new Map<string, unknown>(Object.entries(own));
  return Object.entries(shipped)
    .filter(([key, value]) => typeof value === 'number' && mine.get(key) !== value)
    .map(([key]) => key);
}

/** One sentence for each record of a job that has the id of a library record but not its numbers. */
export function libraryNotes(materials: readonly Material[], library: Library): readonly string[] {
  return materials.flatMap((own, index) => {
    const shipped = library.get(own.id);
    const keys = shipped === undefined ? [] : numbersThatDiffer(own, shipped);
    const where = `materials.${index}: the record "${clip(own.id)}"`;
    return keys.length === 0 ? [] : [`${where} differs from the library in ${keys.join(', ')}`];
  });
}
