import { existsSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';
import { electronProgram, electronThere } from '../../../main/launch/electronProgram.js';
import { temporaryFolder } from '../temporary.js';
import { put } from './builtRoot.js';

const FETCH = `
const { mkdirSync, writeFileSync } = require('node:fs');
mkdirSync('dist');
writeFileSync('dist/electron', '');
writeFileSync('path.txt', 'electron');
`;

it('is there once its package has fetched it', async () => {
  const root = temporaryFolder();
  expect(electronThere(root)).toBeNull();
  put(root, 'node_modules/electron/path.txt', 'electron');
  expect(electronThere(root)).toBeNull();
  const program = put(root, 'node_modules/electron/dist/electron', '');
  expect(electronThere(root)).toBe(program);
  expect(await electronProgram(root)).toBe(program);
});

it('is fetched by its package where it is not there', async () => {
  const root = temporaryFolder();
  put(root, 'node_modules/electron/install.js', FETCH);
  expect(await electronProgram(root)).toBe(path.join(root, 'node_modules', 'electron', 'dist', 'electron'));
});

it('is given up where fetching fails, or takes longer than the limit', async () => {
  const root = temporaryFolder();
  expect(await electronProgram(root)).toBeNull();
  put(root, 'node_modules/electron/install.js', 'process.exit(1)');
  expect(await electronProgram(root)).toBeNull();
  put(root, 'node_modules/electron/install.js', `setTimeout(() => { ${FETCH} }, 3000)`);
  const begun = performance.now();
  expect(await electronProgram(root, 300)).toBeNull();
  expect(performance.now() - begun).toBeLessThan(2500);
  expect(existsSync(path.join(root, 'node_modules', 'electron', 'path.txt'))).toBe(false);
});
