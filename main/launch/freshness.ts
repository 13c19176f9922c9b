import { readdirSync, statSync } from 'node:fs';
import path from 'node:path';

/** What the build is made from. */
const SOURCES = ['main', 'renderer', 'src', 'assets', 'electron.config.ts', 'package.json'];
/** What the build makes last of each of its parts. */
const PRODUCTS = ['dist/main/worker.js', 'dist/main/app.js', 'dist/preload/preload.cjs', 'dist/renderer/index.html'];

/** When a file, or the newest thing in a folder, was changed last; ms. */
function newest(place: string): number {
  const stat = statSync(place, { throwIfNoEntry: false });
  if (stat === undefined) return 0;
  if (!stat.isDirectory()) return stat.mtimeMs;
  // the folder's own time tells of files that were taken away
  return Math.max(stat.mtimeMs, ...readdirSync(place).map((name) => newest(path.join(place, name))));
}

/** Whether the build is there and newer than all that it is made from. */
export function isBuilt(root: string): boolean {
  const built = PRODUCTS.map((product) => statSync(path.join(root, product), { throwIfNoEntry: false })?.mtimeMs ?? 0);
  return Math.min(...built) > Math.max(...SOURCES.map((source) => newest(path.join(root, source))));
}
