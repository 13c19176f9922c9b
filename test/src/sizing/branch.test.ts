import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Look } from '../../../src/sizing/branch.js';
import { least } from '../../../src/sizing/least.js';
import { Problem } from '../../../src/sizing/problem.js';
import { fullest, massOf } from '../../reference/limits.js';
import { logReal, real, tasks, type Task } from './jobs.js';

type Size = readonly [D: number, t: number];

/** Sizes about the lightest that pass and weigh less than `under`, the lightest itself among them. */
function sizesUnder({ job, metal }: Task, [D, t]: Size, under: number, reach: number): Size[] {
  const steps = Array.from({ length: 15 }, (_, i) => (i - 7) / 7);
  const around = steps.flatMap((x) => steps.map((y): Size => [D * Math.exp(reach * x), t * Math.exp(reach * y)]));
  return around.filter((size) => massOf(job, metal, ...size) < under && fullest(job, metal, ...size) <= 1 + 1e-9);
}

/** A box about a size: its extents left, right, below, above, as logarithms, some of no width; and which size. */
const boxes = fc.record({
  extents: fc.array(fc.oneof(fc.constant(0), logReal(1e-6, 3)), { minLength: 4, maxLength: 4 }),
  pick: fc.nat(),
});

describe('a look at a box', () => {
  it('never shuts out or cuts off a size that passes and is light enough', { timeout: 60_000 }, () => {
    let seen = 0;
    let shrunk = 0;
    const many = fc.array(boxes, { minLength: 20, maxLength: 20 });
    const safe = fc.property(tasks, logReal(1e-5, 0.5), many, (task, reach, all) => {
      const { found } = least(new Problem(task.job, task.metal));
      if (found === null) return;
      const under = found.value * (1 + reach);
      const sizes = sizesUnder(task, [found.outerDiameter, found.wall], under, reach);
      const look = new Look(new Problem(task.job, task.metal));
      for (const { extents, pick } of all) {
        const [D, t] = sizes[pick % sizes.length]!;
        const [left, right, below, above] = extents.map(Math.exp) as [number, number, number, number];
        const [d0, d1, t0, t1] = [D / left, D * right, t / below, t * above];
        seen++;
        expect(look.at(d0, d1, t0, t1, under)).toBe(true);
        expect(look.outerLo <= D && D <= look.outerHi && look.wallLo <= t && t <= look.wallHi).toBe(true);
        expect(look.outerLo >= d0 && look.outerHi <= d1 && look.wallLo >= t0 && look.wallHi <= t1).toBe(true);
        if (Math.log(look.outerHi / look.outerLo) < 0.9 * Math.log(d1 / d0)) shrunk++;
      }
    });
    fc.assert(safe, { numRuns: 200, seed: 17, endOnFailure: true });
    expect(seen).toBeGreaterThan(3000);
    expect(shrunk).toBeGreaterThan(500);
  });

  it('shuts out small boxes of sizes that fail a limit or weigh too much', () => {
    let shut = 0;
    let looked = 0;
    const close = fc.property(tasks, real(-0.7, 0.7), real(-0.7, 0.7), (task, x, y) => {
      const { job, metal } = task;
      const { found } = least(new Problem(job, metal));
      if (found === null) return;
      const [D, t] = [found.outerDiameter * Math.exp(x), found.wall * Math.exp(y)];
      if (massOf(job, metal, D, t) < 1.02 * found.value && fullest(job, metal, D, t) < 1.02) return;
      looked++;
      const look = new Look(new Problem(job, metal));
      if (!look.at(D * 0.999, D * 1.001, t * 0.999, t * 1.001, found.value)) shut++;
    });
    fc.assert(close, { numRuns: 500, seed: 18, endOnFailure: true });
    expect(looked).toBeGreaterThan(200);
    expect(shut / looked).toBe(1);
  });
});
