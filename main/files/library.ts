import { buildLibrary, buildStockLists, rowsById } from '../../src/material/library.js';
import type { Metal } from '../../src/material/material.js';
import type { StockLists } from '../../src/material/sizes.js';
import { readAssets } from './assets.js';

/** The shipped material records and the rows of the shipped stock lists, by id. */
export interface ShippedLibrary {
  readonly materials: ReadonlyMap<string, Metal>;
  readonly stock: StockLists;
}

/**
 * Reads the shipped library.
 * @throws LibraryError where the installation is damaged
 */
export async function loadLibrary(): Promise<ShippedLibrary> {
  const [records, lists] = await Promise.all([readAssets('materials'), readAssets('stock')]);
  const stock = rowsById(buildStockLists(lists));
  return { materials: buildLibrary(records, stock), stock };
}
