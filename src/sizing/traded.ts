import type { Job } from '../job/job.js';
import { AtMost, OUTER_DIAMETER } from '../limit/geometric.js';
import { Twist } from '../limit/twist.js';
import type { Metal } from '../material/material.js';
import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';
import type { Objective } from './mass.js';
import { twistedLoads, worstTorque } from './twisted.js';

/** A quantity that mass is traded against, and for which rungs stand in for the job's own limits. */
export interface Traded {
  /** the job without its own limit on it */
  readonly free: Job;
  /** the job with the rung in place of its own limit */
  readonly at: (rung: number) => Job;
  /** the quantity itself, to find the least that any tube reaches */
  readonly objective: Objective;
}

/** A check whose limit is 1 measures the quantity itself. */
class Measured implements Objective {
  constructor(private readonly check: AtMost | Twist) {}

  value(at: Section): number {
    return this.check.utilisation(at);
  }

  bound(over: Box, out: Span): void {
    this.check.bound(over, out);
  }
}

/** End-to-end twist at limit load, rad: the largest over the load cases whose twist counts. */
export function tradedTwist(job: Job, metal: Metal): Traded {
  const counted = new Set(twistedLoads(job));
  const at = (twistMax: number | null): Job => ({
    ...job,
    loads: job.loads.map((load) => (counted.has(load) ? { ...load, twistMax } : load)),
  });
  const twist = new Twist(null, worstTorque(job), job.tube.length, metal.shearModulus, 1);
  return { free: at(null), at, objective: new Measured(twist) };
}

/** Outer diameter, m. */
export function tradedDiameter(job: Job): Traded {
  const at = (outerDiameterMax: number | null): Job => ({ ...job, tube: { ...job.tube, outerDiameterMax } });
  const diameter = new AtMost('outer-diameter', OUTER_DIAMETER, 1);
  return { free: at(null), at, objective: new Measured(diameter) };
}
