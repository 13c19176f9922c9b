/** What the usual faults of a path are called, and whether the caller can mend them by another path or permission. */
const FAULTS: ReadonlyMap<string, readonly [string, boolean]> = new Map<string, readonly [string, boolean]>([
  ['ENOENT', ['there is no such file or folder', true]],
  ['ENOTDIR', ['a part of the path is not a folder', true]],
  ['EISDIR', ['this is a folder, not a file', true]],
  ['EACCES', ['permission is denied', true]],
  ['EPERM', ['permission is denied', true]],
  ['EROFS', ['the disk is read-only', true]],
  ['ELOOP', ['the path goes round in links', true]],
  ['ENAMETOOLONG', ['the name is too long', true]],
  ['ENXIO', ['this is not a regular file', true]],
  ['ENOSPC', ['the disk is full', false]],
  ['EDQUOT', ['the disk quota is used up', false]],
  ['EIO', ['the disk reports an error', false]],
]);

const UNPRINTABLE = /[\p{C}\p{Zl}\p{Zp}]/gu;

/** A file's name as a message shows it: in full, characters that cannot be printed escaped. */
export function shownFile(file: string): string {
  return file.replace(UNPRINTABLE, (character) => `\\u{${(character.codePointAt(0) ?? 0).toString(16)}}`);
}

/** A file that cannot be read or written, in a sentence that names it. */
export class FileError extends Error {
  override readonly name = 'FileError';

  /**
   * @param file as the user named it
   * @param wrong what is wrong, without a full stop
   * @param mendable whether another path, file or permission would do; false for faults of the machine
   */
  constructor(
    readonly file: string,
    readonly wrong: string,
    readonly mendable: boolean,
  ) {
    super(`${shownFile(file)}: ${wrong}`);
  }
}

function codeOf(error: unknown): string {
  return error instanceof Error && 'code' in error && typeof error.code === 'string' ? error.code : '';
}

/** A fault of the file system as a `FileError`; a `FileError` as it is. */
export function toFileError(error: unknown, file: string): FileError {
  if (error instanceof FileError) return error;
  const code = codeOf(error);
  const [wrong, mendable] = FAULTS.get(code) ?? [`the file system reports ${code || 'an error'}`, false];
  return new FileError(file, wrong, mendable);
}
