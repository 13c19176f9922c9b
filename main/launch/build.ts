import { spawn } from 'node:child_process';
import path from 'node:path';

/** What a program said on both its outputs, and how it ended. */
interface Ran {
  readonly status: number | null;
  readonly said: string;
}

function runQuietly(file: string, args: readonly string[], cwd: string): Promise<Ran> {
  const env = { ...process.env, NO_COLOR: '1' };
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [file, ...args], { cwd, env, stdio: ['ignore', 'pipe', 'pipe'] });
    let said = '';
    const hear = (text: Buffer): void => {
      said += text.toString('utf8');
    };
    child.stdout.on('data', hear);
    child.stderr.on('data', hear);
    child.on('error', (error) => {
      resolve({ status: null, said: error.message });
    });
    child.on('close', (status) => {
      resolve({ status, said });
    });
  });
}

/** What a builder says, without the lines of its stack. */
function withoutStack(said: string): string {
  const lines = said.split('\n').filter((line) => !/^\s+at .*:\d+:\d+\)?$/.test(line));
  return lines.join('\n').trim();
}

/**
 * Builds window and desk, about two seconds, quietly.
 * @returns what went wrong in the builder's own words; null where all is well
 */
export async function build(root: string): Promise<string | null> {
  const builder = path.join(root, 'node_modules', 'electron-vite', 'bin', 'electron-vite.js');
  const args = ['build', '-c', 'electron.config.ts', '--logLevel', 'error'];
  const { status, said } = await runQuietly(builder, args, root);
  return status === 0 ? null : withoutStack(said);
}
