import { describe, expect, it } from 'vitest';
import { isoMass } from '../../../src/sizing/isoMass.js';
import { massOf } from '../../reference/limits.js';
import { job, metal } from '../fixtures.js';

const window = { outerLo: 0.04, outerHi: 0.11, wallLo: 0, wallHi: 0.004, log: false };

describe('a curve of equal mass', () => {
  it('weighs the same all along, and runs from edge to edge', () => {
    const own = job();
    const line = isoMass(metal(), own.tube.length, 2, window);
    for (const { outerDiameter, wall } of line) {
      expect(massOf(own, metal(), outerDiameter, wall)).toBeCloseTo(2, 9);
      expect(wall).toBeLessThan(window.wallHi * (1 + 1e-9));
    }
    expect(line[0]!.outerDiameter === window.outerLo || Math.abs(line[0]!.wall - window.wallHi) < 1e-9).toBe(true);
    expect(line.at(-1)!.outerDiameter).toBe(window.outerHi);
  });

  it('is none where it does not pass the window', () => {
    expect(isoMass(metal(), 1, 1e4, window)).toEqual([]);
  });
});
