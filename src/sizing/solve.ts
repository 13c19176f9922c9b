import type { Job } from '../job/job.js';
import type { Metal, Sizes, StockTube } from '../material/material.js';
import type { Optimality } from '../report/report.js';
import { least, type Options } from './least.js';
import { Problem, type Variation } from './problem.js';
import { lightestListed, type Size } from './stock.js';

export interface Solution {
  /** the lightest size, or null where nothing fits */
  readonly size: Size | null;
  readonly optimality: Optimality;
}

const BY_PROOF = 'branch and bound over outer diameter and wall, every limit enclosed';
const BY_LIST = 'every listed size checked';

/** The sizes a metal may come in: its own, else the job's. */
export function sizesOf(job: Job, metal: Metal): Sizes {
  return metal.sizes ?? job.sizes;
}

/** The tubes of a list; mandrels are for laminates. */
export function tubesOf(sizes: Sizes): readonly StockTube[] | null {
  return sizes === 'any' ? null : sizes.stock.filter((row): row is StockTube => 'wall' in row);
}

/** The lightest size of one metal that passes every limit of the job, as varied. */
export function solve(job: Job, metal: Metal, variation: Variation = {}, options: Options = {}): Solution {
  const problem = new Problem(job, metal, variation);
  const tubes = tubesOf(sizesOf(job, metal));
  if (tubes !== null) {
    const size = lightestListed(problem, tubes);
    const mass = size?.mass ?? Number.POSITIVE_INFINITY;
    return { size, optimality: optimality(BY_LIST, mass, mass, problem.evaluations) };
  }
  const { found, lowerBound } = least(problem, options);
  if (found === null)
    return { size: null, optimality: optimality(BY_PROOF, lowerBound, lowerBound, problem.evaluations) };
  const { outerDiameter, wall } = found;
  const mass = problem.mass.of(outerDiameter, wall);
  const size = { outerDiameter, wall, mass, pricePerMetre: null };
  return { size, optimality: optimality(BY_PROOF, mass, lowerBound, problem.evaluations) };
}

/** Whether any size of the metal passes the job, as varied. */
export function fits(job: Job, metal: Metal, variation: Variation = {}): boolean {
  return solve(job, metal, variation, { anyWillDo: true }).size !== null;
}

function optimality(method: string, mass: number, lowerBound: number, evaluations: number): Optimality {
  const gap = Number.isFinite(mass) && mass > lowerBound ? (mass - lowerBound) / mass : 0;
  return { method, lowerBoundMass: Number.isFinite(lowerBound) ? lowerBound : null, gap, evaluations };
}
