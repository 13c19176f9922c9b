import { expect, it } from 'vitest';
import { build } from '../../../main/launch/build.js';
import { temporaryFolder } from '../temporary.js';
import { put } from './builtRoot.js';

const BUILDER = 'node_modules/electron-vite/bin/electron-vite.js';

function rootWith(builder: string): string {
  const root = temporaryFolder();
  put(root, BUILDER, builder);
  return root;
}

it('is quiet where all is well', async () => {
  const checked = `process.exit(process.argv.slice(2).join(' ') === 'build -c electron.config.ts --logLevel error' ? 0 : 1)`;
  expect(await build(rootWith(`console.log('built'); ${checked}`))).toBeNull();
});

it("tells what went wrong in the builder's words, without its stack", async () => {
  const fault = `console.error('no such module\\n    at load (builder.js:1:2)\\n  in renderer/App.vue'); process.exit(1)`;
  expect(await build(rootWith(fault))).toBe('no such module\n  in renderer/App.vue');
});
