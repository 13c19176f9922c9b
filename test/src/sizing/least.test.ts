import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Descent } from '../../../src/sizing/descend.js';
import { GAP, least } from '../../../src/sizing/least.js';
import { Problem, SEARCHED } from '../../../src/sizing/problem.js';
import { fits, solve } from '../../../src/sizing/solve.js';
import { fullest, massOf } from '../../reference/limits.js';
import { job, load, metal } from '../fixtures.js';
import { HARD } from './hard.js';
import { logReal, real, tasks, type Task } from './jobs.js';

const problemOf = ({ job, metal }: Task): Problem => new Problem(job, metal);
const feasible = Object.entries(HARD).filter(([name]) => !name.startsWith('nothing fits'));

describe('the least over all sizes', () => {
  it.each(feasible)('is the same from wherever the search begins: %s', (_, task) => {
    const { found } = least(problemOf(task));
    const starts = [
      [1e-5, 2e-6],
      [100, 40],
      [100, 1e-6],
      [0.05, 0.02],
      [found!.outerDiameter, found!.wall],
      [found!.outerDiameter * 3, found!.wall / 3],
    ] as const;
    for (const [outerDiameter, wall] of starts) {
      const again = least(problemOf(task), { start: { outerDiameter, wall } });
      expect(Math.abs(again.found!.value / found!.value - 1)).toBeLessThan(1e-6);
      expect(again.lowerBound).toBeLessThanOrEqual(found!.value);
    }
  });

  it.each(Object.entries(HARD))('ends with everything decided: %s', (_, task) => {
    const { found, lowerBound } = least(problemOf(task));
    if (found === null) expect(lowerBound).toBe(Infinity);
    else expect(lowerBound).toBe(found.value * (1 - GAP));
  });

  it('takes the first size that passes where any will do, and claims no bound for it', () => {
    const any = fc.property(tasks, (task) => {
      const best = least(problemOf(task));
      const { found, lowerBound } = least(problemOf(task), { anyWillDo: true });
      expect(found === null).toBe(best.found === null);
      expect(lowerBound).toBe(found === null ? Infinity : 0);
      if (found !== null)
        expect(fullest(task.job, task.metal, found.outerDiameter, found.wall)).toBeLessThan(1 + 1.01e-9);
    });
    fc.assert(any, { numRuns: 100, seed: 12, endOnFailure: true });
  });

  it('is the same to the last bit when asked again', () => {
    const same = fc.property(tasks, (task) => {
      expect(least(problemOf(task))).toEqual(least(problemOf(task)));
    });
    fc.assert(same, { numRuns: 60, seed: 13, endOnFailure: true });
  });

  it('lies within the sizes that are searched', () => {
    const { found } = least(problemOf(HARD['no gauge, and next to no torque: the thinnest foil that is searched']!));
    expect(found!.wall).toBeGreaterThanOrEqual(SEARCHED.wallLeast * (1 - 1e-9));
    expect(fits(job({ tube: { ...job().tube, outerDiameterMin: 101 } }), metal())).toBe(false);
    expect(fits(job({ tube: { ...job().tube, outerDiameterMin: 99.9 } }), metal())).toBe(true);
  });

  it('claims no more than it showed where a box stays open: that nothing was found is not that nothing fits', () => {
    class Blind extends Problem {
      override excess(): number {
        return 1;
      }
    }
    const single = { outerDiameterMin: 0.06, outerDiameterMax: 0.06, wallMin: 0.002, diameterToWallMin: 30 };
    const only = job({ loads: [load({ torque: 10 })], tube: { ...job().tube, ...single } });
    expect(fullest(only, metal(), 0.06, 0.002)).toBeLessThanOrEqual(1);
    const { found, lowerBound } = least(new Blind(only, metal()));
    expect(found).toBeNull();
    expect(lowerBound / massOf(only, metal(), 0.06, 0.002)).toBeCloseTo(1, 6);
  });

  it('makes least whatever it is told to: here the twist, not the mass', () => {
    const tight = job({ tube: { ...job().tube, outerDiameterMax: 0.06 } });
    const twist = new Problem(tight, metal());
    const objective = {
      value: (at: { polarMoment: number }): number => 1 / at.polarMoment,
      bound: (over: Problem['box'], out: Problem['span']): void => void out.inverse(over.polarMoment, 1),
    };
    const { found } = least(new Problem(tight, metal(), { objective }));
    // the stiffest tube is the stoutest that the envelope and D/t allow
    expect(found!.outerDiameter).toBeCloseTo(0.06, 8);
    expect(found!.wall).toBeCloseTo(0.01, 8);
    expect(twist.passes(found!.outerDiameter, found!.wall)).toBe(true);
  });

  it('holds to tubes with a bore, even where the range of D/t is lifted', () => {
    const bored = fc.property(tasks, real(0.1, 0.9), logReal(1e-4, 1e-1), ({ job, metal }, share, twistMax) => {
      const torque = Math.max(...job.loads.map((one) => Math.abs(one.torque)));
      const outerDiameterMax = share * Math.cbrt((torque * 60) / (Math.PI * metal.shearYield));
      const narrow = { ...job.tube, outerDiameterMax, outerDiameterMin: null, boreMin: null };
      const stiff = { ...job, tube: narrow, loads: job.loads.map((one) => ({ ...one, twistMax })) };
      const lifted = new Set(['diameter-to-wall', 'shear-yield', 'shear-ultimate', 'wall-buckling'] as const);
      for (const anyWillDo of [true, false]) {
        const { found } = least(new Problem(stiff, metal, { lifted }), { anyWillDo });
        if (found === null) continue;
        expect(found.outerDiameter).toBeGreaterThan(2 * found.wall);
        expect(fullest(stiff, metal, found.outerDiameter, found.wall, lifted)).toBeLessThan(1 + 1.01e-9);
      }
    });
    fc.assert(bored, { numRuns: 400, seed: 16, endOnFailure: true });
  });

  it('costs a few hundred looks at most on ordinary jobs', () => {
    const cheap = fc.property(tasks, ({ job, metal }) => {
      expect(solve(job, metal).optimality.evaluations).toBeLessThan(1200);
    });
    fc.assert(cheap, { numRuns: 300, seed: 14, endOnFailure: true });
  });
});

