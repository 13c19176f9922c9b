import { ThrustedBending } from '../buckling/thrust.js';
import { TorsionBuckling } from '../buckling/torsion.js';
import { WallBuckling } from '../buckling/wall.js';
import type { Job, LoadCase } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';
import type { Check, Limit, Pair } from './check.js';

/** The plateau never counts on more than this multiple of shear yield, or soft alloys would live far past it. */
const PAST_YIELD = 1.2;

/** Buckling of the wall under factored torsion, thrust and bending. */
export class WallBucklingCheck implements Check {
  readonly limit = 'wall-buckling';
  readonly proportion = null;
  readonly wall: WallBuckling;
  private readonly torque = Number.NaN;
  private readonly combined: boolean;

  constructor(
    readonly load: number,
    loadCase: LoadCase,
    job: Job,
    metal: Metal,
  ) {
    const { youngsModulus, poissonRatio, compressiveYield } = metal;
    const factor = loadCase.bucklingFactor;
    const thrust = factor * Math.max(0, -loadCase.axial);
    this.torque = factor * Math.abs(loadCase.torque);
    this.combined = thrust > 0 || loadCase.bending > 0;
    const torsion = new TorsionBuckling(youngsModulus, poissonRatio, job.tube.length, job.buckling.torsionKnockdown);
    const shearPlateau = Math.min(metal.shearUltimate, PAST_YIELD * metal.shearYield);
    const bending =
      loadCase.bending > 0
        ? new ThrustedBending(loadCase.bending, thrust, youngsModulus, job.tube.supportSpacing)
        : null;
    const material = { youngsModulus, poissonRatio, shearPlateau, compressiveYield };
    this.wall = new WallBuckling(torsion, material, { torque: this.torque, thrust, factor, bending });
  }

  utilisation(at: Section): number {
    return this.wall.utilisation(at);
  }

  bound(over: Box, out: Span): void {
    this.wall.bound(over, out);
  }

  pair(at: Section): Pair {
    return { demand: this.torque, capacity: this.wall.criticalTorque(at), interaction: this.combined };
  }
}

const applies = ({ torque, bending, axial }: LoadCase): boolean => torque !== 0 || bending > 0 || axial < 0;

/** Buckling of the wall; plateau Fp = min(Fsu, 1.2·Fsy) (ours). */
export const wallBuckling: Limit = {
  id: 'wall-buckling',
  label: 'wall buckling',
  unit: 'N·m',
  formula: 'U = ½[R_c + R_b + √((R_c + R_b)² + 4R_s²)], R_s = n_b·T/(2πr²tc·τcr), τcr = F(max(τ_m, τ_l); Fp)',
  source: 'NASA SP-8007 (1968) §4.2 (from memory), Batdorf NACA Report 887, parabola to Fp = min(Fsu, 1.2·Fsy)',
  prepare: (job, metal) =>
    job.loads.flatMap((load, index) => (applies(load) ? [new WallBucklingCheck(index, load, job, metal)] : [])),
};
