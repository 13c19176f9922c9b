import { describe, expect, it } from 'vitest';
import { materialGroups, withEntry, withPrice } from '../../../renderer/brief/materialRows.js';
import { documentOf } from '../../../renderer/job/keyPath.js';
import { buildLibrary, buildStockLists, rowsById } from '../../../src/material/library.js';
import { LISTS, RECORDS } from '../window.js';

const library = buildLibrary(RECORDS, rowsById(buildStockLists(LISTS)));
const records = new Map(Array.from(library.keys(), (id, index) => [id, documentOf(RECORDS[index])] as const));
const own = { id: 'mine', name: 'Steel of my own', family: 'steel' };

describe('materialGroups', () => {
  it('has the job’s materials by family, each with its place in the job', () => {
    const groups = materialGroups(['steel-4130-n', own, 'al-6061-t6', 'al-2024-t3'], library, new Map(), false);
    expect(groups.map(({ family, rows }) => [family, rows.map(({ id, index }) => [id, index])])).toEqual([
      [
        'steel',
        [
          ['steel-4130-n', 0],
          ['mine', 1],
        ],
      ],
      [
        'aluminium',
        [
          ['al-2024-t3', 3],
          ['al-6061-t6', 2],
        ],
      ],
    ]);
  });

  it('has the library beside them on demand', () => {
    const groups = materialGroups(['al-6061-t6'], library, new Map(), true);
    expect(groups.flatMap(({ rows }) => rows)).toHaveLength(library.size);
    const [aluminium] = groups;
    expect(aluminium?.rows.map(({ index }) => index)).toEqual([null, 0, null]);
  });

  it('shows an entry that says nothing of itself by its id', () => {
    expect(materialGroups(['unheard-of'], library, new Map(), false)[0]?.rows[0]?.name).toBe('unheard-of');
  });

  it('keep in sight what was unticked, the job’s own records too', () => {
    const own = { id: 'mill', name: 'Mill steel', family: 'steel' };
    const unticked = new Map<string, unknown>([
      ['mill', own],
      ['al-2024-t3', 'al-2024-t3'],
    ]);
    const rows = materialGroups(['al-6061-t6'], library, unticked, false).flatMap((group) => group.rows);
    expect(rows.map(({ id, index }) => [id, index])).toEqual([
      ['al-2024-t3', null],
      ['al-6061-t6', 0],
      ['mill', null],
    ]);
  });
});

describe('withPrice', () => {
  it('makes a library id a record with a price, and the id again without it', () => {
    const priced = documentOf(withPrice('al-6061-t6', 6.5, records));
    expect(priced).toEqual({ ...records.get('al-6061-t6'), pricePerKilogram: 6.5 });
    expect(withPrice(priced, undefined, records)).toBe('al-6061-t6');
  });

  it('keeps a record that differs from the library’s', () => {
    expect(withPrice({ ...own, pricePerKilogram: 4 }, undefined, records)).toEqual(own);
    expect(withPrice(own, 5, records)).toEqual({ ...own, pricePerKilogram: 5 });
  });
});

describe('withEntry', () => {
  it('puts a material behind those of its family that the library has before it', () => {
    const list = ['al-6061-t6', 'steel-4130-n'];
    expect(withEntry(list, 'al-2024-t3', library)).toEqual(['al-2024-t3', ...list]);
    expect(withEntry(list, 'ti-6al-4v-annealed', library)).toEqual([...list, 'ti-6al-4v-annealed']);
    expect(withEntry(list, own, library)).toEqual([...list, own]);
  });
});
