import type { Beginning } from '../contract.js';
import { programVersion, readAssets } from '../files/assets.js';
import { readDemos } from './demos.js';

/** What the window begins with that is the same at every start. */
export type Shipped = Omit<Beginning, 'remembered'>;

/** Reads what is shipped with the app. */
export async function readShipped(): Promise<Shipped> {
  const [records, stockLists, demos] = await Promise.all([readAssets('materials'), readAssets('stock'), readDemos()]);
  return { version: programVersion(), records, stockLists, demos };
}
