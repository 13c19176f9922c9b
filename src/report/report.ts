import type { FrontAxis, Job, Pick } from '../job/job.js';

export type LimitId =
  | 'shear-yield'
  | 'shear-ultimate'
  | 'shear-allowable'
  | 'twist'
  | 'wall-buckling'
  | 'column'
  | 'whirl'
  | 'wall-min'
  | 'outer-diameter'
  | 'bore'
  | 'diameter-to-wall';

/** A tube as the report shows it; m, kg, rad, N·m/rad, J. */
export interface Design {
  readonly outerDiameter: number;
  readonly wall: number;
  readonly bore: number;
  readonly meanRadius: number;
  readonly mass: number;
  /** at the worst load */
  readonly twist: number;
  /** G·J/L */
  readonly torsionalStiffness: number;
  /** at the largest limit torque */
  readonly strainEnergy: number;
  readonly cost: number | null;
  /** stack notation; null for a metal */
  readonly layup: string | null;
}

/** One limit under one load; the pair a checker sets side by side, factors included in the demand. */
export interface LimitEntry {
  readonly limit: LimitId;
  /** name of the load case; null where the limit does not depend on load */
  readonly load: string | null;
  readonly demand: number;
  readonly capacity: number;
  readonly unit: string;
  readonly utilisation: number;
  /** 1/U − 1; null where the utilisation is 0 */
  readonly margin: number | null;
  /** within 0.001 of the fullest */
  readonly governs: boolean;
  /** true where thrust or bending makes the utilisation an interaction, not demand over capacity */
  readonly interaction?: true;
}

export interface Relief {
  readonly limit: LimitId;
  /** kg saved by relaxing the limit by 1 % in every load case */
  readonly massSavedPerPercent: number;
}

export interface Optimality {
  readonly method: string;
  /** kg; no tube that passes is lighter; null where it is proved that nothing fits */
  readonly lowerBoundMass: number | null;
  /** (mass − lowerBoundMass)/mass */
  readonly gap: number;
  readonly evaluations: number;
}

export interface Flag {
  readonly code: string;
  readonly text: string;
}

/** A single change that lets something fit, in the job file's own words. */
export interface Ease {
  readonly path: string;
  readonly from: string;
  readonly to: string;
}

export interface NoFit {
  /** limits that cannot be met together */
  readonly conflict: readonly LimitId[];
  readonly ease: readonly Ease[];
  /** the greatest factor on every torque at which something fits, where no single requirement opens the way */
  readonly torqueFactor: number | null;
}

export interface Candidate {
  readonly material: string;
  readonly feasible: boolean;
  readonly design: Design | null;
  readonly limits: readonly LimitEntry[];
  readonly relief: readonly Relief[];
  readonly optimality: Optimality;
  readonly flags: readonly Flag[];
  readonly noFit: NoFit | null;
}

/** A tube of any size, checked as it is. */
export interface DesignCheck {
  readonly material: string;
  readonly feasible: boolean;
  readonly design: Design;
  readonly limits: readonly LimitEntry[];
  readonly flags: readonly Flag[];
}

/** A design in hand, checked as it is. */
export interface HeldResult extends DesignCheck {
  readonly name: string;
}

export interface FrontPoint {
  readonly material: string;
  readonly mass: number;
  /** rad */
  readonly twist: number;
  readonly outerDiameter: number;
  readonly wall: number;
  readonly layup: string | null;
  readonly cost: number | null;
  readonly governs: LimitId;
  readonly dominated: boolean;
  readonly meetsJob: boolean;
}

/** The answer: all that a view needs, SI base units, plain numbers. */
export interface Report {
  readonly format: 'wringwall-report';
  readonly version: 1;
  readonly engine: string;
  readonly jobDigest: string;
  readonly units: 'SI: m, kg, s, N, Pa, rad';
  readonly candidates: readonly Candidate[];
  readonly job: Job;
  readonly held: readonly HeldResult[];
  readonly pick: Pick | null;
  readonly front: { readonly against: FrontAxis; readonly points: readonly FrontPoint[] };
}
