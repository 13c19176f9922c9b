import { ThrustedBending } from '../buckling/thrust.js';
import type { LoadCase } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { LimitId } from '../report/report.js';
import type { Box } from '../tube/box.js';
import { MEASURE } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import { Span } from '../tube/span.js';
import type { Check, Pair, Proportion } from './check.js';

/** What a strength limit compares with: factor n and the allowables in tension and in shear, Pa. */
export interface Strengths {
  readonly factor: number;
  readonly direct: number;
  readonly shear: number;
}

/**
 * Circular interaction of direct stress and shear at the outermost fibre, U = n·√((σ/Ft)² + (τ/Fs)²)/j, with
 * τ = T·ro/J and σ = |N|/A + M*·ro/I. The style of MIL-HDBK-5 §1.5.3 for round tubes; from memory.
 */
export class StrengthCheck implements Check {
  readonly proportion: Proportion | null;
  private readonly torque = Number.NaN;
  private readonly bending: ThrustedBending | null;
  private readonly scale = Number.NaN;
  /** n·T/(j·Fs), m³ */
  private readonly shear = Number.NaN;
  /** n·|N|/(j·Ft), m² */
  private readonly axial = Number.NaN;
  /** n/(j·Ft), 1/Pa */
  private readonly perDirect = Number.NaN;
  private readonly a = new Span();
  private readonly b = new Span();
  private readonly c = new Span();

  constructor(
    readonly limit: LimitId,
    readonly load: number,
    loadCase: LoadCase,
    metal: Metal,
    span: number,
    private readonly strengths: Strengths,
  ) {
    const { factor } = strengths;
    const thrust = factor * Math.max(0, -loadCase.axial);
    this.torque = Math.abs(loadCase.torque);
    this.bending =
      loadCase.bending > 0 ? new ThrustedBending(loadCase.bending, thrust, metal.youngsModulus, span) : null;
    this.scale = factor / metal.jointFactor;
    this.shear = (this.scale * this.torque) / strengths.shear;
    this.perDirect = this.scale / strengths.direct;
    this.axial = this.perDirect * Math.abs(loadCase.axial);
    const pure = this.axial === 0 && this.bending === null;
    this.proportion = pure ? { measure: MEASURE.shearPerTorque, factor: this.shear } : null;
  }

  utilisation(at: Section): number {
    const tau = this.shear * at.shearPerTorque;
    if (this.axial === 0 && this.bending === null) return tau;
    const sigma = this.direct(at);
    return Math.sqrt(sigma * sigma + tau * tau);
  }

  bound(over: Box, out: Span): void {
    const { a, b, c } = this;
    if (this.torque > 0) {
      out.scaled(over.shearPerTorque, this.shear);
      if (this.axial === 0 && this.bending === null) return;
    }
    if (this.axial > 0) a.inverse(over.area, this.axial);
    if (this.bending !== null) {
      b.scaled(over.shearPerTorque, 2 * this.perDirect);
      b.product(b, this.bending.momentOver(over, c));
      if (this.axial > 0) a.sum(a, b);
      else a.copy(b);
    }
    if (this.torque > 0) out.hypotenuse(out, a);
    else out.copy(a);
  }

  pair(at: Section): Pair {
    const demand = (this.scale * this.torque * at.outerRadius) / at.polarMoment;
    return { demand, capacity: this.strengths.shear, interaction: this.axial > 0 || this.bending !== null };
  }

  /** n·σ/(j·Ft); M*·ro/I is twice M*·ro/J */
  private direct(at: Section): number {
    const axial = this.axial / at.area;
    if (this.bending === null) return axial;
    return axial + 2 * this.perDirect * this.bending.moment(at) * at.shearPerTorque;
  }
}

/** One strength check for every load case that loads the wall at all. */
export function strengthChecks(
  limit: LimitId,
  loads: readonly LoadCase[],
  metal: Metal,
  span: number,
  strengths: (load: LoadCase) => Strengths,
): StrengthCheck[] {
  return loads.flatMap((load, index) =>
    load.torque === 0 && load.axial === 0 && load.bending === 0
      ? []
      : [new StrengthCheck(limit, index, load, metal, span, strengths(load))],
  );
}
