import { describe, expect, it } from 'vitest';
import { whirl } from '../../../src/limit/whirl.js';
import { job, load, metal } from '../fixtures.js';
import { at, only, tube } from './prepared.js';

const span = 1.5;
const spun = { ...tube({ length: 3, supportSpacing: span }), speed: { max: 300, margin: 1.25 } };
const euler = (Math.PI ** 2 * 210e9 * at.secondMoment) / span ** 2;
const greenhill = (2 * Math.PI * 210e9 * at.secondMoment) / span;

function firstSpeed(left: number): number {
  const wave = Math.PI / span;
  const kappa = (2 * 1.3) / 4.9;
  const shear = 1 + wave ** 2 * (at.secondMoment / at.area) * (1 + 210e9 / (kappa * 81e9));
  return wave ** 2 * Math.sqrt((210e9 * at.secondMoment) / (7850 * at.area) / shear) * Math.sqrt(left);
}

const speed = (own: Parameters<typeof load>[0]): number =>
  only(whirl, { ...spun, loads: [load(own)] }).pair(at).capacity;

describe('whirl', () => {
  it('sets the running speed with its margin beside the first whirl speed', () => {
    const check = only(whirl, { ...spun, loads: [load({ torque: 0 })] });
    expect(check.pair(at).demand).toBe(375);
    expect(check.pair(at).capacity / firstSpeed(1)).toBeCloseTo(1, 12);
    expect(check.utilisation(at)).toBeCloseTo(375 / firstSpeed(1), 12);
  });

  it('is softened by thrust and by torque of either hand, at limit load', () => {
    const own = { torque: -0.3 * greenhill, axial: -0.4 * euler, bucklingFactor: 2 };
    expect(speed(own) / firstSpeed(1 - 0.4 - 0.09)).toBeCloseTo(1, 12);
  });

  it('is not stiffened by tension', () => {
    expect(speed({ torque: 0, axial: euler })).toBe(speed({ torque: 0 }));
  });

  it('keeps a thousandth of the speed past the critical loads', () => {
    expect(speed({ torque: 0, axial: -2 * euler }) / firstSpeed(1e-6)).toBeCloseTo(1, 12);
  });

  it('is checked under every load case, and not there without a speed', () => {
    const loads = [load(), load({ torque: 0 })];
    expect(whirl.prepare(job({ ...spun, loads }), metal())).toHaveLength(2);
    expect(whirl.prepare(job({ loads }), metal())).toEqual([]);
  });
});
