import { interaction, interactionOver } from '../buckling/interaction.js';
import { parabola, slope } from '../buckling/parabola.js';
import type { LoadCase } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { Box } from '../tube/box.js';
import { MEASURE } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import { Span, times } from '../tube/span.js';
import type { Check, Limit, Pair, Proportion } from './check.js';

/** A long shaft under thrust and torque between pinned bearings. */
export class Column implements Check {
  readonly limit = 'column';
  readonly proportion: Proportion | null;
  private readonly torque = Number.NaN;
  private readonly thrust = Number.NaN;
  private readonly euler = Number.NaN;
  private readonly greenhill = Number.NaN;
  /** n_b·T·Ls/(2πE), m⁴ */
  private readonly twisting = Number.NaN;
  private readonly plateau = Number.NaN;
  private readonly c = new Span();

  constructor(
    readonly load: number,
    loadCase: LoadCase,
    metal: Metal,
    span: number,
  ) {
    const { youngsModulus, compressiveYield } = metal;
    this.torque = loadCase.bucklingFactor * Math.abs(loadCase.torque);
    this.thrust = loadCase.bucklingFactor * Math.max(0, -loadCase.axial);
    this.euler = (Math.PI * Math.PI * youngsModulus) / (span * span);
    this.greenhill = (2 * Math.PI * youngsModulus) / span;
    this.twisting = this.torque / this.greenhill;
    this.plateau = compressiveYield;
    this.proportion = this.thrust > 0 ? null : { measure: MEASURE.perSecondMoment, factor: this.twisting };
  }

  utilisation(at: Section): number {
    const twisting = this.twisting * at.perSecondMoment;
    return this.thrust === 0 ? twisting : interaction(this.thrust / this.criticalThrust(at), twisting);
  }

  bound(over: Box, out: Span): void {
    const { c } = this;
    if (this.torque > 0) out.scaled(over.perSecondMoment, this.twisting);
    if (this.thrust === 0) return;
    this.thrustOver(over, c);
    if (this.torque > 0) interactionOver(out, c, out);
    else out.copy(c);
  }

  /** n_b·P/P_cr over a box. */
  private thrustOver({ area, gyrationSquared: g }: Box, out: Span): void {
    const { thrust, plateau, euler } = this;
    const e0 = euler * g.lo;
    const e1 = euler * g.hi;
    const f0 = slope(e1, plateau);
    const f1 = slope(e0, plateau);
    out.lo = thrust / (area.hi * parabola(e1, plateau));
    out.hi = thrust / (area.lo * parabola(e0, plateau));
    out.dLo = -(area.dHi + times(g.dHi, f1, f0));
    out.dHi = -(area.dLo + times(g.dLo, f0, f1));
    out.tLo = -(area.tHi + times(g.tHi, f1, f0));
    out.tHi = -(area.tLo + times(g.tLo, f0, f1));
  }

  pair(at: Section): Pair {
    if (this.torque === 0) {
      return { demand: this.thrust, capacity: this.criticalThrust(at), interaction: false, unit: 'N' };
    }
    return { demand: this.torque, capacity: this.greenhill * at.secondMoment, interaction: this.thrust > 0 };
  }

  /** P_cr = A·F(P_E/A; Fcy), N */
  private criticalThrust(at: Section): number {
    return at.area * parabola(this.euler * at.gyrationSquared, this.plateau);
  }
}

/** Long-shaft instability under torque and thrust (Greenhill). */
export const column: Limit = {
  id: 'column',
  label: 'column',
  unit: 'N·m',
  formula: 'U = ½[c + √(c² + 4s²)], c = n_b·P/P_cr, s = n_b·T/T_cr, P_cr = A·F(π²EI/(Ls²A); Fcy), T_cr = 2πEI/Ls',
  source: 'Greenhill; Timoshenko & Gere, Theory of Elastic Stability (from memory); Johnson parabola',
  prepare: ({ loads, tube }, metal) =>
    loads.flatMap((load, index) =>
      load.torque === 0 && load.axial >= 0 ? [] : [new Column(index, load, metal, tube.supportSpacing)],
    ),
};
