import type { Brief, Job } from '../job/job.js';
import { limitEntries } from '../limit/entries.js';
import type { Metal } from '../material/material.js';
import type { Candidate, DesignCheck, Flag, HeldResult, NoFit } from '../report/report.js';
import { conflict } from './conflict.js';
import { designOf } from './design.js';
import { eases, torqueFactor } from './ease.js';
import { flagsOf } from './flags.js';
import { Problem } from './problem.js';
import { relief } from './relief.js';
import { solve } from './solve.js';

/** The lightest tube of one metal with its limits, reliefs and proof; or why nothing fits. */
export function sizeMaterial(brief: Brief, metal: Metal): Candidate {
  const { job } = brief;
  const { size, optimality } = solve(job, metal);
  if (size === null) return unfit(brief, metal, optimality);
  const { outerDiameter, wall, pricePerMetre } = size;
  const problem = new Problem(job, metal);
  const limits = limitEntries(job, problem.checks, problem.section.set(outerDiameter, wall));
  return {
    material: metal.id,
    feasible: true,
    design: designOf(job, metal, outerDiameter, wall, pricePerMetre),
    limits,
    relief: relief(job, metal, size, limits),
    optimality,
    flags: flagsOf(job, metal, outerDiameter, wall),
    noFit: null,
  };
}

/** Sizes were left that neither pass nor could be excluded. */
const UNDECIDED: Flag = {
  code: 'undecided',
  text: 'The search ended before it could decide whether anything fits: what stands here is not proved.',
};

function unfit(brief: Brief, metal: Metal, optimality: Candidate['optimality']): Candidate {
  return {
    material: metal.id,
    feasible: false,
    design: null,
    limits: [],
    relief: [],
    optimality,
    flags: optimality.lowerBoundMass === null ? [] : [UNDECIDED],
    noFit: noFit(brief, metal),
  };
}

function noFit(brief: Brief, metal: Metal): NoFit {
  const ease = eases(brief, metal);
  const factor = ease.length > 0 ? null : torqueFactor(brief.job, metal);
  return { conflict: conflict(brief.job, metal), ease, torqueFactor: factor };
}

/** Every design in hand, checked as it is. */
export function checkHeld({ job }: Brief): HeldResult[] {
  return job.hold.flatMap(({ name, material, outerDiameter, wall }) => {
    const metal = job.materials.find(({ id }) => id === material);
    if (metal === undefined) return [];
    return [{ name, ...checkDesign(job, metal, outerDiameter, wall) }];
  });
}

/**
 * A tube of any size, m, checked as it is, whatever sizes the job allows.
 * Needs 0 < wall < outerDiameter/2.
 */
export function checkDesign(job: Job, metal: Metal, outerDiameter: number, wall: number): DesignCheck {
  const problem = new Problem(job, metal);
  const feasible = problem.passes(outerDiameter, wall);
  const limits = limitEntries(job, problem.checks, problem.section.set(outerDiameter, wall));
  const design = designOf(job, metal, outerDiameter, wall, null);
  return { material: metal.id, feasible, design, limits, flags: flagsOf(job, metal, outerDiameter, wall) };
}
