import { spawn } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';

/** How long a start waits for Electron's program, ms. */
export const FETCH_LIMIT = 10_000;

/** Electron's program, where its package has fetched it already; null where not. */
export function electronThere(root: string): string | null {
  const folder = path.join(root, 'node_modules', 'electron');
  const note = path.join(folder, 'path.txt');
  if (!existsSync(note)) return null;
  const program = path.join(folder, 'dist', readFileSync(note, 'utf8').trim());
  return existsSync(program) ? program : null;
}

/** Runs the package's own fetching, silently; resolves when it has ended or is out of time. */
function fetchProgram(script: string, limit: number): Promise<void> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [script], { cwd: path.dirname(script), stdio: 'ignore' });
    const timer = setTimeout(() => child.kill(), limit);
    const over = (): void => {
      clearTimeout(timer);
      resolve();
    };
    child.once('error', over);
    child.once('exit', over);
  });
}

/** Electron's program, fetched by its package where it is not there and arrives in time; null where not. */
export async function electronProgram(root: string, limit = FETCH_LIMIT): Promise<string | null> {
  const there = electronThere(root);
  const script = path.join(root, 'node_modules', 'electron', 'install.js');
  if (there !== null || !existsSync(script)) return there;
  await fetchProgram(script, limit);
  return electronThere(root);
}
