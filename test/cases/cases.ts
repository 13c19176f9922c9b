import { readFileSync } from 'node:fs';
import { loadLibrary } from '../../main/files/library.js';
import type { Brief } from '../../src/job/job.js';
import { readJobText } from '../../src/job/read.js';
import type { LimitId } from '../../src/report/report.js';
import type { Task } from '../src/sizing/jobs.js';

/**
 * The answer for one material of a case: found by brute force (dense scan of wall, bisection for the least diameter,
 * refinement) with a program of its own. SI; where two limits are full at once either may be named.
 */
export interface Answer {
  readonly material: string;
  readonly feasible: boolean;
  readonly mass?: number;
  readonly outerDiameter?: number;
  readonly wall?: number;
  readonly governs?: LimitId;
  /** by limit, the fullest over the loads */
  readonly utilisation?: Readonly<Partial<Record<LimitId, number>>>;
}

export interface Case {
  readonly name: string;
  readonly brief: Brief;
  readonly answers: readonly Answer[];
}

const textOf = (file: string): string => readFileSync(new URL(file, import.meta.url), 'utf8');

const library = await loadLibrary();
const expected = JSON.parse(textOf('expected.json')) as Record<string, readonly Answer[]>;

/** The alignment cases as a user's files are read. */
export const CASES: readonly Case[] = Object.entries(expected).map(([name, answers]) => {
  const read = readJobText(textOf(name), library.materials, library.stock);
  if (!read.ok) throw new Error(`${name}: ${JSON.stringify(read.problems)}`);
  return { name, brief: read.brief, answers };
});

/** Every material of every case whose sizes are free. */
export function alignmentTasks(): { name: string; task: Task; feasible: boolean }[] {
  return CASES.filter(({ brief }) => brief.job.sizes === 'any').flatMap(({ name, brief: { job }, answers }) =>
    job.materials.map((metal) => {
      const feasible = answers.find(({ material }) => material === metal.id)?.feasible === true;
      return { name: `${name}, ${metal.id}`, task: { job, metal }, feasible };
    }),
  );
}
