import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  BENDING_LOSS,
  COMPRESSION_LOSS,
  decayOf,
  knockdown as knockdownFrom,
  knockdownOver,
} from '../../../src/buckling/knockdown.js';
import { OUTWARD, Span } from '../../../src/tube/span.js';

/** γ of a wall by its r/tc. */
const knockdown = (slenderness: number, loss: number): number => knockdownFrom(decayOf(1 / slenderness), loss);

describe('knockdown', () => {
  it('is 1 − 0.901(1 − 1/e) and 1 − 0.731(1 − 1/e) at r/tc = 256, where φ = 1', () => {
    expect(knockdown(256, COMPRESSION_LOSS)).toBeCloseTo(1 - 0.901 * (1 - 1 / Math.E), 15);
    expect(knockdown(256, BENDING_LOSS)).toBeCloseTo(1 - 0.731 * (1 - 1 / Math.E), 15);
  });

  it('is 1 for the stoutest wall, 1 − c for the slimmest, and falls between', () => {
    expect(knockdown(0, COMPRESSION_LOSS)).toBe(1);
    expect(knockdown(1e9, COMPRESSION_LOSS)).toBeCloseTo(0.099, 15);
    expect(knockdown(1e9, BENDING_LOSS)).toBeCloseTo(0.269, 15);
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1500 }), fc.integer({ min: 1, max: 1500 }), (a, b) => {
        expect(knockdown(a + b, BENDING_LOSS)).toBeLessThan(knockdown(a, BENDING_LOSS));
      }),
    );
  });

  it('bending is knocked down less than compression', () => {
    expect(knockdown(100, BENDING_LOSS)).toBeGreaterThan(knockdown(100, COMPRESSION_LOSS));
  });

  it('is enclosed, with its steepest slope at φ = 1', () => {
    const slenderness = fc.integer({ min: 1, max: 5000 });
    const losses = fc.constantFrom(COMPRESSION_LOSS, BENDING_LOSS);
    fc.assert(
      fc.property(slenderness, slenderness, fc.integer({ min: 0, max: 100 }), losses, (a, b, k, loss) => {
        const [lo, hi] = [Math.min(a, b), Math.max(a, b)];
        // thickness tc/r, taken as varying with D alone
        const out = knockdownOver(new Span(), new Span().homogeneous(1 / hi, 1 / lo, -1, -1, -1), loss);
        const x = lo * (hi / lo) ** (k / 100);
        expect(knockdown(x, loss)).toBeGreaterThanOrEqual(out.lo * (1 - OUTWARD));
        expect(knockdown(x, loss)).toBeLessThanOrEqual(out.hi * (1 + OUTWARD));
        const slope = Math.log(knockdown(x * 1.00001, loss) / knockdown(x, loss)) / Math.log(1.00001);
        expect(slope).toBeGreaterThanOrEqual(out.dLo - 1e-5);
        expect(slope).toBeLessThanOrEqual(out.dHi + 1e-5);
      }),
      { numRuns: 1000 },
    );
  });
});
