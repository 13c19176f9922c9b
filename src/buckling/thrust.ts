import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import { times, type Span } from '../tube/span.js';

/** n·P/P_E from which the amplification is held at 1/(1 − 0.999) = 1000. */
const LAST = 0.999;

/** More than rounding can do to n·P/P_E: near 1 it is allowed for before the quotient magnifies it. */
const ROUNDING = 4e-15;

/**
 * Bending amplified by thrust: M* = M/(1 − n·P/P_E), P_E = π²EI/Ls² (engineering basis §2; the usual amplification of a
 * beam-column, Timoshenko & Gere §1.11).
 */
export class ThrustedBending {
  private readonly bending = Number.NaN;
  private readonly ratio = Number.NaN;

  /**
   * @param bending M, N·m
   * @param thrust factored thrust n·P, N, ≥ 0
   * @param youngsModulus E, Pa
   * @param span Ls, m
   */
  constructor(bending: number, thrust: number, youngsModulus: number, span: number) {
    this.bending = bending;
    this.ratio = (thrust * span * span) / (Math.PI * Math.PI * youngsModulus);
  }

  /** M*, N·m. */
  moment(at: Section): number {
    return this.bending / (1 - Math.min(this.ratio * at.perSecondMoment, LAST));
  }

  /** M* over a box; its slope in ln(nP/P_E) is x/(1 − x), and 0 where the amplification is held. */
  momentOver(over: Box, out: Span): Span {
    if (this.ratio === 0) return out.homogeneous(this.bending, this.bending, 0, 0, 0);
    const { perSecondMoment } = over;
    const x0 = Math.min(this.ratio * perSecondMoment.lo - ROUNDING, LAST);
    const x1 = Math.min(this.ratio * perSecondMoment.hi + ROUNDING, LAST);
    const m0 = 1 / (1 - x0);
    const m1 = 1 / (1 - x1);
    const f0 = x1 === LAST ? 0 : x0 * m0;
    const f1 = x0 === LAST ? 0 : x1 * m1;
    out.lo = this.bending * m0;
    out.hi = this.bending * m1;
    out.dLo = times(perSecondMoment.dLo, f0, f1);
    out.dHi = times(perSecondMoment.dHi, f1, f0);
    out.tLo = times(perSecondMoment.tLo, f0, f1);
    out.tHi = times(perSecondMoment.tHi, f1, f0);
    return out;
  }
}
