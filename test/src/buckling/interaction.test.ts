import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { interaction, interactionOver } from '../../../src/buckling/interaction.js';
import { OUTWARD, Span } from '../../../src/tube/span.js';

const ratio = fc.integer({ min: 0, max: 1_000_000 }).map((i) => i * 1e-5);
const some = fc.integer({ min: 1, max: 1_000_000 }).map((i) => i * 1e-5);

describe('interaction', () => {
  it('satisfies c/U + (s/U)² = 1', () => {
    fc.assert(
      fc.property(ratio, some, (c, s) => {
        const u = interaction(c, s);
        expect(c / u + (s / u) ** 2).toBeCloseTo(1, 12);
      }),
    );
  });

  it('is proportional to load', () => {
    fc.assert(
      fc.property(ratio, ratio, some, (c, s, k) => {
        expect(interaction(k * c, k * s)).toBeCloseTo(k * interaction(c, s), 9);
      }),
    );
  });

  it('is the ratio itself where only one is there', () => {
    expect(interaction(0, 0.7)).toBe(0.7);
    expect(interaction(0.7, 0)).toBe(0.7);
  });

  it('is enclosed, corner to corner, with the shares of its parts', () => {
    const span = fc.tuple(some, some).map(([a, b]) => [Math.min(a, b), Math.max(a, b)] as const);
    const share = fc.integer({ min: 0, max: 1000 }).map((i) => i * 1e-3);
    fc.assert(
      fc.property(span, span, share, share, ([c0, c1], [s0, s1], p, q) => {
        // c grows with D alone, s with t alone, so that the slopes are the shares
        const c = new Span().homogeneous(c0, c1, 1, 1, 1);
        const s = new Span().homogeneous(s0, s1, 0, 0, 1);
        const out = interactionOver(new Span(), c, s);
        const [x, y] = [c0 * (c1 / c0) ** p, s0 * (s1 / s0) ** q];
        const u = interaction(x, y);
        expect(u).toBeGreaterThanOrEqual(out.lo * (1 - OUTWARD));
        expect(u).toBeLessThanOrEqual(out.hi * (1 + OUTWARD));
        const inC = Math.log(interaction(x * 1.00001, y) / u) / Math.log(1.00001);
        expect(inC).toBeGreaterThanOrEqual(out.dLo - 1e-5);
        expect(inC).toBeLessThanOrEqual(out.dHi + 1e-5);
        const inS = Math.log(interaction(x, y * 1.00001) / u) / Math.log(1.00001);
        expect(inS).toBeGreaterThanOrEqual(out.tLo - 1e-5);
        expect(inS).toBeLessThanOrEqual(out.tHi + 1e-5);
        expect(inC + inS).toBeCloseTo(1, 4);
      }),
      { numRuns: 1000 },
    );
  });
});
