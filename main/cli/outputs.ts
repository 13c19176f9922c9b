import { realpath, stat } from 'node:fs/promises';
import path from 'node:path';
import type { Report } from '../../src/report/report.js';
import { reportCsv } from '../../src/report/csv.js';
import { FileError, shownFile, toFileError } from '../files/fileError.js';
import { writeAll } from '../files/writeAtomic.js';
import type { Call } from './args.js';
import { CallError } from './desk.js';

type SizeCall = Extract<Call, { ask: 'size' }>;

/** The report as JSON text. */
export function reportText(report: Report): string {
  return `${JSON.stringify(report, null, 2)}\n`;
}

/** A full path with links followed as far as it exists, so that two names of one file are seen to be one. */
async function realOf(full: string): Promise<string> {
  try {
    return await realpath(full);
  } catch {
    const folder = path.dirname(full);
    return folder === full ? full : path.join(await realOf(folder), path.basename(full));
  }
}

async function checkFolder(file: string, folder: string): Promise<void> {
  const parent = path.dirname(path.resolve(folder, file));
  const found = await stat(parent).catch((error: unknown) => {
    throw toFileError(error, file);
  });
  if (!found.isDirectory()) throw new FileError(file, 'a part of the path is not a folder', true);
}

function filesOf({ json, csv }: SizeCall): readonly string[] {
  return [json, csv].filter((file) => file !== null && file !== '-').map(String);
}

/**
 * Sees before the sizing that what is to be written can be: that its folders exist, and that no file is written over
 * another of the call.
 * @throws FileError, CallError
 */
export async function checkOutputs(call: SizeCall, folder: string): Promise<void> {
  const files = filesOf(call);
  for (const file of files) await checkFolder(file, folder);
  const all = [call.job, ...(call.stock === null ? [] : [call.stock]), ...files];
  const real = await Promise.all(all.map((file) => realOf(path.resolve(folder, file))));
  const inputs = all.length - files.length;
  const taken = all.find((_, index) => index >= inputs && real.indexOf(real[index] ?? '') !== index);
  if (taken !== undefined)
    throw new CallError([`${shownFile(taken)}: another file of this call has this name; expected one of its own`]);
}

/**
 * Writes the files that a call asks for, all or none.
 * @throws FileError
 */
export async function writeOutputs(call: SizeCall, report: Report, folder: string): Promise<void> {
  const { json, csv } = call;
  const texts = [
    ...(json === null || json === '-' ? [] : [{ file: json, text: reportText(report) }]),
    ...(csv === null ? [] : [{ file: csv, text: reportCsv(report) }]),
  ];
  await writeAll(texts.map(({ file, text }) => ({ target: path.resolve(folder, file), file, text })));
}
