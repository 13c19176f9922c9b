import { describe, expect, it } from 'vitest';
import { rootBetween } from '../../../src/sizing/root.js';

describe('a root between two signs', () => {
  it('is found where the function is smooth, kinked, steep or flat', () => {
    const functions: readonly ((s: number) => number)[] = [
      (s) => s - 0.3,
      (s) => Math.max(s - 0.3, 40 * (s - 0.3)),
      (s) => Math.exp(30 * s) - Math.exp(9),
      (s) => Math.sign(s - 0.3) * Math.abs(s - 0.3) ** 1.5,
      (s) => 60 * Math.tanh(1e4 * (s - 0.3)),
    ];
    for (const f of functions) {
      expect(rootBetween(f, f(0), f(1))).toBeCloseTo(0.3, 8);
      expect(rootBetween((s) => -f(s), -f(0), -f(1))).toBeCloseTo(0.3, 8);
    }
  });

  it('takes few steps where the function is nearly straight', () => {
    let calls = 0;
    const f = (s: number): number => {
      calls++;
      return Math.log((1 + s) ** 3 / 2);
    };
    expect(rootBetween(f, f(0), f(1))).toBeCloseTo(2 ** (1 / 3) - 1, 12);
    expect(calls).toBeLessThan(12);
  });
});
