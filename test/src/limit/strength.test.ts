import { describe, expect, it } from 'vitest';
import { shearUltimate } from '../../../src/limit/shear-ultimate.js';
import { shearYield } from '../../../src/limit/shear-yield.js';
import { job, load, metal } from '../fixtures.js';
import { at, only } from './prepared.js';

const tau = (1000 * 0.03) / at.polarMoment;

describe('shear yield', () => {
  it('is n_y·τ/Fsy in pure torsion, either hand', () => {
    for (const torque of [1000, -1000]) {
      const check = only(shearYield, { loads: [load({ torque, yieldFactor: 1.1 })] });
      expect(check.utilisation(at)).toBeCloseTo((1.1 * tau) / 350e6, 12);
    }
  });

  it('sets n_y·τ beside Fsy', () => {
    const pair = only(shearYield, { loads: [load({ yieldFactor: 1.1 })] }).pair(at);
    expect(pair.demand).toBeCloseTo(1.1 * tau, 4);
    expect([pair.capacity, pair.interaction]).toEqual([350e6, false]);
  });

  it('amplifies bending by n_y of the thrust, and counts thrust itself as direct stress', () => {
    const loads = [load({ bending: 200, axial: -20_000, yieldFactor: 1.2 })];
    const euler = Math.PI ** 2 * 210e9 * at.secondMoment;
    const sigma = 20_000 / at.area + ((200 / (1 - (1.2 * 20_000) / euler)) * 0.03) / at.secondMoment;
    const check = only(shearYield, { loads });
    expect(check.utilisation(at)).toBeCloseTo(1.2 * Math.hypot(sigma / 600e6, tau / 350e6), 12);
    expect(check.pair(at).interaction).toBe(true);
  });

  it('does not amplify bending by tension', () => {
    const loads = [load({ torque: 0, bending: 200, axial: 20_000 })];
    const sigma = 20_000 / at.area + (200 * 0.03) / at.secondMoment;
    expect(only(shearYield, { loads }).utilisation(at)).toBeCloseTo(sigma / 600e6, 12);
  });

  it('is not there for a load of nothing', () => {
    expect(shearYield.prepare(job({ loads: [load({ torque: 0 })] }), metal())).toEqual([]);
  });
});

describe('shear ultimate', () => {
  it('is n_u·τ/Fsu over the joint factor', () => {
    const check = only(shearUltimate, {}, metal({ jointFactor: 0.8 }));
    expect(check.utilisation(at)).toBeCloseTo((1.5 * tau) / 480e6 / 0.8, 12);
    expect(check.pair(at).demand / check.pair(at).capacity).toBeCloseTo(check.utilisation(at), 12);
  });

  it('compares direct stress with Ftu', () => {
    const check = only(shearUltimate, { loads: [load({ torque: 0, axial: 50_000, ultimateFactor: 2 })] });
    expect(check.utilisation(at)).toBeCloseTo((2 * 50_000) / at.area / 800e6, 12);
  });

  it('has one check for each load case that loads the wall', () => {
    const loads = [load(), load({ torque: 0 }), load({ torque: 0, bending: 1 })];
    expect(shearUltimate.prepare(job({ loads }), metal()).map((check) => check.load)).toEqual([0, 2]);
  });
});
