import { existsSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { programVersion, readAssets, rootFolder } from '../../../main/files/assets.js';
import { loadLibrary } from '../../../main/files/library.js';

describe('the assets', () => {
  it('are found above the source', () => {
    expect(existsSync(path.join(rootFolder(), 'package.json'))).toBe(true);
  });

  it('come with the version of the program', () => {
    expect(programVersion()).toMatch(/^\d+\.\d+\.\d+$/);
  });

  it('hold every record and stock list that the library has', async () => {
    const { materials, stock } = await loadLibrary();
    expect(materials.size).toBe((await readAssets('materials')).length);
    expect(materials.get('al-6061-t6')?.family).toBe('aluminium');
    expect(stock.has('metric-precision')).toBe(true);
  });
});
