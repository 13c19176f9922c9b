import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** A browser's folder of its own, taken for as long as its window is open. */
export interface Profile {
  readonly folder: string;
  readonly release: () => void;
}

/** How many windows may be open at once, each started by itself. */
const MOST_PROFILES = 8;

function isRunning(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    // a process of somebody else's is there too
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
}

function holderOf(lock: string): number {
  try {
    return Number.parseInt(readFileSync(lock, 'utf8'), 10);
  } catch {
    return NaN;
  }
}

/** Writes the lock, unless a process that still runs holds it. */
function takeLock(lock: string): boolean {
  const holder = holderOf(lock);
  if (holder > 0 && isRunning(holder)) return false;
  rmSync(lock, { force: true });
  try {
    writeFileSync(lock, String(process.pid), { flag: 'wx' });
    return true;
  } catch {
    return false;
  }
}

/**
 * Takes the first free profile of the app's folder. Two starts must not share one: the second browser would hand its
 * address to the first and end, and with it the second host.
 * @returns null where all are taken
 */
export function takeProfile(folder: string): Profile | null {
  for (let number = 1; number <= MOST_PROFILES; number++) {
    const own = path.join(folder, 'browser', String(number));
    const lock = `${own}.lock`;
    mkdirSync(path.dirname(own), { recursive: true, mode: 0o700 });
    if (!takeLock(lock)) continue;
    mkdirSync(own, { recursive: true, mode: 0o700 });
    const release = (): void => {
      rmSync(lock, { force: true });
    };
    return { folder: own, release };
  }
  return null;
}
