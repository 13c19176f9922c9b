import nlopt from 'nlopt-js';
import type { Task } from '../src/sizing/jobs.js';
import { massOf, utilisations } from './limits.js';

/** A size that a general-purpose minimiser ended at and that passes; m, kg. */
export interface Minimised {
  readonly outerDiameter: number;
  readonly wall: number;
  readonly mass: number;
}

const SMALLEST = Math.log(1e-4);
const LARGEST = Math.log(30);

/** Unknowns are ln D and ln(D/t): both then have the same scale, and a tube has a bore wherever the second is over ln 2. */
const sizeAt = (x: ArrayLike<number>): [number, number] => [Math.exp(x[0]!), Math.exp(x[0]! - x[1]!)];

/** ln U of every check; one a load case. The minimiser sees them one by one, since their maximum has corners. */
function logUtilisations({ job, metal }: Task, x: ArrayLike<number>): number[] {
  const [D, t] = sizeAt(x);
  return utilisations(job, metal, D, t).map(({ U }) => Math.log(Math.max(U, 1e-12)));
}

/** Central differences in ln D and ln(D/t). */
function gradient(f: (x: readonly number[]) => number, x: ArrayLike<number>, into: Float64Array): void {
  const h = 1e-6;
  for (let i = 0; i < into.length; i++) {
    const at = (step: number): number => f(Array.from(x, (value, j) => (j === i ? value + step : value)));
    into[i] = (at(h) - at(-h)) / (2 * h);
  }
}

/** Runs one method from one start; the size it ends at, whatever the library thinks of its own success. */
function run(method: 'LN_COBYLA' | 'LD_SLSQP', task: Task, start: readonly number[], tolerance: number): number[] {
  const { job, metal } = task;
  const { Algorithm, Optimize } = nlopt;
  const problem = new Optimize(Algorithm[method], 2);
  const { diameterToWallMin } = job.tube;
  problem.setLowerBounds([SMALLEST, Math.log(diameterToWallMin)]);
  problem.setUpperBounds([LARGEST, Math.log(job.tube.diameterToWallMax)]);
  const lnMass = (x: ArrayLike<number>): number => Math.log(massOf(job, metal, ...sizeAt(x)));
  problem.setMinObjective((x, into) => {
    if (into !== null && into.length > 0) gradient(lnMass, x, into);
    return lnMass(x);
  }, tolerance);
  logUtilisations(task, start).forEach((_, k) => {
    const one = (x: ArrayLike<number>): number => logUtilisations(task, x)[k]!;
    problem.addInequalityConstraint((x, into) => {
      if (into !== null && into.length > 0) gradient(one, x, into);
      return one(x);
    }, 1e-10);
  });
  problem.setMaxeval(3000);
  try {
    return problem.optimize(start).x;
  } catch {
    // the library throws where rounding keeps it from a step; what it then stood at is lost
    return [...start];
  }
}

/** The size, where it passes to the minimiser's own accuracy; null where the run went astray. */
function passingOf(task: Task, x: readonly number[]): Minimised | null {
  const { job, metal } = task;
  const most = Math.max(...logUtilisations(task, x));
  if (!(most <= 1e-8)) return null;
  const [outerDiameter, wall] = sizeAt(x);
  return { outerDiameter, wall, mass: massOf(job, metal, outerDiameter, wall) };
}

/**
 * The least mass that sequential quadratic programming (SLSQP, D. Kraft) and linear approximation in a shrinking
 * region (COBYLA, M. J. D. Powell) come to from several starts, under the limits as written a second time; null where no
 * start leads to a size that passes.
 */
export async function minimised(
  task: Task,
  starts: readonly (readonly [D: number, slimness: number])[],
): Promise<Minimised | null> {
  await nlopt.ready;
  const ends = starts.flatMap(([D, slimness]) => {
    const start = [Math.log(D), Math.log(slimness)];
    const rough = run('LN_COBYLA', task, start, 1e-8);
    const polished = run('LN_COBYLA', task, rough, 1e-11);
    return [run('LD_SLSQP', task, start, 1e-13), run('LD_SLSQP', task, polished, 1e-13), polished];
  });
  nlopt.GC.flush();
  const passing = ends.map((x) => passingOf(task, x)).filter((end) => end !== null);
  return passing.reduce<Minimised | null>((best, end) => (best === null || end.mass < best.mass ? end : best), null);
}
