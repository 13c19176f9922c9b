import { randomBytes } from 'node:crypto';
import type { Stats } from 'node:fs';
import { chmod, open, realpath, rename, rm, stat, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { FileError, toFileError } from './fileError.js';

/** Text that is written beside its file and waits to take its place. */
export interface Staged {
  /** Puts the text in place. */
  commit(): Promise<void>;
  /** Leaves the file as it was. */
  discard(): Promise<void>;
}

function isMissing(error: unknown): boolean {
  return error instanceof Error && 'code' in error && error.code === 'ENOENT';
}

async function statIfThere(target: string): Promise<Stats | null> {
  try {
    return await stat(target);
  } catch (error) {
    if (isMissing(error)) return null;
    throw error;
  }
}

/** The file behind a link, so that the link stays and its target is replaced. */
async function behindLinks(target: string): Promise<string> {
  try {
    return await realpath(target);
  } catch (error) {
    if (isMissing(error)) return target;
    throw error;
  }
}

async function writeNew(temporary: string, text: string, mode: number | null): Promise<void> {
  const handle = await open(temporary, 'wx');
  try {
    await handle.writeFile(text, 'utf8');
    await handle.sync();
  } finally {
    await handle.close();
  }
  // the mode given to open would be cut by the umask
  if (mode !== null) await chmod(temporary, mode & 0o7777);
}

async function guarded<T>(file: string, work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    throw toFileError(error, file);
  }
}

/** Devices and pipes cannot be replaced by a file, and must not be: they are written to. */
function stageDevice(target: string, file: string, text: string): Staged {
  return { commit: () => guarded(file, () => writeFile(target, text, 'utf8')), discard: () => Promise.resolve() };
}

async function stageFile(target: string, file: string, text: string, mode: number | null): Promise<Staged> {
  const name = `.${path.basename(target).slice(0, 100)}.${randomBytes(6).toString('hex')}.tmp`;
  const temporary = path.join(path.dirname(target), name);
  const discard = (): Promise<void> => rm(temporary, { force: true });
  try {
    await writeNew(temporary, text, mode);
  } catch (error) {
    await discard();
    throw error;
  }
  return { commit: () => guarded(file, () => rename(temporary, target)), discard };
}

/**
 * Writes text to a new file in the folder of `target`, to take its place on `commit`: readers see the old file or the
 * new one, never half of it. The mode of a file that is replaced is kept.
 * @param target full path
 * @param file as the user named it, for messages
 * @throws FileError, with nothing left behind
 */
export function stageText(target: string, file: string, text: string): Promise<Staged> {
  return guarded(file, async () => {
    const real = await behindLinks(target);
    const old = await statIfThere(real);
    if (old?.isDirectory() === true) throw new FileError(file, 'this is a folder, not a file', true);
    if (old !== null && !old.isFile()) return stageDevice(real, file, text);
    return stageFile(real, file, text, old?.mode ?? null);
  });
}

/** `stageText` for several files: all are staged before the first takes its place. */
export async function writeAll(
  texts: readonly { readonly target: string; readonly file: string; readonly text: string }[],
): Promise<void> {
  const staged: Staged[] = [];
  try {
    for (const { target, file, text } of texts) staged.push(await stageText(target, file, text));
    for (const one of staged) await one.commit();
  } catch (error) {
    await Promise.all(staged.map((one) => one.discard()));
    throw error;
  }
}
