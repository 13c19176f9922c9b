import path from 'node:path';
import { openDesk } from '../calls/desk.js';
import { builtWorker } from '../solver/entry.js';
import { readWindowFiles } from '../windowFiles.js';
import { openHost, type BrowserHost } from './host.js';

/**
 * Opens the browser host over the built program.
 * @param root the folder that holds dist/
 * @param folder the app's own folder
 */
export async function serveBuilt(root: string, folder: string, log: (line: string) => void): Promise<BrowserHost> {
  const built = path.join(root, 'dist');
  const worker = builtWorker(path.join(built, 'main'));
  const [desk, files] = await Promise.all([
    openDesk({ worker, folder, log }),
    readWindowFiles(path.join(built, 'renderer')),
  ]);
  return openHost({ desk, files, log });
}
