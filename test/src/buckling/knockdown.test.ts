import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  BENDING_LOSS,
  COMPRESSION_LOSS,
  decay,
  exponential,
  knockdown as knockdownFrom,
} from '../../../src/buckling/knockdown.js';
import { Section } from '../../../src/tube/section.js';

/** γ of a wall by its r/tc. */
function knockdown(slenderness: number, loss: number): number {
  // r = D/2 − t/2
  const at = new Section(0).set(2 * slenderness + 1, 1);
  return knockdownFrom(decay.at(at).value, loss);
}

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
});

describe('exponential', () => {
  it('is e^(−x) to the last digits, past its table too', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 40_000_000 }), (i) => {
        const x = i * 1e-6;
        expect(Math.abs(exponential(x) / Math.exp(-x) - 1)).toBeLessThan(1e-15);
      }),
      { numRuns: 20_000 },
    );
    expect([exponential(0), exponential(1000)]).toEqual([1, 0]);
    expect(exponential(Number.NaN)).toBeNaN();
  });
});
