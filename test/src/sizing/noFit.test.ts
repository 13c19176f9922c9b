import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Job } from '../../../src/job/job.js';
import { parseOneOf } from '../../../src/quantity/parse.js';
import type { LimitId, NoFit } from '../../../src/report/report.js';
import { conflict } from '../../../src/sizing/conflict.js';
import { eases, torqueFactor } from '../../../src/sizing/ease.js';
import { least } from '../../../src/sizing/least.js';
import { Problem } from '../../../src/sizing/problem.js';
import { sizeJob } from '../../../src/sizing/size.js';
import { fullest } from '../../reference/limits.js';
import { job, load, metal } from '../fixtures.js';
import { logReal, real, seldom, tasks, type Task } from './jobs.js';

const tube = job().tube;

/** A sliver of sizes where limits meet at a small angle takes many boxes to prove empty. */
const PATIENT = { timeout: 60_000 };

/** Whether any size passes: a size that does by a second program, or boxes that leave none. */
function fits({ job, metal }: Task, lifted: ReadonlySet<LimitId> = new Set()): boolean {
  const { found, lowerBound } = least(new Problem(job, metal, { lifted }));
  if (found === null) {
    expect(lowerBound).toBe(Infinity);
    return false;
  }
  expect(fullest(job, metal, found.outerDiameter, found.wall, lifted)).toBeLessThan(1 + 1.01e-9);
  return true;
}

/** Tasks that have no answer: their envelope, bore, twist and speed are far from one another. */
const unfit = fc
  .record({
    task: tasks,
    outerDiameterMax: real(0.15, 1.5),
    boreMin: seldom(2, real(0.2, 1.1)),
    twistMax: seldom(2, logReal(1e-4, 1e-2)),
    speed: seldom(2, logReal(100, 5000)),
  })
  .map(({ task: { job, metal }, outerDiameterMax, boreMin, twistMax, speed }): Task => {
    const torque = Math.max(...job.loads.map((one) => Math.abs(one.torque)));
    const D = outerDiameterMax * Math.cbrt((torque * 60) / (Math.PI * metal.shearYield));
    const envelope = { outerDiameterMax: D, outerDiameterMin: null, boreMin: boreMin && boreMin * D };
    const loads = job.loads.map((one, i) => (i === 0 ? { ...one, twistMax } : one));
    const running = speed === null ? null : { max: speed, margin: 1.25 };
    return { metal, job: { ...job, loads, speed: running, tube: { ...job.tube, ...envelope } } };
  })
  .filter((task) => !fits(task));

/** The value that stands at a key path, SI, and the job with another in its place; written for these tests alone. */
function at(job: Job, path: string): { value: number; put: (value: number) => Job } {
  const [head, second, third] = path.split('.');
  if (head === 'speed') return { value: job.speed!.max, put: (max) => ({ ...job, speed: { ...job.speed!, max } }) };
  if (head === 'tube') {
    const key = second as 'outerDiameterMax';
    return { value: job.tube[key]!, put: (value) => ({ ...job, tube: { ...job.tube, [key]: value } }) };
  }
  const one = job.loads[Number(second)]!;
  expect([head, third]).toEqual(['loads', 'twistMax']);
  return {
    value: one.twistMax!,
    put: (twistMax) => ({ ...job, loads: job.loads.with(Number(second), { ...one, twistMax }) }),
  };
}

/** What a text of an offer stands for, SI; a twist rate is brought to the whole length. */
function siOf(text: string, length: number): number {
  const read = parseOneOf(text, ['length', 'angle', 'twistRate', 'rotationalSpeed']);
  if (!read.ok) throw new Error(read.message);
  return read.quantity === 'twistRate' ? read.value * length : read.value;
}

