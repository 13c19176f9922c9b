import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { alignmentTasks } from '../cases/cases.js';
import { HARD } from '../src/sizing/hard.js';
import { tasks, type Task } from '../src/sizing/jobs.js';
import { least } from '../../src/sizing/least.js';
import { Problem } from '../../src/sizing/problem.js';
import { minimised } from './minimise.js';

/** Foil of a micrometre is the end of this engine's sizes, not of the minimiser's. */
const hard = Object.entries(HARD).filter(([name]) => !/^nothing fits|thinnest foil/.test(name));

function startsFor({ job }: Task): (readonly [number, number])[] {
  const most = job.tube.diameterToWallMax;
  return [0.03, 0.1, 0.4].flatMap((D) => [12, 60].map((slimness) => [D, Math.min(slimness, most)] as const));
}

/** What a general-purpose minimiser finds is what the engine found, and is never under the engine's bound. */
async function agree(task: Task): Promise<void> {
  const { found, lowerBound } = least(new Problem(task.job, task.metal));
  const other = await minimised(task, startsFor(task));
  expect(other!.mass).toBeGreaterThanOrEqual(lowerBound);
  expect(Math.abs(other!.mass / found!.value - 1)).toBeLessThan(1e-6);
}

describe('a general-purpose minimiser, from six starts', () => {
  it.each(alignmentTasks().filter(({ feasible }) => feasible))('finds the engine’s mass: $name', ({ task }) =>
    agree(task),
  );

  it.each(hard)('finds the engine’s mass: %s', (_, task) => agree(task));

  it('finds the engine’s mass, whatever the job', { timeout: 60_000 }, async () => {
    const some = fc.sample(tasks, { numRuns: 40, seed: 21 });
    const fitting = some.filter(({ job, metal }) => least(new Problem(job, metal)).found !== null);
    expect(fitting.length).toBeGreaterThan(25);
    for (const task of fitting) await agree(task);
  });

  it('finds nothing where the engine proved that nothing fits', async () => {
    const some = fc.sample(tasks, { numRuns: 60, seed: 22 });
    const unfit = some.filter(({ job, metal }) => least(new Problem(job, metal)).found === null);
    expect(unfit.length).toBeGreaterThan(3);
    for (const task of unfit.slice(0, 6)) expect(await minimised(task, startsFor(task))).toBeNull();
  });
});
