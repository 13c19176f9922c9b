import { rootFolder } from '../../main/files/assets.js';
import { build } from '../../main/launch/build.js';
import { isBuilt } from '../../main/launch/freshness.js';

/** Builds the window once for all tests of it, where what is built is older than what it is built from. */
export default async function buildWindow(): Promise<void> {
  const root = rootFolder();
  if (isBuilt(root)) return;
  const fault = await build(root);
  if (fault !== null) throw new Error(`The window cannot be built:\n${fault}`);
}