describe('a walk', () => {
  it('comes to a size that passes from wherever it begins, or says how far off it is', () => {
    let arrived = 0;
    let begun = 0;
    const walks = fc.property(
      tasks,
      logReal(1e-5, 100),
      logReal(2.1, 1e4),
      ({ job, metal }, outerDiameter, slimness) => {
        const found = new Descent(new Problem(job, metal)).from(outerDiameter, outerDiameter / slimness);
        const U = fullest(job, metal, found.outerDiameter, found.wall);
        expect(found.outerDiameter).toBeGreaterThan(2 * found.wall);
        expect(Math.abs(Math.log(U) - found.excess)).toBeLessThan(1e-6);
        expect(found.value / massOf(job, metal, found.outerDiameter, found.wall)).toBeCloseTo(1, 12);
        if (!fits(job, metal)) return;
        begun++;
        if (found.excess <= 1e-9) arrived++;
      },
    );
    fc.assert(walks, { numRuns: 200, seed: 15, endOnFailure: true });
    expect(arrived / begun).toBeGreaterThan(0.95);
  });

  it('needs no more than some thirty looks at a corner of two limits', () => {
    const problem = new Problem(job({ loads: [load({ twistMax: 0.02 })] }), metal());
    const { excess } = new Descent(problem).from(0.05, 0.001);
    expect(excess).toBeLessThanOrEqual(1e-9);
    expect(problem.evaluations).toBeLessThan(30);
  });
});
