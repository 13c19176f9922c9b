import { describe, expect, it } from 'vitest';
import { limitEntries } from '../../../src/limit/entries.js';
import { METAL_LIMITS, prepareChecks } from '../../../src/limit/index.js';
import { job, load, metal } from '../fixtures.js';
import { at, tube } from './prepared.js';

const everything = job({
  ...tube({ outerDiameterMax: 0.08, outerDiameterMin: 0.04, boreMin: 0.02, wallMin: 1e-3 }),
  loads: [load({ name: 'first', twistMax: 0.05, shearStressMax: 90e6 }), load({ name: 'second', torque: 10 })],
  speed: { max: 100, margin: 1.25 },
});
const entries = limitEntries(everything, prepareChecks(everything, metal()), at);

describe('limitEntries', () => {
  it('lists every limit in order, once for each load it depends on', () => {
    expect([...new Set(entries.map(({ limit }) => limit))]).toEqual(METAL_LIMITS.map(({ id }) => id));
    const keys = entries.map(({ limit, load: name }) => `${limit} ${String(name)}`);
    expect(new Set(keys).size).toBe(keys.length);
    expect(entries.filter(({ limit }) => limit === 'whirl').map((entry) => entry.load)).toEqual(['first', 'second']);
    expect(entries.find(({ limit }) => limit === 'bore')?.load).toBeNull();
  });

  it('gives the fuller side of a limit that has two', () => {
    const { demand, capacity, utilisation } = entries.find(({ limit }) => limit === 'outer-diameter')!;
    expect([demand, capacity]).toEqual([0.06, 0.08]);
    expect(utilisation).toBeCloseTo(0.75, 14);
  });

  it('has the limit’s unit, newtons for a column under thrust alone', () => {
    expect(entries.find(({ limit }) => limit === 'column')?.unit).toBe('N·m');
    const pushed = job({ loads: [load({ torque: 0, axial: -1000 })] });
    const found = limitEntries(pushed, prepareChecks(pushed, metal()), at);
    expect(found.find(({ limit }) => limit === 'column')?.unit).toBe('N');
    expect(found.find(({ limit }) => limit === 'shear-yield')?.unit).toBe('Pa');
  });

  it('has the margin 1/U − 1, and marks what governs', () => {
    for (const { utilisation, margin } of entries) expect(margin).toBeCloseTo(1 / utilisation - 1, 9);
    const fullest = Math.max(...entries.map(({ utilisation }) => utilisation));
    expect(entries.filter(({ governs }) => governs).map(({ utilisation }) => utilisation)).toEqual([fullest]);
  });

  it('has demand over capacity as the utilisation, in torsion alone', () => {
    for (const { limit, demand, capacity, utilisation, interaction } of entries) {
      expect(interaction, limit).toBeUndefined();
      expect(demand / capacity / utilisation, limit).toBeCloseTo(1, 12);
    }
  });
});
