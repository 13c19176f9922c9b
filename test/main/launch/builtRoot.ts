import { chmodSync, mkdirSync, utimesSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { WORKER } from '../solver/workers.js';
import { temporaryFolder } from '../temporary.js';

/** Writes a file and the folders above it. */
export function put(root: string, name: string, text: string): string {
  const file = path.join(root, name);
  mkdirSync(path.dirname(file), { recursive: true });
  writeFileSync(file, text);
  return file;
}

/** Writes a program that a shell runs. */
export function putProgram(root: string, name: string, script: string): string {
  const file = put(root, name, `#!/bin/sh\n${script}\n`);
  chmodSync(file, 0o755);
  return file;
}

/** Sets the time at which a file was changed last, in seconds from now. */
export function age(root: string, name: string, seconds: number): void {
  const time = Date.now() / 1000 + seconds;
  utimesSync(path.join(root, name), time, time);
}

export const PRODUCTS = [
  'dist/main/app.js',
  'dist/main/worker.js',
  'dist/preload/preload.cjs',
  'dist/renderer/index.html',
];

/** A root folder with a build that is newer than its sources; its worker is the tests' own. */
export function builtRoot(): string {
  const root = temporaryFolder();
  put(root, 'package.json', '{"type":"module"}');
  put(root, 'src/index.ts', '');
  for (const product of PRODUCTS) put(root, product, '');
  put(root, 'dist/main/worker.js', `import ${JSON.stringify(pathToFileURL(WORKER).href)};`);
  for (const source of ['package.json', 'src/index.ts', 'src']) age(root, source, -60);
  return root;
}
