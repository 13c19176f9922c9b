import { describe, expect, it } from 'vitest';
import { wallBuckling } from '../../../src/limit/wall-buckling.js';
import { job, load, metal } from '../fixtures.js';
import { at, only, tube } from './prepared.js';

describe('wall buckling', () => {
  it('sets n_b·T beside the wall’s critical torque', () => {
    const check = only(wallBuckling, { loads: [load({ torque: -1000, bucklingFactor: 1.4 })] });
    const { demand, capacity, interaction } = check.pair(at);
    expect(demand).toBeCloseTo(1400, 9);
    expect(check.utilisation(at)).toBeCloseTo(1400 / capacity, 12);
    expect(interaction).toBe(false);
  });

  it('has the plateau min(Fsu, 1.2·Fsy), which a stout stiff wall reaches', () => {
    const torque = 2 * Math.PI * at.meanRadius ** 2 * at.checkedWall;
    const capacity = (own: object): number =>
      only(wallBuckling, {}, metal({ youngsModulus: 1e18, ...own })).pair(at).capacity;
    expect(capacity({ shearYield: 350e6, shearUltimate: 480e6 }) / torque / 420e6).toBeCloseTo(1, 5);
    expect(capacity({ shearYield: 450e6, shearUltimate: 480e6 }) / torque / 480e6).toBeCloseTo(1, 5);
  });

  it('goes by the length between the end fittings in torsion, by the span in bending', () => {
    const slim = { shearUltimate: 1e15, shearYield: 1e15 };
    const critical = (own: Partial<ReturnType<typeof job>['tube']>): number =>
      only(wallBuckling, tube(own), metal(slim)).pair(at).capacity;
    expect(critical({ length: 1, supportSpacing: 1 })).toBe(critical({ length: 1, supportSpacing: 0.25 }));
    expect(critical({ length: 0.2 }) / critical({ length: 0.8 })).toBeCloseTo(2, 12);
    const bent = { loads: [load({ bending: 200, axial: -50_000 })] };
    const long = only(wallBuckling, { ...tube({ supportSpacing: 2 }), ...bent }).utilisation(at);
    const short = only(wallBuckling, { ...tube({ supportSpacing: 1 }), ...bent }).utilisation(at);
    expect(long).toBeGreaterThan(short);
  });

  it('says that thrust or bending makes it an interaction', () => {
    for (const own of [{ axial: -1 }, { bending: 1 }]) {
      expect(only(wallBuckling, { loads: [load(own)] }).pair(at).interaction).toBe(true);
    }
  });

  it('is not there in plain tension', () => {
    expect(wallBuckling.prepare(job({ loads: [load({ torque: 0, axial: 1000 })] }), metal())).toEqual([]);
  });
});
