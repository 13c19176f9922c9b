import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { StockTube } from '../../../src/material/material.js';
import { solve } from '../../../src/sizing/solve.js';
import { preferred } from '../../../src/sizing/stock.js';
import { fullest, massOf } from '../../reference/limits.js';
import { job, load, metal } from '../fixtures.js';
import { real, tasks } from './jobs.js';

const row = (outerDiameter: number, wall: number, pricePerMetre: number | null = null): StockTube => ({
  outerDiameter,
  wall,
  pricePerMetre,
});

/** A list in millimetres and tenths, so that sizes of one mass or one diameter come up. */
const lists = fc.array(
  fc.record({ outerDiameter: fc.integer({ min: 15, max: 200 }), wall: fc.integer({ min: 5, max: 80 }) }),
  { minLength: 1, maxLength: 80 },
);
const tubes = lists.map((rows) =>
  rows
    .filter((one) => one.outerDiameter * 10 > 2 * one.wall)
    .map((one) => row(one.outerDiameter / 1e3, one.wall / 1e4)),
);

describe('the lightest listed size', () => {
  it('is what going through the list by hand gives', () => {
    let fitted = 0;
    const agrees = fc.property(tasks, tubes, ({ job, metal }, stock) => {
      const mass = (one: StockTube): number => massOf(job, metal, one.outerDiameter, one.wall);
      const passing = stock.filter(({ outerDiameter, wall }) => fullest(job, metal, outerDiameter, wall) <= 1 + 1e-9);
      const least = Math.min(...passing.map(mass));
      const alike = passing.filter((one) => mass(one) <= least * (1 + 1e-9));
      const smallest = Math.min(...alike.map(({ outerDiameter }) => outerDiameter));
      const { size, optimality } = solve({ ...job, sizes: { stock } }, metal);
      expect(optimality.evaluations).toBe(stock.length);
      expect(size?.outerDiameter ?? Infinity).toBe(smallest);
      if (size === null) return;
      fitted++;
      expect(size.mass / least).toBeCloseTo(1, 12);
      expect(optimality.lowerBoundMass).toBe(size.mass);
      expect(optimality.gap).toBe(0);
    });
    fc.assert(agrees, { numRuns: 300, seed: 9, endOnFailure: true });
    expect(fitted).toBeGreaterThan(50);
  });

  it('is the smaller in diameter of two that weigh the same, wherever they stand', () => {
    // t(D − t) = 100 mm²: 4 × 29 and 5 × 25
    const stock = [row(0.029, 0.004), row(0.025, 0.005), row(0.029, 0.004)];
    const easy = job({ loads: [load({ torque: 1 })], tube: { ...job().tube, diameterToWallMin: 3 } });
    expect(solve({ ...easy, sizes: { stock } }, metal()).size!.outerDiameter).toBe(0.025);
    expect(solve({ ...easy, sizes: { stock: stock.toReversed() } }, metal()).size!.outerDiameter).toBe(0.025);
  });

  it('is the first listed of two alike', () => {
    const stock = [row(0.05, 0.002, 8), row(0.05, 0.002, 7)];
    expect(solve({ ...job(), sizes: { stock } }, metal()).size!.pricePerMetre).toBe(8);
  });

  it('comes from the material’s own list where it has one, and passes over mandrels', () => {
    const own = metal({ sizes: { stock: [{ bore: 0.04 }, row(0.09, 0.003)] } });
    const listed = job({ sizes: { stock: [row(0.05, 0.002)] } });
    expect(solve(listed, own).size!.outerDiameter).toBe(0.09);
    expect(solve(listed, metal()).size!.outerDiameter).toBe(0.05);
  });
});

describe('preference', () => {
  const a = { mass: 1, outerDiameter: 0.05 };

  it('goes by mass, however little it differs past a billionth', () => {
    expect(preferred(a, { mass: 1 + 3e-9, outerDiameter: 0.04 })).toBe(true);
    expect(preferred({ mass: 1 + 3e-9, outerDiameter: 0.04 }, a)).toBe(false);
  });

  it('goes by diameter within a billionth, and leaves equals as they stand', () => {
    expect(preferred({ mass: 1 + 0.5e-9, outerDiameter: 0.04 }, a)).toBe(true);
    expect(preferred(a, a)).toBe(false);
  });

  it('never holds both ways', () => {
    const bodies = fc.record({ mass: real(1, 1 + 5e-9), outerDiameter: real(1, 2) });
    fc.assert(
      fc.property(bodies, bodies, (p, q) => !(preferred(p, q) && preferred(q, p))),
      { seed: 9 },
    );
  });
});
