import type { Job } from '../../src/job/job.js';
import type { Metal } from '../../src/material/material.js';
import { prepareChecks } from '../../src/limit/index.js';
import { Kernel } from '../../src/limit/kernel.js';
import { Box } from '../../src/tube/box.js';
import { Section } from '../../src/tube/section.js';
import type { Span } from '../../src/tube/span.js';

/** Sizes at which single evaluations are timed: (D, t), m; boxes reach up from each by `growth`. */
export interface Batch {
  readonly sizes: readonly (readonly [number, number])[];
  readonly growth: number;
  readonly rounds: number;
}

/** Median time of an evaluation, and the sum of all results, by which two kernels are seen to compute the same. */
export interface Pace {
  readonly nanoseconds: number;
  readonly sum: number;
}

/** Sizes spread evenly over a decade of each, in logarithms. */
export function batch(across: number, rounds: number): Batch {
  const sizes: [number, number][] = [];
  for (let i = 0; i < across; i++) {
    for (let j = 0; j < across; j++) sizes.push([0.03 * 10 ** (i / across), 0.0004 * 10 ** (j / across)]);
  }
  return { sizes, growth: 1.02, rounds };
}

/** Times all checks of a job at every size, and over every box. */
export function pace(job: Job, metal: Metal, { sizes, growth, rounds }: Batch): { point: Pace; box: Pace } {
  const kernel = new Kernel(prepareChecks(job, metal));
  const section = new Section(metal.wallTolerance);
  const box = new Box(metal.wallTolerance, job.tube.diameterToWallMin);
  const outer = Float64Array.from(sizes, ([D]) => D);
  const wall = Float64Array.from(sizes, ([, t]) => t);
  const point = timed(sizes.length, rounds, () => pointRound(kernel, section, outer, wall));
  return { point, box: timed(sizes.length, rounds, () => boxRound(kernel, box, outer, wall, growth)) };
}

function pointRound(kernel: Kernel, section: Section, outer: Float64Array, wall: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < outer.length; i++) {
    sum += kernel.fullest(section.set(outer[i] as number, wall[i] as number));
  }
  return sum;
}

function boxRound(kernel: Kernel, box: Box, outer: Float64Array, wall: Float64Array, growth: number): number {
  const { spans } = kernel;
  let sum = 0;
  for (let i = 0; i < outer.length; i++) {
    const D = outer[i] as number;
    const t = wall[i] as number;
    kernel.bounds(box.set(D, D * growth, t, t * growth));
    let own = 0;
    for (let k = 0; k < spans.length; k++) {
      const { lo, hi, dLo, dHi, tLo, tHi } = spans[k] as Span;
      // a place that no check goes by is left out, as the twin leaves it out
      if (hi > 0) own += lo + hi + dLo + dHi + tLo + tHi;
    }
    sum += own;
  }
  return sum;
}

function timed(size: number, rounds: number, round: () => number): Pace {
  const took: number[] = [];
  let sum = 0;
  for (let i = 0; i < rounds; i++) {
    const began = process.hrtime.bigint();
    sum = round();
    took.push(Number(process.hrtime.bigint() - began) / size);
  }
  return { nanoseconds: took.sort((a, b) => a - b)[rounds >> 1] ?? Number.NaN, sum };
}
