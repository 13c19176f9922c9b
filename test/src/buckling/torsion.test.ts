import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { TorsionBuckling } from '../../../src/buckling/torsion.js';
import { Box } from '../../../src/tube/box.js';
import { Section } from '../../../src/tube/section.js';
import { Span } from '../../../src/tube/span.js';

/** Where the two regimes meet: γZ = 77.4(1 − ν²)(r/tc)², Z = L²√(1 − ν²)/(r·tc). */
function crossing(nu: number, r: number, tc: number, kappa: number): number {
  const gamma = kappa ** (4 / 3);
  const Z = (77.4 * (1 - nu * nu) * (r / tc) ** 2) / gamma;
  return Math.sqrt((Z * r * tc) / Math.sqrt(1 - nu * nu));
}

const walls = fc.record({
  nu: fc.integer({ min: 0, max: 45 }).map((i) => i / 100),
  slenderness: fc.integer({ min: 3, max: 300 }),
  kappa: fc.integer({ min: 30, max: 100 }).map((i) => i / 100),
});

describe('TorsionBuckling', () => {
  it('crosses from moderately long to long at γZ = 77.4(1 − ν²)(r/tc)², whatever ν and κ', () => {
    fc.assert(
      fc.property(walls, ({ nu, slenderness, kappa }) => {
        const r = 0.03;
        const tc = r / slenderness;
        const wall = new TorsionBuckling(70e9, nu, crossing(nu, r, tc, kappa), kappa);
        // 77.4 has three digits and the stresses differ as Z^(1/4)
        expect(wall.moderateStress(r, tc) / wall.longStress(r, tc)).toBeCloseTo(1, 3);
      }),
    );
  });

  it('does not jump there, and takes the greater on either side', () => {
    const at = new Section(0).set(0.0606, 0.0006);
    const { meanRadius: r, checkedWall: tc } = at;
    const L = crossing(0.3, r, tc, 0.67);
    const shorter = new TorsionBuckling(70e9, 0.3, L * 0.9, 0.67);
    const longer = new TorsionBuckling(70e9, 0.3, L * 1.1, 0.67);
    expect(shorter.stress(at) / shorter.moderateStress(r, tc)).toBeCloseTo(1, 14);
    expect(shorter.moderateStress(r, tc)).toBeGreaterThan(shorter.longStress(r, tc));
    expect(longer.stress(at) / longer.longStress(r, tc)).toBeCloseTo(1, 14);
    expect(longer.longStress(r, tc)).toBeGreaterThan(longer.moderateStress(r, tc));
  });

  it('falls as length grows until the tube is long, and no further', () => {
    const at = new Section(0).set(0.0606, 0.0006);
    const stress = (L: number): number => new TorsionBuckling(70e9, 0.3, L, 0.67).stress(at);
    expect(stress(0.5) / stress(2)).toBeCloseTo(2, 12);
    expect(stress(100)).toBe(stress(200));
  });

  it('takes the slopes of both regimes over a box in which they cross', () => {
    const { meanRadius: r, checkedWall: tc } = new Section(0).set(0.0606, 0.0006);
    const wall = new TorsionBuckling(70e9, 0.3, crossing(0.3, r, tc, 1), 1);
    const out = wall.stressOver(new Box(0, 6).set(0.0604, 0.0608, 0.000599, 0.000601), new Span());
    // moderate: r^(−3/4)·tc^(5/4); long: r^(−3/2)·tc^(3/2)
    expect(out.dLo).toBeCloseTo(-1.5, 1);
    expect(out.dHi).toBeCloseTo(-0.75, 1);
    expect(out.tLo).toBeCloseTo(1.25, 1);
    expect(out.tHi).toBeCloseTo(1.5, 1);
  });
});
