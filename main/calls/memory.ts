import { mkdir, rename, stat } from 'node:fs/promises';
import path from 'node:path';
import { readText } from '../files/readText.js';
import { stageText } from '../files/writeAtomic.js';
import { CALL_LIMITS, jsonText } from './json.js';

/** One JSON value in a file of the app's own folder, which is made when it is first needed. */
export interface Memory {
  /** What was kept last; null where there is nothing. A file that cannot be read is put aside, and the log says so. */
  recall(): Promise<unknown>;
  /**
   * Keeps a value: the file holds the old one or the new one, never half of it. Values are written one after another,
   * the last of those that wait in place of the others.
   * @throws Refused where the value is no JSON or too large; FileError
   */
  keep(value: unknown): Promise<void>;
  /** resolves when nothing waits to be written any more */
  settled(): Promise<void>;
}

async function exists(file: string): Promise<boolean> {
  return stat(file).then(
    () => true,
    () => false,
  );
}

async function write(file: string, text: string): Promise<void> {
  // what a user works on is nobody else's to read
  await mkdir(path.dirname(file), { recursive: true, mode: 0o700 });
  await (await stageText(file, file, text)).commit();
}

async function putAside(file: string, error: unknown, log: (line: string) => void): Promise<null> {
  const aside = `${file}.damaged`;
  const why = error instanceof Error ? error.message : 'it cannot be read';
  log(`what was remembered cannot be read and is put aside as ${path.basename(aside)}: ${why}`);
  await rename(file, aside).catch(() => undefined);
  return null;
}

/**
 * The memory in a file.
 * @param file full path
 * @param what the value in words, such as "the window's state"
 */
export function fileMemory(file: string, what: string, log: (line: string) => void): Memory {
  let latest = '';
  let queue: Promise<void> = Promise.resolve();
  const settled = (): Promise<void> => queue.catch(() => undefined);
  return {
    settled,
    recall: async () => {
      await settled();
      if (!(await exists(file))) return null;
      try {
        return JSON.parse(await readText(file, file, CALL_LIMITS.bytes)) as unknown;
      } catch (error) {
        return putAside(file, error, log);
      }
    },
    keep: async (value) => {
      const text = jsonText(value, what);
      latest = text;
      queue = settled().then(() => (latest === text ? write(file, text) : undefined));
      await queue;
    },
  };
}
