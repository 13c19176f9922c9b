import { describe, expect, it } from 'vitest';
import { bore } from '../../../src/limit/bore.js';
import { diameterToWall } from '../../../src/limit/diameter-to-wall.js';
import { outerDiameter } from '../../../src/limit/outer-diameter.js';
import { wallMin } from '../../../src/limit/wall-min.js';
import { Section } from '../../../src/tube/section.js';
import { job, metal } from '../fixtures.js';
import { at, only, tube } from './prepared.js';

describe('the geometric limits', () => {
  it('hold the outer diameter from above and from below', () => {
    const most = only(outerDiameter, tube({ outerDiameterMax: 0.08 }));
    expect(most.utilisation(at)).toBeCloseTo(0.75, 14);
    expect(most.pair(at)).toEqual({ demand: 0.06, capacity: 0.08, interaction: false });
    const least = only(outerDiameter, tube({ outerDiameterMin: 0.04 }));
    expect(least.utilisation(at)).toBeCloseTo(2 / 3, 14);
    expect(least.pair(at)).toEqual({ demand: 0.04, capacity: 0.06, interaction: false });
    expect(outerDiameter.prepare(job(), metal())).toEqual([]);
  });

  it('hold the nominal wall to the larger of the record’s gauge and the job’s', () => {
    expect(only(wallMin, {}).utilisation(at)).toBeCloseTo(0.5 / 3, 14);
    expect(only(wallMin, tube({ wallMin: 1e-3 })).utilisation(at)).toBeCloseTo(1 / 3, 14);
    expect(only(wallMin, tube({ wallMin: 0.1e-3 })).utilisation(at)).toBeCloseTo(0.5 / 3, 14);
    expect(wallMin.prepare(job(), metal({ wallMin: 0 }))).toEqual([]);
  });

  it('hold the nominal bore, whatever the wall tolerance', () => {
    const thinned = new Section(0.1).set(0.06, 0.003);
    for (const section of [at, thinned]) {
      const check = only(bore, tube({ boreMin: 0.027 }));
      expect(check.utilisation(section)).toBeCloseTo(0.5, 14);
      expect(check.pair(section).capacity).toBeCloseTo(0.054, 14);
    }
    expect(bore.prepare(job(), metal())).toEqual([]);
  });

  it('hold D/t between its two bounds', () => {
    const checks = diameterToWall.prepare(job(tube({ diameterToWallMin: 10, diameterToWallMax: 80 })), metal());
    expect(checks.map((check) => check.utilisation(at))).toEqual([0.5, 0.25]);
  });
});
