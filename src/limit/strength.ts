import { ThrustedBending } from '../buckling/thrust.js';
import type { LoadCase } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { LimitId } from '../report/report.js';
import type { Box } from '../tube/box.js';
import { MEASURE } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import { share, Span } from '../tube/span.js';
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
  private readonly moment = new Span();
  private readonly direct = new Span();

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
    const sigma = this.directAt(at);
    return Math.sqrt(sigma * sigma + tau * tau);
  }

  bound(over: Box, out: Span): void {
    const { direct } = this;
    if (this.axial === 0 && this.bending === null) out.scaled(over.shearPerTorque, this.shear);
    else {
      this.directOver(over, direct);
      this.circleOver(over.shearPerTorque, direct, out);
    }
  }

  pair(at: Section): Pair {
    const demand = (this.scale * this.torque * at.outerRadius) / at.polarMoment;
    return { demand, capacity: this.strengths.shear, interaction: this.axial > 0 || this.bending !== null };
  }

  /** n·σ/(j·Ft); M*·ro/I is twice M*·ro/J */
  private directAt(at: Section): number {
    const axial = this.axial / at.area;
    if (this.bending === null) return axial;
    return axial + 2 * this.perDirect * this.bending.moment(at) * at.shearPerTorque;
  }

  /** The same over a box: slopes mixed by the share of N/A. */
  private directOver(over: Box, out: Span): void {
    const { axial, bending, moment } = this;
    const { area, shearPerTorque: q } = over;
    if (bending === null) return void out.inverse(area, axial);
    bending.momentOver(over, moment);
    const a0 = axial / area.hi;
    const a1 = axial / area.lo;
    const b0 = 2 * this.perDirect * moment.lo * q.lo;
    const b1 = 2 * this.perDirect * moment.hi * q.hi;
    const w0 = a0 / (a0 + b1);
    const w1 = a1 / (a1 + b0);
    out.lo = a0 + b0;
    out.hi = a1 + b1;
    out.dLo = share(-area.dHi, moment.dLo + q.dLo, w0, w1);
    out.dHi = share(-area.dLo, moment.dHi + q.dHi, w1, w0);
    out.tLo = share(-area.tHi, moment.tLo + q.tLo, w0, w1);
    out.tHi = share(-area.tLo, moment.tHi + q.tHi, w1, w0);
  }

  /** √(τ² + σ²) over a box, τ a multiple of ro/J: slopes mixed by the share of τ². */
  private circleOver(q: Span, direct: Span, out: Span): void {
    const t0 = this.shear * q.lo;
    const t1 = this.shear * q.hi;
    const { lo: s0, hi: s1 } = direct;
    const w0 = (t0 * t0) / (t0 * t0 + s1 * s1);
    const w1 = (t1 * t1) / (t1 * t1 + s0 * s0);
    out.lo = Math.sqrt(t0 * t0 + s0 * s0);
    out.hi = Math.sqrt(t1 * t1 + s1 * s1);
    out.dLo = share(q.dLo, direct.dLo, w0, w1);
    out.dHi = share(q.dHi, direct.dHi, w1, w0);
    out.tLo = share(q.tLo, direct.tLo, w0, w1);
    out.tHi = share(q.tHi, direct.tHi, w1, w0);
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
