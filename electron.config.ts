import path from 'node:path';
import vue from '@vitejs/plugin-vue';
import { defineConfig } from 'electron-vite';

const MAIN = { size: 'main/cli/size.ts', worker: 'main/solver/worker.ts', app: 'main/electron/app.ts' };

/**
 * The build of what a machine runs: the command line and the desk, which need nothing but Node or Electron, and the
 * window. It bundles every package it uses, so that dist/ stands without node_modules.
 */
export default defineConfig({
  main: {
    build: {
      outDir: 'dist/main',
      target: 'node20',
      sourcemap: true,
      rolldownOptions: {
        input: MAIN,
        // one flat folder, so that each entry finds the others beside itself
        output: { format: 'es', entryFileNames: '[name].js', chunkFileNames: '[name]-[hash].js' },
      },
    },
  },
  preload: {
    build: {
      outDir: 'dist/preload',
      rolldownOptions: {
        input: { preload: 'main/electron/preload.ts' },
        // a sandboxed preload is a classic script
        output: { format: 'cjs', entryFileNames: '[name].cjs' },
      },
    },
  },
  renderer: {
    root: 'renderer',
    base: './',
    plugins: [vue()],
    build: {
      outDir: path.resolve('dist/renderer'),
      target: 'chrome120',
      minify: true,
      // the content security policy lets the page load files, not data in a style sheet
      assetsInlineLimit: 0,
      modulePreload: { polyfill: false },
      rolldownOptions: { input: 'renderer/index.html' },
    },
  },
});
