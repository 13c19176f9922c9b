import type { Box } from '../tube/box.js';
import { MEASURE } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';
import type { Check, Limit, Pair, Proportion } from './check.js';

/** θ = T·L/(G·J) end to end at limit load, against a greatest twist; rad. */
export class Twist implements Check {
  readonly limit = 'twist';
  readonly proportion: Proportion;
  private readonly moment = Number.NaN;

  /**
   * @param load index of the load case
   * @param torque T, N·m, either hand
   * @param length L, m
   * @param shearModulus G, Pa
   * @param twistMax θ_max end to end, rad
   */
  constructor(
    readonly load: number | null,
    torque: number,
    length: number,
    shearModulus: number,
    private readonly twistMax: number,
  ) {
    this.moment = (Math.abs(torque) * length) / shearModulus;
    this.proportion = { measure: MEASURE.perSecondMoment, factor: this.moment / twistMax / 2 };
  }

  utilisation(at: Section): number {
    return this.proportion.factor * at.perSecondMoment;
  }

  bound(over: Box, out: Span): void {
    out.scaled(over.perSecondMoment, this.proportion.factor);
  }

  pair(at: Section): Pair {
    return { demand: this.moment / at.polarMoment, capacity: this.twistMax, interaction: false };
  }
}

/** Twist of the tube from end to end, no factor on load. */
export const twist: Limit = {
  id: 'twist',
  label: 'twist',
  unit: 'rad',
  formula: 'U = θ/θ_max, θ = T·L/(G·J) at limit load',
  source: 'Saint-Venant torsion of a round tube, exact',
  prepare: ({ loads, tube }, metal) =>
    loads.flatMap(({ torque, twistMax }, index) =>
      torque === 0 || twistMax === null ? [] : [new Twist(index, torque, tube.length, metal.shearModulus, twistMax)],
    ),
};
