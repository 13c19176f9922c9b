import { constants } from 'node:fs';
import { open, type FileHandle } from 'node:fs/promises';
import { FileError, toFileError } from './fileError.js';

// A pipe opened without this waits for a writer that may never come; Windows has no such flag.
const WITHOUT_WAITING = 'O_NONBLOCK' in constants ? constants.O_NONBLOCK : 0;

/** Refuses what is not a regular file, and what is too long already by its size. */
async function checkKind(handle: FileHandle, file: string, most: number): Promise<void> {
  const stat = await handle.stat();
  if (stat.isDirectory()) throw new FileError(file, 'this is a folder, not a file', true);
  if (!stat.isFile()) throw new FileError(file, 'this is not a regular file', true);
  if (stat.size > most) throw tooLong(file, most);
}

function tooLong(file: string, most: number): FileError {
  return new FileError(file, `the file is longer than ${most / 1e6} MB; expected at most ${most / 1e6} MB`, true);
}

/** At most so many bytes from the start of a file. */
async function readSome(handle: FileHandle, most: number): Promise<Uint8Array> {
  const buffer = new Uint8Array(most);
  let filled = 0;
  while (filled < most) {
    const { bytesRead } = await handle.read(buffer, filled, most - filled, filled);
    if (bytesRead === 0) break;
    filled += bytesRead;
  }
  return buffer.subarray(0, filled);
}

/**
 * The bytes of a regular file of at most `most` bytes. Folders, devices and pipes are refused unread; the size is looked
 * at first, and minded while reading, since a file can grow.
 * @param path full path
 * @param file as the user named it, for messages
 * @throws FileError
 */
export async function readBounded(path: string, file: string, most: number): Promise<Uint8Array> {
  let handle: FileHandle | null = null;
  try {
    handle = await open(path, constants.O_RDONLY | WITHOUT_WAITING);
    await checkKind(handle, file, most);
    const bytes = await readSome(handle, most + 1);
    if (bytes.length > most) throw tooLong(file, most);
    return bytes;
  } catch (error) {
    throw toFileError(error, file);
  } finally {
    await handle?.close();
  }
}
