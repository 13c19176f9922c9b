import nlopt from 'nlopt-js';
import { Problem } from '../../src/sizing/problem.js';
import { Box } from '../../src/tube/box.js';
import { Span } from '../../src/tube/span.js';
import type { BenchJob } from './jobs.js';

export type Method = 'LN_COBYLA' | 'LD_SLSQP';

/** What a general-purpose minimiser made of a job, from all starts together. */
export interface Minimised {
  readonly evaluations: number;
  /** the least mass of a size that passes, kg; +∞ where none was met */
  readonly mass: number;
}

/** Starts in (ln D, ln D/t), D in m. */
const STARTS = [
  [0.05, 40],
  [0.02, 10],
  [0.1, 100],
  [0.3, 20],
  [0.15, 300],
].map(([D = 0, slimness = 0]) => [Math.log(D), Math.log(slimness)] as const);

const LARGEST = [Math.log(10), Math.log(5000)];
const MOST = 2000;
const TOLERANCE = 1e-9;

/** A problem as a minimiser sees it: ln mass and every ln U with gradients, evaluated once for each size asked about. */
class Seen {
  evaluations = 0;
  readonly count: number;
  private readonly problem: Problem;
  private readonly box: Box;
  private readonly mass = new Span();
  private readonly limits: readonly Span[];
  private x = Number.NaN;
  private y = Number.NaN;

  constructor({ job, metal }: BenchJob) {
    this.problem = new Problem(job, metal);
    this.box = new Box(metal.wallTolerance, job.tube.diameterToWallMin);
    this.count = this.problem.checks.length;
    this.limits = this.problem.checks.map(() => new Span());
  }

  get leastSlimness(): number {
    return Math.log(this.problem.slimmest);
  }

  objective(x: Float64Array, gradient: Float64Array | null): number {
    this.look(x);
    return valueOf(this.mass, gradient);
  }

  limit(k: number, x: Float64Array, gradient: Float64Array | null): number {
    this.look(x);
    return valueOf(this.limits[k] as Span, gradient);
  }

  passes(x: readonly number[]): boolean {
    this.look(x);
    return this.limits.every(({ lo }) => lo <= 1 + 1e-6);
  }

  massAt(x: readonly number[]): number {
    this.look(x);
    return this.mass.lo;
  }

  private look(at: ArrayLike<number>): void {
    const x = at[0] ?? Number.NaN;
    const y = at[1] ?? Number.NaN;
    if (x === this.x && y === this.y) return;
    this.x = x;
    this.y = y;
    this.evaluations++;
    const D = Math.exp(x);
    const t = D / Math.exp(y);
    this.box.set(D, D, t, t);
    this.problem.checks.forEach((check, k) => {
      check.bound(this.box, this.limits[k] as Span);
    });
    this.problem.mass.bound(this.box, this.mass);
  }
}

/** ln of a value, and its slopes in (ln D, ln D/t): t = D·(D/t)⁻¹. */
function valueOf({ lo, dLo, tLo }: Span, gradient: Float64Array | null): number {
  gradient?.set([dLo + tLo, -tLo]);
  return Math.log(lo);
}

/** Runs a minimiser on a job from every start. */
export function minimise(bench: BenchJob, method: Method): Minimised {
  const seen = new Seen(bench);
  let mass = Number.POSITIVE_INFINITY;
  for (const start of STARTS) {
    const found = from(seen, method, start);
    if (found !== null && seen.passes(found)) mass = Math.min(mass, seen.massAt(found));
  }
  nlopt.GC.flush();
  return { evaluations: seen.evaluations, mass };
}

function from(seen: Seen, method: Method, start: readonly number[]): readonly number[] | null {
  const optimum = new nlopt.Optimize(nlopt.Algorithm[method], 2);
  optimum.setLowerBounds([Math.log(1e-4), seen.leastSlimness]);
  optimum.setUpperBounds(LARGEST);
  optimum.setMinObjective((x, gradient) => seen.objective(x, gradient), TOLERANCE);
  for (let k = 0; k < seen.count; k++) {
    optimum.addInequalityConstraint((x, gradient) => seen.limit(k, x, gradient), TOLERANCE);
  }
  optimum.setMaxeval(MOST);
  try {
    return optimum.optimize(start).x;
  } catch {
    // gives up in words where it meets something that is not a number, or rounding stops it
    return null;
  }
}

export const ready: Promise<unknown> = nlopt.ready;