describe('what is offered where nothing fits', () => {
  it('lets something fit, and hardly less would', PATIENT, () => {
    const seen = new Set<string>();
    const opens = fc.property(unfit, fc.boolean(), (task, perLength) => {
      const { job, metal } = task;
      const units = perLength ? { 'loads.0.twistMax': 'deg/m', 'tube.outerDiameterMax': 'in' } : {};
      for (const { path, from, to } of eases({ job, units }, metal)) {
        seen.add(path.replace(/\d+/, 'n'));
        const { value, put } = at(job, path);
        const offered = siOf(to, job.tube.length);
        expect(siOf(from, job.tube.length) / value).toBeCloseTo(1, 8);
        expect(fits({ metal, job: put(offered) }), `${path} ${to}`).toBe(true);
        const tighter = offered > value ? Math.max(value, offered / 1.01) : Math.min(value, offered * 1.01);
        expect(fits({ metal, job: put(tighter) }), `${path} tighter than ${to}`).toBe(false);
      }
    });
    fc.assert(opens, { numRuns: 60, seed: 10, endOnFailure: true });
    expect([...seen].sort()).toEqual(['loads.n.twistMax', 'speed.max', 'tube.boreMin', 'tube.outerDiameterMax']);
  });

  it('is every requirement that opens the way alone, and no other', PATIENT, () => {
    const complete = fc.property(unfit, ({ job, metal }) => {
      const offered = eases({ job, units: {} }, metal).map(({ path }) => path);
      const { boreMin } = job.tube;
      const without: [string, Job][] = [
        ['tube.outerDiameterMax', { ...job, tube: { ...job.tube, outerDiameterMax: null } }],
      ];
      if (boreMin !== null) without.push(['tube.boreMin', { ...job, tube: { ...job.tube, boreMin: null } }]);
      if (job.speed !== null) without.push(['speed.max', { ...job, speed: null }]);
      for (const [path, open] of without) expect(offered.includes(path), path).toBe(fits({ job: open, metal }));
    });
    fc.assert(complete, { numRuns: 60, seed: 3, endOnFailure: true });
  });

  it('covers the least diameter and the job’s own gauge, never the material’s', () => {
    const steel = metal({ wallMin: 0.01 });
    const least = { ...tube, outerDiameterMax: 0.05, outerDiameterMin: 0.06 };
    const paths = (own: Job): string[] => eases({ job: own, units: {} }, steel).map(({ path }) => path);
    expect(paths(job({ tube: { ...least, diameterToWallMin: 3 } }))).toEqual([
      'tube.outerDiameterMax',
      'tube.outerDiameterMin',
    ]);
    const thick = { ...tube, outerDiameterMax: 0.05, wallMin: 0.03, diameterToWallMin: 3 };
    expect(paths(job({ tube: thick }))).toEqual(['tube.outerDiameterMax', 'tube.wallMin']);
    expect(paths(job({ tube: { ...tube, outerDiameterMax: 0.05 } }))).toEqual(['tube.outerDiameterMax']);
  });
});

describe('the conflict named where nothing fits', () => {
  it('cannot be met, and could be without any one of its limits', PATIENT, () => {
    const sizes = new Set<number>();
    const irreducible = fc.property(unfit, (task) => {
      const named = conflict(task.job, task.metal);
      sizes.add(named.length);
      const all = new Problem(task.job, task.metal).checks.map(({ limit }) => limit);
      const others = all.filter((limit) => !named.includes(limit));
      expect(fits(task, new Set(others))).toBe(false);
      for (const limit of named) expect(fits(task, new Set([...others, limit])), limit).toBe(true);
    });
    fc.assert(irreducible, { numRuns: 80, seed: 4, endOnFailure: true });
    expect([...sizes].sort()).toEqual([2, 3]);
  });

  it('prefers what the user asked for, in the order in which reports list limits', () => {
    const asked = job({ loads: [load({ twistMax: 0.001 })], tube: { ...tube, outerDiameterMax: 0.05 } });
    expect(conflict(asked, metal())).toEqual(['twist', 'outer-diameter']);
    const narrow = job({ tube: { ...tube, outerDiameterMax: 0.05, boreMin: 0.051 } });
    expect(conflict(narrow, metal())).toEqual(['outer-diameter', 'bore']);
  });

  it('is whirl alone where no diameter runs so fast', () => {
    expect(conflict(job({ speed: { max: 1e5, margin: 1.25 } }), metal())).toEqual(['whirl']);
  });
});

describe('the torque factor where no single change helps', () => {
  const stock = [
    { outerDiameter: 0.05, wall: 0.002, pricePerMetre: null },
    { outerDiameter: 0.06, wall: 0.003, pricePerMetre: null },
  ];
  const twice = (torque: number): Job =>
    job({ sizes: { stock }, loads: ['there', 'back'].map((name) => load({ name, torque, twistMax: 0.01 })) });

  it('is the greatest to three figures at which something fits', () => {
    const within = fc.property(logReal(700, 1e6), (torque) => {
      const factor = torqueFactor(twice(torque), metal())!;
      const passes = (f: number): boolean =>
        stock.some(({ outerDiameter, wall }) => fullest(twice(torque * f), metal(), outerDiameter, wall) <= 1 + 1e-9);
      expect(passes(1)).toBe(false);
      expect(passes(factor)).toBe(true);
      expect(passes(factor * 1.0101)).toBe(false);
      expect(Number(factor.toPrecision(3))).toBe(factor);
    });
    fc.assert(within, { numRuns: 40, seed: 6, endOnFailure: true });
  });

  it('stands in the report only where no change is offered', () => {
    const noFit = (own: Job): NoFit =>
      sizeJob({ job: { ...own, materials: [metal()] }, units: {} }).candidates[0]!.noFit!;
    expect(noFit(twice(3000)).ease).toEqual([]);
    expect(noFit(twice(3000)).torqueFactor).toBeGreaterThan(0);
    const once = { ...twice(3000), loads: twice(3000).loads.slice(0, 1) };
    expect(noFit(once).torqueFactor).toBeNull();
    expect(noFit(once).ease.map(({ path }) => path)).toEqual(['loads.0.twistMax']);
  });

  it('is null where no torque at all would fit', () => {
    const tight = job({ tube: { ...tube, outerDiameterMax: 0.02, boreMin: 0.03 } });
    expect(torqueFactor(tight, metal())).toBeNull();
  });
});
