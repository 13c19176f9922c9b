import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DirectBuckling } from '../../../src/buckling/direct.js';
import { BENDING_LOSS, COMPRESSION_LOSS } from '../../../src/buckling/knockdown.js';
import { parabola } from '../../../src/buckling/parabola.js';
import { Box } from '../../../src/tube/box.js';
import { Section } from '../../../src/tube/section.js';
import { OUTWARD, Span } from '../../../src/tube/span.js';

const CLASSICAL = 43e9;

/** A·σ_cr by hand. */
function forceAt(D: number, t: number, loss: number, plateau: number): number {
  const { meanRadius, area } = new Section(0).set(D, t);
  const gamma = 1 - loss * (1 - Math.exp(-Math.sqrt(meanRadius / t) / 16));
  return area * parabola((gamma * CLASSICAL * t) / meanRadius, plateau);
}

const cases = fc.record({
  D: fc.integer({ min: 1, max: 100 }).map((i) => i * 0.01),
  slimness: fc.integer({ min: 12, max: 3000 }),
  wider: fc.integer({ min: 0, max: 400 }).map((i) => 1 + i * 1e-3),
  thicker: fc.integer({ min: 0, max: 400 }).map((i) => 1 + i * 1e-3),
  places: fc.array(
    fc.integer({ min: 0, max: 100 }).map((i) => i * 0.01),
    { minLength: 2, maxLength: 2 },
  ),
  loss: fc.constantFrom(COMPRESSION_LOSS, BENDING_LOSS),
  plateau: fc.constantFrom(50e6, 300e6, 2000e6),
});

describe('DirectBuckling over a box', () => {
  it('holds every force and every slope', () => {
    fc.assert(
      fc.property(cases, ({ D, slimness, wider, thicker, places: [u = 0, v = 0], loss, plateau }) => {
        const t = D / slimness;
        const out = new Span();
        new DirectBuckling(loss, CLASSICAL, plateau).forceOver(new Box(0, 6).set(D, D * wider, t, t * thicker), out);
        const [d, w] = [D * wider ** u, t * thicker ** v];
        const force = forceAt(d, w, loss, plateau);
        expect(force).toBeGreaterThanOrEqual(out.lo * (1 - OUTWARD));
        expect(force).toBeLessThanOrEqual(out.hi * (1 + OUTWARD));
        const step = 1e-5;
        const inD = Math.log(forceAt(d * (1 + step), w, loss, plateau) / force) / Math.log1p(step);
        expect(inD).toBeGreaterThanOrEqual(out.dLo - 1e-4);
        expect(inD).toBeLessThanOrEqual(out.dHi + 1e-4);
        const inT = Math.log(forceAt(d, w * (1 + step), loss, plateau) / force) / Math.log1p(step);
        expect(inT).toBeGreaterThanOrEqual(out.tLo - 1e-4);
        expect(inT).toBeLessThanOrEqual(out.tHi + 1e-4);
        expect(out.dLo + out.tHi).toBeCloseTo(2, 12);
      }),
      { numRuns: 2000 },
    );
  });

  it('is steepest at φ = 1, where r/tc = 256', () => {
    const out = new Span();
    // elastic throughout: e = 1 + ½c·φe^(−φ)/γ, greatest at γ's least
    new DirectBuckling(COMPRESSION_LOSS, CLASSICAL, 1e12).forceOver(new Box(0, 6).set(0.512, 0.514, 1e-3, 1e-3), out);
    const gamma = 1 - COMPRESSION_LOSS * (1 - Math.exp(-1));
    const e = 1 + (0.5 * COMPRESSION_LOSS * Math.exp(-1)) / gamma;
    expect(out.dLo).toBeCloseTo(1 - e, 2);
  });
});
