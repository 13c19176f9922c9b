import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Job } from '../../../src/job/job.js';
import { limitEntries } from '../../../src/limit/entries.js';
import type { LimitId } from '../../../src/report/report.js';
import { Problem } from '../../../src/sizing/problem.js';
import { relief } from '../../../src/sizing/relief.js';
import { solve } from '../../../src/sizing/solve.js';
import { job, load, metal } from '../fixtures.js';
import { tasks, type Task } from './jobs.js';

const times = (value: number | null, factor: number): number | null => (value === null ? null : value * factor);

/** The job rewritten by hand so that one limit is 1 % further away; only where its file can say so. */
const BY_HAND: Partial<Record<LimitId, (task: Task) => Task>> = {
  twist: ({ job, metal }) => ({ metal, job: loads(job, 'twistMax', 1.01) }),
  'shear-allowable': ({ job, metal }) => ({ metal, job: loads(job, 'shearStressMax', 1.01) }),
  'outer-diameter': ({ job, metal }) => ({
    metal,
    job: tube(job, {
      outerDiameterMax: times(job.tube.outerDiameterMax, 1.01),
      outerDiameterMin: times(job.tube.outerDiameterMin, 1 / 1.01),
    }),
  }),
  bore: ({ job, metal }) => ({ metal, job: tube(job, { boreMin: times(job.tube.boreMin, 1 / 1.01) }) }),
  'wall-min': ({ job, metal }) => ({
    metal: { ...metal, wallMin: metal.wallMin / 1.01 },
    job: tube(job, { wallMin: times(job.tube.wallMin, 1 / 1.01) }),
  }),
  'diameter-to-wall': ({ job, metal }) => ({
    metal,
    job: tube(job, {
      diameterToWallMin: job.tube.diameterToWallMin / 1.01,
      diameterToWallMax: job.tube.diameterToWallMax * 1.01,
    }),
  }),
  whirl: ({ job, metal }) => ({
    metal,
    job: { ...job, speed: job.speed && { ...job.speed, max: job.speed.max / 1.01 } },
  }),
};

function loads(job: Job, key: 'twistMax' | 'shearStressMax', factor: number): Job {
  return { ...job, loads: job.loads.map((load) => ({ ...load, [key]: times(load[key], factor) })) };
}

function tube(job: Job, change: Partial<Job['tube']>): Job {
  return { ...job, tube: { ...job.tube, ...change } };
}

function sized({ job, metal }: Task): { mass: number; reliefs: ReturnType<typeof relief>; full: Set<LimitId> } | null {
  const { size } = solve(job, metal);
  if (size === null) return null;
  const problem = new Problem(job, metal);
  const entries = limitEntries(job, problem.checks, problem.section.set(size.outerDiameter, size.wall));
  const full = new Set(entries.filter(({ utilisation }) => utilisation > 0.999).map(({ limit }) => limit));
  return { mass: size.mass, reliefs: relief(job, metal, size, entries), full };
}

describe('relief', () => {
  it('is what a job rewritten by hand saves', () => {
    const seen = new Set<LimitId>();
    const agrees = fc.property(tasks, (task) => {
      const result = sized(task);
      if (result === null) return;
      for (const { limit, massSavedPerPercent } of result.reliefs) {
        const rewritten = BY_HAND[limit]?.(task);
        if (rewritten === undefined) continue;
        seen.add(limit);
        const saved = result.mass - solve(rewritten.job, rewritten.metal).size!.mass;
        expect(Math.abs(saved - massSavedPerPercent), limit).toBeLessThan(2e-6 * result.mass);
      }
    });
    fc.assert(agrees, { numRuns: 300, seed: 7, endOnFailure: true });
    expect([...seen].sort()).toEqual(Object.keys(BY_HAND).sort());
  });

  it('names every full limit once, the one that saves most first', () => {
    const ordered = fc.property(tasks, (task) => {
      const result = sized(task);
      if (result === null) return;
      const { reliefs, full } = result;
      expect(reliefs.map(({ limit }) => limit).sort()).toEqual([...full].sort());
      const saved = reliefs.map(({ massSavedPerPercent }) => massSavedPerPercent);
      expect(saved).toEqual(saved.toSorted((a, b) => b - a));
      expect(Math.min(...saved)).toBeGreaterThanOrEqual(0);
    });
    fc.assert(ordered, { numRuns: 60, seed: 7, endOnFailure: true });
  });

  it('eases a strength limit of the load cases all together', () => {
    // at a fixed gauge and one load after another, τ is full in both: easing one alone would save nothing
    const once = load({ ultimateFactor: 1, bucklingFactor: 1 });
    const twice = [once, { ...once, name: 'again' }];
    const steel = metal({ wallMin: 4e-3, shearYield: 100e6, tensileYield: 180e6 });
    const task = { metal: steel, job: job({ loads: twice }) };
    const { mass, reliefs } = sized(task)!;
    const alone = sized({ ...task, job: job({ loads: [once] }) })!;
    expect(mass).toBeCloseTo(alone.mass, 12);
    const saved = reliefs.find(({ limit }) => limit === 'shear-yield')!.massSavedPerPercent;
    expect(saved).toBeGreaterThan(1e-3 * mass);
    expect(
      Math.abs(saved - alone.reliefs.find(({ limit }) => limit === 'shear-yield')!.massSavedPerPercent),
    ).toBeLessThan(2e-6 * mass);
  });
});
