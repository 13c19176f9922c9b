import { ESLint, Linter } from 'eslint';
import tseslint from 'typescript-eslint';
import { describe, expect, it } from 'vitest';
import wringwall, { LAYERS } from '../../eslint.layers.js';

/** What the rule says about one line of code, were it to stand in `file`; empty where it is content. */
function complaints(file: string, code: string): string[] {
  const linter = new Linter({ configType: 'flat' });
  const config: Linter.Config = {
    files: ['**/*.ts'],
    languageOptions: { parser: tseslint.parser },
    plugins: { wringwall },
    rules: { 'wringwall/layers': 'error' },
  };
  return linter.verify(code, config, { filename: file }).map((message) => message.message);
}

const REFUSED: readonly (readonly [file: string, code: string, why: RegExp])[] = [
  ['src/quantity/unit.ts', `import { Metal } from '../material/material.js';`, /quantity stands below material/],
  ['src/tube/tube.ts', `import type { Wall } from '../buckling/wall.js';`, /tube stands below buckling/],
  ['src/tube/tube.ts', `export { wall } from '../buckling/wall.js';`, /tube stands below buckling/],
  ['src/tube/tube.ts', `export * from '../limit/index.js';`, /tube stands below limit/],
  ['src/tube/tube.ts', `const wall = await import('../buckling/wall.js');`, /tube stands below buckling/],
  ['src/tube/tube.ts', `type Wall = import('../buckling/wall.js').Wall;`, /tube stands below buckling/],
  ['src/limit/twist.ts', `import { report } from '../report/report.js';`, /limit stands below report/],
  ['src/sizing/size.ts', `import { sizeJob } from '../index.js';`, /public list/],
  ['src/sizing/size.ts', `import { help } from '../helpers/help.js';`, /not a layer/],
  ['src/helpers/help.ts', `import { Tube } from '../tube/tube.js';`, /not a layer/],
  ['src/index.ts', `import { run } from '../main/calls/size.js';`, /src may not import main/],
  ['src/figure/map.ts', `import { TOKENS } from '../../renderer/theme/tokens.js';`, /src may not import renderer/],
  ['src/job/digest.ts', `import { createHash } from 'node:crypto';`, /may not import node:crypto/],
  ['src/job/digest.ts', `import fs from 'fs';`, /may not import fs/],
  ['src/job/digest.ts', `import { app } from 'electron';`, /may not import electron/],
  ['src/job/digest.ts', `import { ref } from 'vue';`, /may not import vue/],
  ['renderer/bridge.ts', `import { size } from '../main/calls/size.js';`, /renderer may not import main/],
  ['renderer/bridge.ts', `import { CALLS } from '../main/contract.js';`, /renderer may not import main/],
  ['main/start.ts', `import { TOKENS } from '../renderer/theme/tokens.js';`, /main may not import renderer/],
  ['main/start.ts', `import { count } from '../test/tally.js';`, /main may not import test/],
];

const ACCEPTED: readonly (readonly [file: string, code: string])[] = [
  ['src/material/material.ts', `import { parse } from '../quantity/parse.js';`],
  ['src/limit/twist.ts', `import { section } from '../tube/section.js';`],
  ['src/limit/twist.ts', `import { margin } from './margin.js';`],
  ['src/limit/twist.ts', `import type { LimitEntry } from '../report/report.js';`],
  ['src/memo/page.ts', `import { section } from '../figure/section.js';`],
  ['src/job/digest.ts', `import canonicalize from 'canonicalize';`],
  ['src/index.ts', `export { size } from './sizing/size.js';`],
  ['main/calls/size.ts', `import { size } from '../../src/index.js'; import fs from 'node:fs';`],
  ['renderer/bridge.ts', `import type { Contract } from '../main/contract.js';`],
  ['renderer/bridge.ts', `import { format } from '../src/index.js'; import { ref } from 'vue';`],
  ['test/src/tube/tube.test.ts', `import { wall } from '../../../src/buckling/wall.js';`],
];

describe('the layers', () => {
  it.each(REFUSED)('refuse in %s: %s', (file, code, why) => {
    expect(complaints(file, code)).toEqual([expect.stringMatching(why)]);
  });

  it.each(ACCEPTED)('accept in %s: %s', (file, code) => {
    expect(complaints(file, code)).toEqual([]);
  });

  it('refuse every step from a folder to one above it, and accept every step down', () => {
    for (const [from, source] of LAYERS.entries()) {
      for (const [to, target] of LAYERS.entries()) {
        const found = complaints(`src/${source}/a.ts`, `import { b } from '../${target}/b.js';`);
        expect(found, `${source} imports ${target}`).toHaveLength(to > from ? 1 : 0);
      }
    }
  });
});

describe('the lint configuration', () => {
  it.each(['src/limit/twist.ts', 'main/cli/size.ts', 'renderer/bridge.ts'])('puts %s under the rule', async (file) => {
    const config: unknown = await new ESLint().calculateConfigForFile(file);
    expect(config).toMatchObject({
      linterOptions: { noInlineConfig: true },
      rules: { 'wringwall/layers': [2], '@typescript-eslint/no-explicit-any': [2] },
    });
  });
});
