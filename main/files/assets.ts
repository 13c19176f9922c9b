import { existsSync, readFileSync } from 'node:fs';
import { readFile, readdir } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The nearest folder above this file that holds assets/materials: the same from source and from the built program. */
export function rootFolder(): string {
  let folder = path.dirname(fileURLToPath(import.meta.url));
  while (!existsSync(path.join(folder, 'assets', 'materials'))) {
    const above = path.dirname(folder);
    if (above === folder) throw new Error('The installation is incomplete: its assets folder is missing.');
    folder = above;
  }
  return folder;
}

/** The program's version, as its package.json has it. */
export function programVersion(): string {
  const text = readFileSync(path.join(rootFolder(), 'package.json'), 'utf8');
  const manifest: unknown = JSON.parse(text);
  const version = typeof manifest === 'object' && manifest !== null && 'version' in manifest ? manifest.version : null;
  return typeof version === 'string' ? version : 'unknown';
}

/** The full path of a demo job, by the name of its file. */
export function demoJob(name: string): string {
  return path.join(rootFolder(), 'assets', 'jobs', name);
}

/** The JSON documents of a folder of the assets, by the order of their file names. */
export async function readAssets(folder: 'materials' | 'stock'): Promise<readonly unknown[]> {
  const full = path.join(rootFolder(), 'assets', folder);
  const names = (await readdir(full)).filter((name) => name.endsWith('.json')).sort();
  const texts = await Promise.all(names.map((name) => readFile(path.join(full, name), 'utf8')));
  return texts.map((text): unknown => JSON.parse(text));
}
