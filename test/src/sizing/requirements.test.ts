import { describe, expect, it } from 'vitest';
import { requirements } from '../../../src/sizing/requirements.js';
import { job, load, metal } from '../fixtures.js';

const full = job({
  tube: {
    ...job().tube,
    length: 2,
    outerDiameterMax: 0.08,
    outerDiameterMin: 0.03,
    boreMin: 0.02,
    wallMin: 0.001,
  },
  loads: [load(), load({ name: 'held', twistMax: 0.04, shearStressMax: 50e6 })],
  speed: { max: 300, margin: 1.25 },
});

describe('the requirements that might be eased', () => {
  it('are those of envelope, bore, gauge, twist and speed, no others', () => {
    const all = requirements(full, metal()).map(({ path, from, eases }) => [path, from, eases]);
    expect(all).toEqual([
      ['tube.outerDiameterMax', 0.08, 'up'],
      ['tube.outerDiameterMin', 0.03, 'down'],
      ['tube.boreMin', 0.02, 'down'],
      ['tube.wallMin', 0.001, 'down'],
      ['loads.1.twistMax', 0.04, 'up'],
      ['speed.max', 300, 'down'],
    ]);
    expect(requirements(job(), metal())).toEqual([]);
  });

  it('leave out a gauge that the material asks for anyway', () => {
    const paths = requirements(full, metal({ wallMin: 0.001 })).map(({ path }) => path);
    expect(paths).not.toContain('tube.wallMin');
  });

  it('change one value each and nothing else', () => {
    for (const { path, from, put, without } of requirements(full, metal())) {
      expect(put(from), path).toEqual(full);
      expect(put(from * 2), path).not.toEqual(full);
      expect(requirements(put(from * 2), metal()).find((one) => one.path === path)!.from).toBe(from * 2);
      expect(
        requirements(without, metal()).some((one) => one.path === path),
        path,
      ).toBe(false);
      expect(requirements(without, metal()), path).toHaveLength(5);
    }
  });

  it('are worded in the unit in which they were entered, a twist per length by the length', () => {
    const worded = (path: string, unit?: string): unknown =>
      requirements(full, metal())
        .find((one) => one.path === path)!
        .quantityIn(unit);
    expect(worded('tube.boreMin', 'in')).toEqual({ quantity: 'length', unit: 'in', divisor: 1 });
    expect(worded('tube.boreMin')).toEqual({ quantity: 'length', unit: 'mm', divisor: 1 });
    expect(worded('loads.1.twistMax', 'deg/m')).toEqual({ quantity: 'twistRate', unit: 'deg/m', divisor: 2 });
    expect(worded('loads.1.twistMax')).toEqual({ quantity: 'angle', unit: 'deg', divisor: 1 });
    expect(worded('speed.max')).toEqual({ quantity: 'rotationalSpeed', unit: 'rpm', divisor: 1 });
  });
});
