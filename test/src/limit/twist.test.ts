import { describe, expect, it } from 'vitest';
import { shearAllowable } from '../../../src/limit/shear-allowable.js';
import { twist } from '../../../src/limit/twist.js';
import { job, load, metal } from '../fixtures.js';
import { at, only, tube } from './prepared.js';

const theta = (1000 * 2) / (81e9 * at.polarMoment);

describe('twist', () => {
  it('is T·L/(G·J) over the greatest, without a factor on load', () => {
    const check = only(twist, { ...tube({ length: 2 }), loads: [load({ torque: -1000, twistMax: 0.05 })] });
    expect(check.utilisation(at)).toBeCloseTo(theta / 0.05, 12);
    const { demand, capacity, interaction } = check.pair(at);
    expect(demand).toBeCloseTo(theta, 12);
    expect([capacity, interaction]).toEqual([0.05, false]);
  });

  it('is not there without a greatest twist, nor without torque', () => {
    const loads = [load(), load({ torque: 0, twistMax: 0.05 })];
    expect(twist.prepare(job({ loads }), metal())).toEqual([]);
  });
});

describe('shear allowable', () => {
  it('is τ over the load case’s own allowable, without factor or joint', () => {
    const loads = [load({ torque: -1000, shearStressMax: 90e6, yieldFactor: 2, ultimateFactor: 3 })];
    const check = only(shearAllowable, { loads }, metal({ jointFactor: 0.5 }));
    const tau = (1000 * 0.03) / at.polarMoment;
    expect(check.utilisation(at)).toBeCloseTo(tau / 90e6, 12);
    expect(check.pair(at).demand).toBeCloseTo(tau, 4);
    expect(check.pair(at).capacity).toBe(90e6);
  });

  it('is not there without an allowable, nor without torque', () => {
    const loads = [load(), load({ torque: 0, shearStressMax: 90e6 })];
    expect(shearAllowable.prepare(job({ loads }), metal())).toEqual([]);
  });
});
