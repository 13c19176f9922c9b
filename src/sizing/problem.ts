import type { Job } from '../job/job.js';
import type { Check } from '../limit/check.js';
import { prepareChecks } from '../limit/index.js';
import { Kernel, type Eased } from '../limit/kernel.js';
import type { Metal } from '../material/material.js';
import type { LimitId } from '../report/report.js';
import { Box } from '../tube/box.js';
import { Section } from '../tube/section.js';
import { Span } from '../tube/span.js';
import { Mass, type Objective } from './mass.js';

/** A design passes where every U ≤ 1 + PASS. */
export const PASS = 1e-9;

/** The sizes that are searched at all, m: from foil of a micrometre to a tube no mill rolls. */
export const SEARCHED = { wallLeast: 1e-6, outerGreatest: 100 } as const;

/** Least D/t that is looked at when the limit on it is lifted: there must be a bore. */
const LEAST_SLIMNESS = 2.02;

/** How a problem departs from the job's own: limits left out, limits eased, something other than mass made least. */
export interface Variation {
  readonly lifted?: ReadonlySet<LimitId>;
  readonly eased?: Eased;
  readonly objective?: Objective;
}

/**
 * The least-mass problem of one metal: the checks on it and what is made least.
 * `evaluations` counts points and boxes at which all checks were evaluated.
 */
export class Problem {
  readonly section: Section;
  readonly box: Box;
  readonly span = new Span();
  readonly objective: Objective;
  readonly mass: Mass;
  readonly checks: readonly Check[];
  /** the checks as the search evaluates them: all pass at 1 */
  readonly kernel: Kernel;
  readonly slimmest: number;
  evaluations = 0;

  constructor(job: Job, metal: Metal, { lifted, eased, objective }: Variation = {}) {
    const checks = prepareChecks(job, metal);
    this.checks = lifted === undefined ? checks : checks.filter(({ limit }) => !lifted.has(limit));
    this.kernel = new Kernel(this.checks, eased);
    const ease = eased?.limit === 'diameter-to-wall' ? eased.by : 1;
    this.slimmest = lifted?.has('diameter-to-wall') === true ? LEAST_SLIMNESS : job.tube.diameterToWallMin / ease;
    this.section = new Section(metal.wallTolerance);
    this.box = new Box(metal.wallTolerance, Math.max(this.slimmest * (1 - 2 * PASS), LEAST_SLIMNESS));
    this.mass = new Mass(metal.density, job.tube.length);
    this.objective = objective ?? this.mass;
  }

  /** Largest ln U at a point, past its level where that is eased; ≤ ln(1 + PASS) where the design passes. */
  excess(outerDiameter: number, wall: number): number {
    this.evaluations++;
    return Math.log(this.kernel.fullest(this.section.set(outerDiameter, wall)));
  }

  passes(outerDiameter: number, wall: number): boolean {
    return wall > 0 && outerDiameter > 2 * wall && this.excess(outerDiameter, wall) <= PASS;
  }
}
