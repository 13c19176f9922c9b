import { rmSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';
import { isBuilt } from '../../../main/launch/freshness.js';
import { age, builtRoot, PRODUCTS, put } from './builtRoot.js';

it('is built where all is newer than what it is made from', () => {
  expect(isBuilt(builtRoot())).toBe(true);
});

it.each(PRODUCTS)('is not built without %s', (product) => {
  const root = builtRoot();
  rmSync(path.join(root, product));
  expect(isBuilt(root)).toBe(false);
});

it.each(['main/a.ts', 'renderer/deep/b.vue', 'src/c.ts', 'assets/d.json', 'electron.config.ts', 'package.json'])(
  'is not built when %s is newer',
  (source) => {
    const root = builtRoot();
    put(root, source, '');
    age(root, source, 60);
    expect(isBuilt(root)).toBe(false);
  },
);

it('is not built when a source was taken away since', () => {
  const root = builtRoot();
  rmSync(path.join(root, 'src', 'index.ts'));
  age(root, 'src', 60);
  expect(isBuilt(root)).toBe(false);
});
