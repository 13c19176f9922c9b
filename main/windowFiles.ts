import { readFile, readdir } from 'node:fs/promises';
import path from 'node:path';

/** A file of the built window. */
export interface WindowFile {
  readonly type: string;
  readonly bytes: Uint8Array<ArrayBuffer>;
}

/** The files of the built window by the path that asks for them, such as "/assets/index.js"; "/" is the page. */
export type WindowFiles = ReadonlyMap<string, WindowFile>;

/** The kinds of file that a window is built of; what has another ending is not served. */
const TYPES: ReadonlyMap<string, string> = new Map([
  ['.html', 'text/html; charset=utf-8'],
  ['.js', 'text/javascript; charset=utf-8'],
  ['.css', 'text/css; charset=utf-8'],
  ['.json', 'application/json; charset=utf-8'],
  ['.svg', 'image/svg+xml'],
  ['.png', 'image/png'],
  ['.ico', 'image/x-icon'],
  ['.woff2', 'font/woff2'],
]);

/**
 * Reads the built window into memory, once: what a host serves is what stood in the folder when it started, so that no
 * path that is asked for ever reaches the disk.
 */
export async function readWindowFiles(folder: string): Promise<WindowFiles> {
  const files = new Map<string, WindowFile>();
  const entries = await readdir(folder, { recursive: true, withFileTypes: true });
  for (const entry of entries.filter((one) => one.isFile())) {
    const full = path.join(entry.parentPath, entry.name);
    const type = TYPES.get(path.extname(entry.name));
    if (type === undefined) continue;
    const asked = `/${path.relative(folder, full).split(path.sep).join('/')}`;
    files.set(asked, { type, bytes: new Uint8Array(await readFile(full)) });
  }
  const page = files.get('/index.html');
  if (page === undefined) throw new Error('The built window is incomplete: its page is missing.');
  return files.set('/', page);
}
