import { expect, it } from 'vitest';
import { readShipped } from '../../../main/calls/shipped.js';
import { ENGINE_VERSION, readJob } from '../../../src/index.js';
import { loadLibrary } from '../../../main/files/library.js';

it('is the version, the library, and the demo jobs with the one to show first leading, each of them sound', async () => {
  const { version, records, stockLists, demos } = await readShipped();
  const library = await loadLibrary();
  expect(version).toBe(ENGINE_VERSION);
  expect(records).toHaveLength(library.materials.size);
  expect(stockLists).toHaveLength(library.stock.size);
  expect(demos.map((demo) => (demo as { number: string }).number)[0]).toBe('DEMO-1');
  expect(new Set(demos.map((demo) => (demo as { title: string }).title)).size).toBe(demos.length);
  for (const demo of demos) expect(readJob(demo, library.materials, library.stock).ok).toBe(true);
});
