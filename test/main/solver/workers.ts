import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { build } from 'vite';
import { afterAll, onTestFinished } from 'vitest';
import { readShipped, type Shipped } from '../../../main/calls/shipped.js';
import { Runner, type RunnerOptions } from '../../../main/solver/runner.js';

const root = path.join(import.meta.dirname, '..', '..', '..');
const folder = mkdtempSync(path.join(tmpdir(), 'wringwall-workers-'));
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

await build({
  root,
  configFile: false,
  logLevel: 'silent',
  // the folder has no packages beside it
  ssr: { noExternal: true },
  build: {
    ssr: true,
    outDir: folder,
    rolldownOptions: {
      input: {
        worker: path.join(root, 'main', 'solver', 'worker.ts'),
        unsound: path.join(root, 'test', 'main', 'solver', 'unsound.ts'),
      },
      output: { entryFileNames: '[name].mjs', chunkFileNames: '[name]-[hash].mjs' },
    },
  },
});

/** The worker, bundled for the tests as the build does it: it starts in a tenth of the time of its source. */
export const WORKER = path.join(folder, 'worker.mjs');
/** A worker that dies or hangs when its job says so. */
export const UNSOUND_WORKER = path.join(folder, 'unsound.mjs');
/** The worker from its TypeScript source. */
export const SOURCE_WORKER = path.join(import.meta.dirname, 'fromSource.mjs');

/** What is shipped, read once. */
export const SHIPPED: Shipped = await readShipped();

/** A runner that ends with its test. */
export function testRunner(entry = WORKER, own: Partial<RunnerOptions> = {}): Runner {
  const runner = new Runner({ entry, library: SHIPPED, ...own });
  onTestFinished(() => runner.close());
  return runner;
}
