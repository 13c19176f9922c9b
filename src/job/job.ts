import type { Material, Sizes } from '../material/material.js';

/** What holds for the tube whatever its load; m. Null where the job sets no such limit. */
export interface TubeSpec {
  /** between the end fittings */
  readonly length: number;
  /** between bearings, for column and whirl */
  readonly supportSpacing: number;
  readonly outerDiameterMax: number | null;
  readonly outerDiameterMin: number | null;
  readonly boreMin: number | null;
  readonly wallMin: number | null;
  readonly diameterToWallMin: number;
  readonly diameterToWallMax: number;
}

/** One load case at limit load; N·m, N, rad, Pa. */
export interface LoadCase {
  readonly name: string;
  /** signed: the sign is its hand */
  readonly torque: number;
  /** ≥ 0 */
  readonly bending: number;
  /** tension positive */
  readonly axial: number;
  /** true: both hands act; false: only the hand given; null: not said, both are checked */
  readonly reversing: boolean | null;
  /** end to end, rad (a limit per length is multiplied by the length on reading) */
  readonly twistMax: number | null;
  readonly shearStressMax: number | null;
  readonly yieldFactor: number;
  readonly ultimateFactor: number;
  readonly bucklingFactor: number;
}

/** The running speed, rad/s, and how far above it the first whirl speed must lie. */
export interface Speed {
  readonly max: number;
  readonly margin: number;
}

/** A design in hand, checked as it is; m. */
export interface HeldDesign {
  readonly name: string;
  /** id of a material of the job */
  readonly material: string;
  readonly outerDiameter: number;
  readonly wall: number;
}

export type Pick = { readonly material: string } | { readonly held: string };

export type FrontAxis = 'twist' | 'outerDiameter' | 'cost';

/** The resolved job: SI numbers, every default, record and stock row written out. It is what the digest covers. */
export interface Job {
  readonly format: 'wringwall-job';
  readonly version: 1;
  readonly title: string;
  readonly number: string | null;
  readonly revision: string | null;
  readonly author: string | null;
  readonly note: string | null;
  readonly tube: TubeSpec;
  readonly loads: readonly LoadCase[];
  readonly speed: Speed | null;
  readonly buckling: { readonly torsionKnockdown: number; readonly method: 'formula' };
  readonly materials: readonly Material[];
  readonly sizes: Sizes;
  readonly hold: readonly HeldDesign[];
  readonly pick: Pick | null;
  readonly currency: string | null;
  readonly front: { readonly against: FrontAxis };
}

/** A job as it was read: the resolved job and, by key path, the unit in which each value was entered. */
export interface Brief {
  readonly job: Job;
  /** "tube.length" → "m", "loads.0.twistMax" → "deg/m" */
  readonly units: Readonly<Record<string, string>>;
}
