import { FileError } from './fileError.js';
import { readBounded } from './readBounded.js';

function startsWith(bytes: Uint8Array, ...head: readonly number[]): boolean {
  return head.every((byte, index) => bytes[index] === byte);
}

/** What bytes are that are not UTF-8, as far as their head tells. */
function otherThanUtf8(bytes: Uint8Array): string {
  const utf16 = startsWith(bytes, 0xff, 0xfe) || startsWith(bytes, 0xfe, 0xff);
  if (utf16) return 'this is text in UTF-16';
  return bytes.includes(0) ? 'this is a binary file' : 'this is a binary file or text in another encoding';
}

/**
 * Bytes as text, a byte order mark kept.
 * @throws FileError where they are not UTF-8
 */
export function decodeUtf8(bytes: Uint8Array, file: string): string {
  try {
    return new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes);
  } catch {
    throw new FileError(file, `${otherThanUtf8(bytes)}; expected text in UTF-8`, true);
  }
}

/**
 * The text of a regular UTF-8 file of at most `most` bytes.
 * @param path full path
 * @param file as the user named it, for messages
 * @throws FileError
 */
export async function readText(path: string, file: string, most: number): Promise<string> {
  return decodeUtf8(await readBounded(path, file, most), file);
}
