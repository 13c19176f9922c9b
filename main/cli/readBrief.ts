import path from 'node:path';
import type { Brief } from '../../src/job/job.js';
import { JSON_LIMITS } from '../../src/job/jsonLimits.js';
import { parseJson } from '../../src/job/parseJson.js';
import { readJob } from '../../src/job/read.js';
import type { Problem } from '../../src/material/problem.js';
import { readStockCsv } from '../../src/material/stockCsv.js';
import { shownFile } from '../files/fileError.js';
import { loadLibrary } from '../files/library.js';
import { readText } from '../files/readText.js';
import { CallError } from './desk.js';

/** A job as read from its file, and what the reader has to say of it. */
export interface ReadBrief {
  readonly brief: Brief;
  readonly notes: readonly string[];
}

function refused(file: string, problems: readonly Problem[]): CallError {
  return new CallError(problems.map(({ message }) => `${shownFile(file)}: ${message}`));
}

/** The rows of a user's own list, in the job file's words. */
async function stockEntries(file: string, folder: string): Promise<readonly unknown[]> {
  const text = await readText(path.resolve(folder, file), file, JSON_LIMITS.bytes);
  const read = readStockCsv(text, shownFile(file));
  if (!read.ok) throw new CallError(read.problems.map(({ message }) => message));
  return read.entries;
}

/** A job document with its sizes taken from a list; what is no object is left for the reader to refuse. */
function withStock(document: unknown, stock: readonly unknown[]): unknown {
  const isObject = typeof document === 'object' && document !== null && !Array.isArray(document);
  return isObject ? { ...document, sizes: { stock } } : document;
}

/**
 * Reads a job file, and the stock list that is to stand in for its sizes.
 * @param folder against which relative paths are read
 * @throws FileError, CallError
 */
export async function readBrief(file: string, stockFile: string | null, folder: string): Promise<ReadBrief> {
  const parsed = parseJson(await readText(path.resolve(folder, file), file, JSON_LIMITS.bytes));
  if (!parsed.ok) throw refused(file, parsed.problems);
  const document = stockFile === null ? parsed.value : withStock(parsed.value, await stockEntries(stockFile, folder));
  const library = await loadLibrary();
  const read = readJob(document, library.materials, library.stock);
  if (!read.ok) throw refused(file, read.problems);
  return { brief: read.brief, notes: read.notes.map((note) => `${shownFile(file)}: ${note}`) };
}
