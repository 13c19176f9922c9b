import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Section } from '../../../src/tube/section.js';
import { simpson } from './quadrature.js';

const sizes = fc.record({
  D: fc.integer({ min: 5, max: 500 }).map((i) => i / 1000),
  slimness: fc.integer({ min: 210, max: 60_000 }).map((i) => i / 100),
  tolerance: fc.integer({ min: 0, max: 200 }).map((i) => i / 1000),
});

describe('Section', () => {
  it('has the area and moments that integration over the wall gives', () => {
    fc.assert(
      fc.property(sizes, ({ D, slimness, tolerance }) => {
        const t = D / slimness;
        const section = new Section(tolerance).set(D, t);
        const ro = D / 2;
        const ri = ro - t * (1 - tolerance);
        expect(section.area / simpson((r) => 2 * Math.PI * r, ri, ro)).toBeCloseTo(1, 11);
        expect(section.polarMoment / simpson((r) => 2 * Math.PI * r ** 3, ri, ro)).toBeCloseTo(1, 11);
        // a strip at height y of the full circle less that of the bore, by y = ro·sin(a): smooth at the ends
        const disc = (R: number): number =>
          simpson((a) => 2 * R ** 4 * (Math.sin(a) * Math.cos(a)) ** 2, -Math.PI / 2, Math.PI / 2);
        expect(section.secondMoment / (disc(ro) - disc(ri))).toBeCloseTo(1, 9);
        expect(section.perSecondMoment * section.secondMoment).toBeCloseTo(1, 14);
        expect((section.shearPerTorque * section.polarMoment) / ro).toBeCloseTo(1, 14);
        expect(section.gyrationSquared / (section.secondMoment / section.area)).toBeCloseTo(1, 13);
      }),
    );
  });

  it('takes the missing wall off the bore and holds the nominal diameter', () => {
    const section = new Section(0.1).set(0.06, 0.01);
    expect(section.outerRadius).toBe(0.03);
    expect(section.checkedWall).toBeCloseTo(0.009, 15);
    expect(section.meanRadius).toBeCloseTo(0.03 - 0.0045, 15);
    expect(section.wall).toBe(0.01);
    expect(section.outerDiameter).toBe(0.06);
  });

  it('gives a solid bar where the wall is the whole radius', () => {
    const section = new Section(0).set(0.2, 0.1);
    expect(section.polarMoment / ((Math.PI / 2) * 0.1 ** 4)).toBeCloseTo(1, 14);
    expect(section.area / (Math.PI * 0.1 ** 2)).toBeCloseTo(1, 14);
  });

  it('keeps its digits where the wall is a thousandth of the radius', () => {
    const section = new Section(0).set(2.001, 0.001);
    // J = 2πr³t(1 + σ²/4), r = 1 m, σ = 0.001
    expect(section.polarMoment / (2 * Math.PI * 0.001 * (1 + 0.25e-6))).toBeCloseTo(1, 14);
  });
});
