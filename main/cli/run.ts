import { clip } from '../../src/material/problem.js';
import type { Report } from '../../src/report/report.js';
import { FileError } from '../files/fileError.js';
import { readCall, type Call } from './args.js';
import { CallError, EXIT, type Desk } from './desk.js';

type SizeCall = Extract<Call, { ask: 'size' }>;

const CLEAR_LINE = '\r\u001b[2K';

interface Progress {
  readonly tell: (done: number, of: number, name: string) => void;
  readonly end: () => void;
}

/** Tells progress on one line of a terminal, and clears it at the end; silent elsewhere. */
function progressOn(desk: Desk, quiet: boolean): Progress {
  const shows = desk.terminal && !quiet;
  return {
    tell: (done, of, name) => {
      if (shows) desk.err(`${CLEAR_LINE}${done} of ${of}: ${clip(name)}`);
    },
    end: () => {
      if (shows) desk.err(CLEAR_LINE);
    },
  };
}

async function size(call: SizeCall, desk: Desk): Promise<number> {
  // fetched here, so that a wrong call or --help is answered without the engine
  const { checkOutputs, reportText, writeOutputs } = await import('./outputs.js');
  const { readBrief } = await import('./readBrief.js');
  await checkOutputs(call, desk.folder);
  const { brief, notes } = await readBrief(call.job, call.stock, desk.folder);
  if (!call.quiet) for (const note of notes) desk.err(`${note}\n`);
  const sizeJob = await desk.engine();
  const progress = progressOn(desk, call.quiet);
  const report = sizeJob(brief, progress.tell);
  progress.end();
  await writeOutputs(call, report, desk.folder);
  if (call.json === '-') desk.out(reportText(report));
  else if (!call.quiet) desk.out(await tableText(report));
  return report.candidates.some(({ feasible }) => feasible) ? EXIT.found : EXIT.nothingFits;
}

async function tableText(report: Report): Promise<string> {
  const { reportTable } = await import('../../src/report/table.js');
  return `${reportTable(report).join('\n')}\n`;
}

async function answer(call: Call, desk: Desk): Promise<number> {
  if (call.ask === 'size') return size(call, desk);
  if (call.ask === 'help') desk.out((await import('./help.js')).HELP);
  else desk.out(`${(await import('../files/assets.js')).programVersion()}\n`);
  return EXIT.found;
}

/** The sentences for an error, and the exit status. */
function explain(error: unknown): readonly [readonly string[], number] {
  if (error instanceof CallError) return [error.sentences, EXIT.wrong];
  if (error instanceof FileError) return [[error.message], error.mendable ? EXIT.wrong : EXIT.failed];
  const said = error instanceof Error ? error.message : String(error);
  return [[`wringwall: an unexpected error: ${said.split('\n')[0] ?? ''}`], EXIT.failed];
}

/**
 * Answers a command line: sizes a job, prints and writes what is asked for.
 * @param argv the arguments after the program's name
 * @returns the exit status; nothing is thrown, and every mistake is told on standard error
 */
export async function run(argv: readonly string[], desk: Desk): Promise<number> {
  const read = readCall(argv);
  if (!read.ok) {
    desk.err(`${read.message}\n`);
    return EXIT.wrong;
  }
  try {
    return await answer(read.call, desk);
  } catch (error) {
    const [sentences, status] = explain(error);
    desk.err(sentences.map((sentence) => `${sentence}\n`).join(''));
    return status;
  }
}
