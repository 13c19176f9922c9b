import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Job, LoadCase } from '../../../src/job/job.js';
import type { Candidate } from '../../../src/report/report.js';
import { sizeJob } from '../../../src/sizing/size.js';
import { solve } from '../../../src/sizing/solve.js';
import { fullest, massOf, tubeOf, utilisations } from '../../reference/limits.js';
import { HARD } from './hard.js';
import { logReal, real, tasks, type Task } from './jobs.js';

/** Twice the gap that a proof may leave, and rounding. */
const SAME = 2e-6;

const massLeast = ({ job, metal }: Task): number => solve(job, metal).size?.mass ?? Infinity;

const times = (value: number | null, factor: number): number | null => (value === null ? null : value * factor);

/** The same job, every length s times as large and every load as much larger as keeps all stresses. */
function enlarged({ job, metal }: Task, s: number): Task {
  const { tube, loads, speed } = job;
  const lengths = {
    length: tube.length * s,
    supportSpacing: tube.supportSpacing * s,
    outerDiameterMax: times(tube.outerDiameterMax, s),
    outerDiameterMin: times(tube.outerDiameterMin, s),
    boreMin: times(tube.boreMin, s),
    wallMin: times(tube.wallMin, s),
  };
  const grown = loads.map((load) => ({
    ...load,
    torque: load.torque * s ** 3,
    bending: load.bending * s ** 3,
    axial: load.axial * s ** 2,
  }));
  const slower = speed && { ...speed, max: speed.max / s };
  return {
    metal: { ...metal, wallMin: metal.wallMin * s },
    job: { ...job, tube: { ...tube, ...lengths }, loads: grown, speed: slower },
  };
}

const withLoads = (job: Job, change: (load: LoadCase) => Partial<LoadCase>): Job => ({
  ...job,
  loads: job.loads.map((load) => ({ ...load, ...change(load) })),
});

const withTube = (job: Job, change: Partial<Job['tube']>): Job => ({ ...job, tube: { ...job.tube, ...change } });

/** Every way to ask less of a tube, by a factor f > 1. */
const EASINGS: Record<string, (job: Job, f: number) => Job> = {
  torque: (job, f) => withLoads(job, ({ torque }) => ({ torque: torque / f })),
  bending: (job, f) => withLoads(job, ({ bending }) => ({ bending: bending / f })),
  axial: (job, f) => withLoads(job, ({ axial }) => ({ axial: axial / f })),
  twistMax: (job, f) => withLoads(job, ({ twistMax }) => ({ twistMax: times(twistMax, f) })),
  shearStressMax: (job, f) => withLoads(job, ({ shearStressMax }) => ({ shearStressMax: times(shearStressMax, f) })),
  yieldFactor: (job, f) => withLoads(job, ({ yieldFactor }) => ({ yieldFactor: yieldFactor / f })),
  ultimateFactor: (job, f) => withLoads(job, ({ ultimateFactor }) => ({ ultimateFactor: ultimateFactor / f })),
  bucklingFactor: (job, f) => withLoads(job, ({ bucklingFactor }) => ({ bucklingFactor: bucklingFactor / f })),
  outerDiameterMax: (job, f) => withTube(job, { outerDiameterMax: times(job.tube.outerDiameterMax, f) }),
  outerDiameterMin: (job, f) => withTube(job, { outerDiameterMin: times(job.tube.outerDiameterMin, 1 / f) }),
  boreMin: (job, f) => withTube(job, { boreMin: times(job.tube.boreMin, 1 / f) }),
  wallMin: (job, f) => withTube(job, { wallMin: times(job.tube.wallMin, 1 / f) }),
  diameterToWallMax: (job, f) => withTube(job, { diameterToWallMax: job.tube.diameterToWallMax * f }),
  diameterToWallMin: (job, f) => withTube(job, { diameterToWallMin: Math.max(2.2, job.tube.diameterToWallMin / f) }),
  supportSpacing: (job, f) => withTube(job, { supportSpacing: job.tube.supportSpacing / f }),
  speed: (job, f) => ({ ...job, speed: job.speed && { ...job.speed, max: job.speed.max / f } }),
};

/** Sizes spread evenly in logarithms about a size, m. */
const GRID = Array.from({ length: 60 }, (_, i) => (i - 30) / 30);

