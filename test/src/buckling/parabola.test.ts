import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parabola, slope } from '../../../src/buckling/parabola.js';

describe('parabola', () => {
  it('is elastic up to half the plateau', () => {
    expect(parabola(150e6, 300e6)).toBe(150e6);
    expect(parabola(10e6, 300e6)).toBe(10e6);
  });

  it('gives ¾ of the plateau where the elastic stress equals it, and ⅔ at ¾ of it', () => {
    expect(parabola(300e6, 300e6)).toBeCloseTo(225e6, 3);
    expect(parabola(225e6, 300e6)).toBeCloseTo(200e6, 3);
  });

  it('has no step and no kink at the joint', () => {
    const p = 300e6;
    const h = 1;
    const [before, joint, after] = [p / 2 - h, p / 2, p / 2 + h].map((e) => parabola(e, p)) as [number, number, number];
    expect(joint - before).toBeCloseTo(h, 5);
    expect(after - joint).toBeCloseTo(h, 5);
  });

  it('never passes the plateau nor the elastic stress, and grows with both', () => {
    const stress = fc.integer({ min: 1, max: 1e9 });
    fc.assert(
      fc.property(stress, stress, stress, (e, p, more) => {
        expect(parabola(e, p)).toBeLessThanOrEqual(Math.min(e, p) * (1 + 1e-15));
        expect(parabola(e + more, p)).toBeGreaterThanOrEqual(parabola(e, p) * (1 - 1e-15));
        expect(parabola(e, p + more)).toBeGreaterThanOrEqual(parabola(e, p) * (1 - 1e-15));
      }),
    );
  });

  it.each([
    [100e6, 140e6, 1, 1],
    [100e6, 300e6, 1 / 3, 1],
    [200e6, 400e6, 3 / 13, 3 / 5],
  ])('from %d to %d Pa has slopes from %d to %d', (lo, hi, least, most) => {
    expect(slope(hi, 300e6)).toBeCloseTo(least, 14);
    expect(slope(lo, 300e6)).toBeCloseTo(most, 14);
  });
});
