import { describe, expect, it } from 'vitest';
import { twistedLoads, worstTorque } from '../../../src/sizing/twisted.js';
import { job, load } from '../fixtures.js';

const names = (loads: Parameters<typeof twistedLoads>[0]['loads']): string[] =>
  twistedLoads(job({ loads })).map(({ name }) => name);

describe('the loads whose twist counts', () => {
  it('are those that carry a limit on it, or all where none does', () => {
    const free = load({ name: 'free', torque: 900 });
    const held = load({ name: 'held', torque: -500, twistMax: 0.05 });
    expect(names([free, held])).toEqual(['held']);
    expect(names([free, load({ name: 'other' })])).toEqual(['free', 'other']);
    expect(worstTorque(job({ loads: [free, held] }))).toBe(500);
    expect(worstTorque(job({ loads: [free, load({ torque: -2000 })] }))).toBe(2000);
  });

  it('are not those without torque, whatever limit they carry', () => {
    const still = load({ name: 'still', torque: 0, twistMax: 0.01 });
    expect(names([still, load({ name: 'turning' })])).toEqual(['still', 'turning']);
    expect(worstTorque(job({ loads: [still, load({ torque: 300 })] }))).toBe(300);
  });
});
