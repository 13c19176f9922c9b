import { onTestFinished } from 'vitest';
import { openHost, type BrowserHost } from '../../../main/browser/host.js';
import { openDesk } from '../../../main/calls/desk.js';
import type { WindowFiles } from '../../../main/windowFiles.js';
import { WORKER } from '../solver/workers.js';
import { temporaryFolder } from '../temporary.js';

const bytesOf = (text: string): Uint8Array<ArrayBuffer> => new TextEncoder().encode(text);

/** A window of two files. */
export const FILES: WindowFiles = new Map([
  ['/', { type: 'text/html; charset=utf-8', bytes: bytesOf('<title>Wringwall</title>') }],
  ['/assets/window.js', { type: 'text/javascript; charset=utf-8', bytes: bytesOf('0;') }],
]);

/** A browser host over a folder, and the lines of its log. */
export async function openedHost(folder: string): Promise<{ readonly host: BrowserHost; readonly log: string[] }> {
  const log: string[] = [];
  const note = (line: string): void => {
    log.push(line);
  };
  const desk = await openDesk({ worker: WORKER, folder, log: note });
  return { host: await openHost({ desk, files: FILES, log: note }), log };
}

/** A browser host that ends with its test. */
export async function testHost(): Promise<{ readonly host: BrowserHost; readonly log: string[] }> {
  const opened = await openedHost(temporaryFolder());
  onTestFinished(() => opened.host.close());
  return opened;
}
