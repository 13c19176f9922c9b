import type { LoadCase } from '../job/job.js';
import type { Box } from '../tube/box.js';
import { MEASURE } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';
import type { Check, Limit, Pair, Proportion } from './check.js';

/** τ at limit load against the load case's own allowable, Pa. */
class ShearAllowable implements Check {
  readonly limit = 'shear-allowable';
  readonly proportion: Proportion;
  private readonly torque = Number.NaN;

  constructor(
    readonly load: number,
    torque: number,
    private readonly allowable: number,
  ) {
    this.torque = Math.abs(torque);
    this.proportion = { measure: MEASURE.shearPerTorque, factor: this.torque / allowable };
  }

  utilisation(at: Section): number {
    return this.proportion.factor * at.shearPerTorque;
  }

  bound(over: Box, out: Span): void {
    out.scaled(over.shearPerTorque, this.proportion.factor);
  }

  pair(at: Section): Pair {
    const demand = (this.torque * at.outerRadius) / at.polarMoment;
    return { demand, capacity: this.allowable, interaction: false };
  }
}

const applies = ({ torque, shearStressMax }: LoadCase): boolean => torque !== 0 && shearStressMax !== null;

/** Shear stress against a code's or a fatigue allowable. */
export const shearAllowable: Limit = {
  id: 'shear-allowable',
  label: 'shear allowable',
  unit: 'Pa',
  formula: 'U = τ/τ_max, τ = T·ro/J at limit load',
  source: 'The allowable is the load case’s own (a code’s or a fatigue allowable)',
  prepare: ({ loads }) =>
    loads.flatMap((load, index) =>
      applies(load) ? [new ShearAllowable(index, load.torque, load.shearStressMax ?? Number.NaN)] : [],
    ),
};
