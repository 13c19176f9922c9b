import type { Job } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { LimitId } from '../report/report.js';
import type { Box } from '../tube/box.js';
import type { Measure } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';

/** The pair a checker sets side by side, factors included in the demand, in the limit's unit. */
export interface Pair {
  readonly demand: number;
  readonly capacity: number;
  /** thrust or bending makes the utilisation an interaction, not the quotient of the pair */
  readonly interaction: boolean;
  /** where it is not the limit's own */
  readonly unit?: string;
}

/** U as a constant multiple of one measure of the tube. */
export interface Proportion {
  readonly measure: Measure;
  readonly factor: number;
}

/** One limit under one load case, its constants hoisted. */
export interface Check {
  readonly limit: LimitId;
  /** index of the load case; null where the limit does not depend on load */
  readonly load: number | null;
  /** where U is a multiple of one measure, which: such checks are evaluated together; else null */
  readonly proportion: Proportion | null;
  /** U at a point: 1 is exactly full, ≤ 1 passes; proportional to load where it can be */
  utilisation(at: Section): number;
  /** U enclosed over a box, to within `OUTWARD` */
  bound(over: Box, out: Span): void;
  pair(at: Section): Pair;
}

/** One limit of the engineering basis: what it is called, what it says, and how it is prepared. */
export interface Limit {
  readonly id: LimitId;
  readonly label: string;
  /** unit of demand and capacity, SI */
  readonly unit: string;
  /** the rule as a checker would write it */
  readonly formula: string;
  readonly source: string;
  /** The checks that the job puts on a tube of this metal; none where the limit does not apply. */
  prepare(job: Job, metal: Metal): readonly Check[];
}
