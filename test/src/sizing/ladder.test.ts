import { describe, expect, it } from 'vitest';
import { ladder, RUNGS } from '../../../src/sizing/ladder.js';

describe('a ladder', () => {
  it('holds both ends exactly and steps geometrically between', () => {
    const rungs = ladder(0.3, 0.07);
    expect(rungs).toHaveLength(RUNGS);
    expect(RUNGS).toBeGreaterThanOrEqual(40);
    expect(rungs[0]).toBe(0.3);
    expect(rungs.at(-1)).toBe(0.07);
    const steps = rungs.slice(1).map((rung, i) => rung / rungs[i]!);
    for (const step of steps) expect(step).toBeCloseTo((0.07 / 0.3) ** (1 / (RUNGS - 1)), 12);
  });
});
