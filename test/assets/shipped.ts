import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

/** A file of assets/: its name without ".json", and its content as parsed. */
export interface Shipped {
  readonly name: string;
  readonly content: unknown;
}

/** The JSON files of a folder of assets/, in the order of their names. */
export function shipped(folder: 'materials' | 'stock'): readonly Shipped[] {
  const root = fileURLToPath(new URL(`../../assets/${folder}/`, import.meta.url));
  const files = readdirSync(root).sort();
  return files.map((file) => ({
    name: file.replace(/\.json$/, ''),
    content: JSON.parse(readFileSync(`${root}${file}`, 'utf8')) as unknown,
  }));
}