function designHolds({ job, metal }: Task, { design, limits }: Candidate): void {
  const { outerDiameter: D, wall: t, bore, meanRadius, mass, torsionalStiffness, strainEnergy } = design!;
  const tube = tubeOf(metal, D, t);
  const torque = Math.max(...job.loads.map((load) => Math.abs(load.torque)));
  expect(mass / massOf(job, metal, D, t)).toBeCloseTo(1, 12);
  expect(bore).toBe(D - 2 * t);
  expect(meanRadius / tube.r).toBeCloseTo(1, 12);
  expect((torsionalStiffness * job.tube.length) / (metal.shearModulus * tube.J)).toBeCloseTo(1, 12);
  expect((2 * strainEnergy * torsionalStiffness) / torque ** 2).toBeCloseTo(1, 12);
  const mine = utilisations(job, metal, D, t).filter(({ U }) => U > 0);
  const names = limits.map(({ limit, load }) => `${limit} ${load}`);
  expect(names.sort()).toEqual(
    mine.map(({ limit, load }) => `${limit} ${load === null ? null : job.loads[load]!.name}`).sort(),
  );
  for (const { limit, load, U } of mine) {
    const name = load === null ? null : job.loads[load]!.name;
    const entry = limits.find((one) => one.limit === limit && one.load === name)!;
    expect(Math.abs(entry.utilisation / U - 1), limit).toBeLessThan(1e-9);
    expect(entry.margin, limit).toBe(1 / entry.utilisation - 1);
    expect(entry.interaction === true || Math.abs(entry.demand / entry.capacity / U - 1) < 1e-9, limit).toBe(true);
  }
}

/** Every number of a document, whatever it hangs on. */
function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}

describe('the least mass', () => {
  it('grows with the cube of size, all else being in proportion', () => {
    const similar = fc.property(tasks, logReal(0.05, 20), (task, s) => {
      const small = massLeast(task);
      const large = massLeast(enlarged(task, s));
      if (small === Infinity) expect(large).toBe(Infinity);
      else expect(Math.abs(large / small / s ** 3 - 1)).toBeLessThan(SAME);
    });
    fc.assert(similar, { numRuns: 250, seed: 5, endOnFailure: true });
  });

  it('is no less for more torque, in one load or in all', () => {
    const heavier = fc.property(tasks, real(1, 3), fc.nat(3), (task, f, which) => {
      const loads = task.job.loads.map((load, i) =>
        which === i || which === 3 ? { ...load, torque: load.torque * f } : load,
      );
      expect(massLeast({ ...task, job: { ...task.job, loads } })).toBeGreaterThanOrEqual(massLeast(task) * (1 - SAME));
    });
    fc.assert(heavier, { numRuns: 250, seed: 5, endOnFailure: true });
  });

  it.each(Object.entries(EASINGS))('is no more when less is asked: %s', (_, ease) => {
    let moved = 0;
    const lighter = fc.property(tasks, real(1.001, 2), (task, f) => {
      const before = massLeast(task);
      const after = massLeast({ ...task, job: ease(task.job, f) });
      expect(after).toBeLessThanOrEqual(before * (1 + SAME));
      if (after < before * (1 - SAME)) moved++;
    });
    fc.assert(lighter, { numRuns: 150, seed: 5, endOnFailure: true });
    expect(moved).toBeGreaterThan(0);
  });

  it('is no more than any size of a dense grid that passes, and passes itself', () => {
    let passed = 0;
    const least = fc.property(tasks, real(0, 1), real(0, 1), (task, u, v) => {
      const { job, metal } = task;
      const { size } = solve(job, metal);
      const centre = size ?? { outerDiameter: 0.05, wall: 0.002, mass: Infinity };
      if (size !== null) expect(fullest(job, metal, size.outerDiameter, size.wall)).toBeLessThan(1 + 1.01e-9);
      for (const x of GRID) {
        for (const y of GRID) {
          const D = centre.outerDiameter * Math.exp(x + u / 30);
          const t = centre.wall * Math.exp(1.5 * (y + v / 30));
          if (fullest(job, metal, D, t) > 1) continue;
          passed++;
          expect(massOf(job, metal, D, t)).toBeGreaterThanOrEqual(centre.mass * (1 - 1e-6));
        }
      }
    });
    fc.assert(least, { numRuns: 60, seed: 5, endOnFailure: true });
    expect(passed).toBeGreaterThan(1000);
  });
});

describe('a report', () => {
  it('says of its designs what a second program says', () => {
    const holds = fc.property(tasks, ({ job, metal }) => {
      const plain = { ...job, front: { against: 'cost' as const } };
      const candidate = sizeJob({ job: plain, units: {} }).candidates[0]!;
      if (candidate.feasible) designHolds({ job, metal }, candidate);
    });
    fc.assert(holds, { numRuns: 150, seed: 5, endOnFailure: true });
  });

  it.each(Object.entries(HARD))('holds no number that is not one: %s', (name, { job, metal }) => {
    const report = sizeJob({ job: { ...job, materials: [metal] }, units: {} });
    const { feasible, optimality, noFit } = report.candidates[0]!;
    const seen = numbersIn({ ...report, job: null });
    expect(seen.some(Number.isNaN)).toBe(false);
    expect(seen.every((value) => Number.isFinite(value) || value === optimality.lowerBoundMass)).toBe(true);
    expect(feasible).toBe(!name.startsWith('nothing fits'));
    if (feasible) expect(optimality.gap).toBeLessThanOrEqual(1e-6);
    else expect(noFit!.ease.length).toBeGreaterThan(0);
  });
});
