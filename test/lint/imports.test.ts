import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { findCircle, readImports } from './imports.js';

const ROOT = path.resolve(import.meta.dirname, '../..');

describe('findCircle', () => {
  it('finds none in a tree, though two ways lead to one file', () => {
    const imports = new Map([
      ['a', ['b', 'c']],
      ['b', ['d']],
      ['c', ['d']],
      ['d', []],
    ]);
    expect(findCircle(imports)).toBeNull();
  });

  it('names a circle that lies behind other files', () => {
    const imports = new Map([
      ['a', ['b']],
      ['b', ['c']],
      ['c', ['d']],
      ['d', ['b']],
    ]);
    expect(findCircle(imports)).toEqual(['b', 'c', 'd', 'b']);
  });

  it('takes a file that imports itself for a circle', () => {
    expect(findCircle(new Map([['a', ['a']]]))).toEqual(['a', 'a']);
  });
});

describe('the imports of the whole tree', () => {
  const imports = readImports(ROOT);

  it('are read: values and types, from engine, renderer and tests', () => {
    expect(imports.get('test/lint/imports.test.ts')).toEqual(['test/lint/imports.ts']);
    expect(imports.get('test/renderer/theme/tokens.test.ts')).toEqual([
      'src/figure/marker.ts',
      'renderer/theme/tokens.ts',
    ]);
    expect(imports.get('src/report/report.ts')).toContain('src/job/job.ts');
    expect(imports.get('test/lint/layers.test.ts')).toEqual(['eslint.layers.js']);
  });

  it('hold no circle', () => {
    expect(findCircle(imports)).toBeNull();
  });
});
