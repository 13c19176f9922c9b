import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { build, type Rolldown } from 'vite';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { METAL_LIMITS } from '../../src/limit/index.js';
import type { Engine } from './engine.js';
import { CHECKED, KNOWN_FAILURES } from './index.js';
import { CONSTANT_MUTANTS, LIMIT_MUTANTS, type Mutant } from './mutants.js';
import { codeMiss, type Row } from './row.js';

const SRC = join(import.meta.dirname, '..', '..', 'src');

/** No searches: over a limit whose value and enclosure disagree they have no reason to end soon. */
const HELD = CHECKED.filter(({ id }) => !KNOWN_FAILURES.has(id));

let folder = '';
let built = 0;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'mutants-'));
});

afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

/** The engine bundled from its source with one file changed. */
async function mutated({ file, find, replace }: Mutant): Promise<Engine> {
  const changedFile = join(SRC, file);
  const source = readFileSync(changedFile, 'utf8');
  const changed = source.replaceAll(find, replace);
  expect(changed, `${file} no longer has "${find}"`).not.toBe(source);
  return engineFrom((id) => (id === changedFile ? changed : null));
}

async function engineFrom(load: (id: string) => string | null): Promise<Engine> {
  const output = (await build({
    configFile: false,
    logLevel: 'error',
    plugins: [{ name: 'mutant', enforce: 'pre', load }],
    build: {
      lib: { entry: join(import.meta.dirname, 'engine.ts'), formats: ['es'] },
      write: false,
      minify: false,
      target: 'es2022',
    },
  })) as Rolldown.RolldownOutput[];
  const code = output[0]?.output[0].code ?? '';
  const file = join(folder, `${built++}.mjs`);
  writeFileSync(file, code);
  const module = (await import(pathToFileURL(file).href)) as { engine: Engine };
  return module.engine;
}

/** Ids of the rows that a changed engine misses; one that throws misses too. */
function missed(engine: Engine): string[] {
  const misses = (row: Row): boolean => {
    try {
      return codeMiss(row, engine) !== null;
    } catch {
      return true;
    }
  };
  return HELD.filter(misses).map(({ id }) => id);
}

describe('an engine whose constants are off by one percent', () => {
  it('is told from the unchanged copy, which gives every row', async () => {
    expect(missed(await engineFrom(() => null))).toEqual([]);
  });

  it('has a mutant for every limit', () => {
    expect(LIMIT_MUTANTS.map(({ what }) => what)).toEqual(METAL_LIMITS.map(({ id }) => id));
  });

  it.each(LIMIT_MUTANTS)('is caught by two rows or more: $what', async (mutant) => {
    const found = missed(await mutated(mutant));
    expect(found.length).toBeGreaterThanOrEqual(2);
  });

  it.each(CONSTANT_MUTANTS)('is caught: $what', async (mutant) => {
    expect(missed(await mutated(mutant))).not.toEqual([]);
  });
});
