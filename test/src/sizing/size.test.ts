import { describe, expect, it } from 'vitest';
import type { Brief } from '../../../src/job/job.js';
import type { Metal } from '../../../src/material/material.js';
import { sizeJob, sizeSteps, type Step } from '../../../src/sizing/size.js';
import { CASES } from '../../cases/cases.js';
import { job, load, metal } from '../fixtures.js';

const heavy = metal({ id: 'heavy', name: 'a heavy one', density: 9000 });
const weak = metal({ id: 'weak', name: 'a weak one', shearModulus: 1e9, youngsModulus: 2.6e9 });
const narrow = { ...job().tube, outerDiameterMax: 0.06 };

function briefOf(materials: readonly Metal[], own: Partial<Brief['job']> = {}): Brief {
  return { units: {}, job: job({ tube: narrow, loads: [load({ twistMax: 0.1 })], materials, ...own }) };
}

describe('the report of a job', () => {
  it('puts the lightest first, those with no design last, and picks the lightest', () => {
    const { candidates, pick } = sizeJob(briefOf([weak, heavy, metal()]));
    expect(candidates.map(({ material }) => material)).toEqual(['a-steel', 'heavy', 'weak']);
    expect(candidates.map(({ feasible }) => feasible)).toEqual([true, true, false]);
    expect(pick).toEqual({ material: 'a-steel' });
  });

  it('keeps the job’s own pick where it has a design', () => {
    expect(sizeJob(briefOf([heavy, metal()], { pick: { material: 'heavy' } })).pick).toEqual({ material: 'heavy' });
    expect(sizeJob(briefOf([weak, metal()], { pick: { material: 'weak' } })).pick).toEqual({ material: 'a-steel' });
    expect(sizeJob(briefOf([weak])).pick).toBeNull();
  });

  it('keeps a pick of a design in hand, and checks every one as it is', () => {
    const hold = [
      { name: 'stout', material: 'a-steel', outerDiameter: 0.06, wall: 0.004 },
      { name: 'flimsy', material: 'heavy', outerDiameter: 0.02, wall: 0.001 },
    ];
    const { held, pick } = sizeJob(briefOf([metal(), heavy], { hold, pick: { held: 'flimsy' } }));
    expect(pick).toEqual({ held: 'flimsy' });
    expect(held.map(({ name, feasible }) => [name, feasible])).toEqual([
      ['stout', true],
      ['flimsy', false],
    ]);
    expect(Math.max(...held[1]!.limits.map(({ utilisation }) => utilisation))).toBeGreaterThan(1);
    expect(held[0]!.design.bore).toBeCloseTo(0.052, 15);
  });

  it('of two materials alike lists the first named first', () => {
    const twin = { ...metal(), id: 'twin' };
    expect(sizeJob(briefOf([twin, metal()])).candidates.map(({ material }) => material)).toEqual(['twin', 'a-steel']);
  });

  it.each(CASES)('is the same to the last bit when run again: $name', ({ brief }) => {
    expect(JSON.stringify(sizeJob(brief))).toBe(JSON.stringify(sizeJob(brief)));
  });
});

describe('a run', () => {
  it('tells how far it is before every step', () => {
    const told: (readonly [number, number, string])[] = [];
    sizeJob(briefOf([metal(), heavy]), (...progress) => told.push(progress));
    const done = told.map(([count]) => count);
    expect(done).toEqual([0, 1, 2, 3, 4]);
    expect(new Set(told.map(([, of]) => of))).toEqual(new Set([4]));
    expect(told.slice(0, 4).map(([, , name]) => name)).toEqual(['a steel', 'a heavy one', 'a steel', 'a heavy one']);
  });

  it('hands over each candidate as it is sized, then tells of each front', () => {
    const brief = briefOf([metal(), weak]);
    const run = sizeSteps(brief);
    const steps: Step[] = [];
    let step = run.next();
    for (; step.done !== true; step = run.next()) steps.push(step.value);
    expect(steps.map(({ kind }) => kind)).toEqual(['candidate', 'candidate', 'front', 'front']);
    const handed = steps.flatMap((one) => (one.kind === 'candidate' ? [one.candidate] : []));
    expect(step.value.candidates).toEqual(handed);
    expect(step.value).toEqual(sizeJob(brief));
  });
});
