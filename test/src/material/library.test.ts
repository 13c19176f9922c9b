import { describe, expect, it } from 'vitest';
import { buildLibrary, buildStockLists, LibraryError, rowsById } from '../../../src/material/library.js';
import { sampleWith } from './sample.js';

const list = (id: string): object => ({
  format: 'wringwall-stock',
  version: 1,
  id,
  name: 'List',
  source: 'invented',
  rows: [{ outerDiameter: '50 mm', wall: '1 mm' }],
});

describe('the library', () => {
  it('holds materials by id, in the order given', () => {
    const library = buildLibrary([sampleWith({ id: 'b' }), sampleWith({ id: 'a' })]);
    expect(Array.from(library.keys())).toEqual(['b', 'a']);
    expect(library.get('a')?.density).toBe(2700);
  });

  it('gives a record the stock list that it names', () => {
    const stock = rowsById(buildStockLists([list('shop')]));
    const library = buildLibrary([sampleWith({ sizes: { stock: 'shop' } })], stock);
    expect(library.get('alloy')?.sizes).toEqual({ stock: stock.get('shop') });
  });

  it('throws all faults at once, with a code', () => {
    const build = (): unknown => buildLibrary([sampleWith({}), sampleWith({}), sampleWith({ density: 3 })]);
    expect(build).toThrow(LibraryError);
    expect(build).toThrow(
      'the shipped library cannot be read: density: 3 has no unit; expected a density such as "2710 kg/m³"; ' +
        'id: "alloy" is used by two entries',
    );
    expect(build).toThrow(expect.objectContaining({ code: 'bad-library', name: 'LibraryError' }));
  });

  it('refuses a faulty stock list and an id used twice', () => {
    expect(() => buildStockLists([list('a'), list('a')])).toThrow('id: "a" is used by two entries');
    expect(() => buildStockLists([{}])).toThrow('format: is missing');
  });
});
