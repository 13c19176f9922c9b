import type { Measure } from './measure.js';
import { Span } from './span.js';

/**
 * A box of nominal sizes [D0, D1] × [t0, t1], m, with the section's quantities enclosed over the part of it where
 * D/t is at least `slimmest`. (A rectangle of sizes has corners that are no tubes; the slimmest wall keeps them out.)
 * Set anew for every box. With s = tc/ro and k = ro/r = 1/(1 − s/2), every quantity is homogeneous in (D, t) and its
 * slope in D is a function of s alone: r has k, A has k, I and J have k(3 − f), where
 * f = (σ²/2)/(1 + σ²/4), σ = tc/r, since J = 2πr³tc(1 + σ²/4).
 */
export class Box {
  outerLo = Number.NaN;
  outerHi = Number.NaN;
  wallLo = Number.NaN;
  wallHi = Number.NaN;
  /** D/t over the box */
  slimLo = Number.NaN;
  slimHi = Number.NaN;
  readonly meanRadius = new Span();
  /** tc/r */
  readonly thickness = new Span();
  readonly area = new Span();
  readonly gyrationSquared = new Span();
  /** 1/I */
  readonly perSecondMoment = new Span();
  /** ro/J */
  readonly shearPerTorque = new Span();
  private readonly kept = Number.NaN;

  /**
   * @param tolerance δ, the fraction by which the wall may be under nominal
   * @param slimmest least D/t that can be a tube, > 2
   */
  constructor(
    tolerance: number,
    readonly slimmest: number,
  ) {
    this.kept = 1 - tolerance;
  }

  /** I, made anew at every asking: limits go by 1/I */
  get secondMoment(): Span {
    return new Span().inverse(this.perSecondMoment, 1);
  }

  /** J, the same */
  get polarMoment(): Span {
    return new Span().inverse(this.perSecondMoment, 2);
  }

  set(outerLo: number, outerHi: number, wallLo: number, wallHi: number): this {
    this.outerLo = outerLo;
    this.outerHi = outerHi;
    this.wallLo = wallLo;
    this.wallHi = wallHi;
    this.slimLo = Math.max(outerLo / wallHi, this.slimmest);
    this.slimHi = Math.max(outerHi / wallLo, this.slimLo);
    this.encloseSection();
    return this;
  }

  private encloseSection(): void {
    const { kept, outerLo, outerHi, wallLo, wallHi, slimmest } = this;
    const ro0 = outerLo / 2;
    const ro1 = outerHi / 2;
    const tc0 = wallLo * kept;
    const tc1 = wallHi * kept;
    const s0 = (2 * kept) / this.slimHi;
    const s1 = (2 * kept) / this.slimLo;
    const k0 = 1 / (1 - s0 / 2);
    const k1 = 1 / (1 - s1 / 2);
    const r0 = Math.max(ro0 - tc1 / 2, ro0 / k1);
    const r1 = Math.max(ro1 - tc0 / 2, r0);
    const q0 = s0 * k0;
    const q1 = s1 * k1;
    const f0 = q0 * q0 * 0.25;
    const f1 = q1 * q1 * 0.25;
    const c0 = k0 * (3 - (2 * f1) / (1 + f1));
    const c1 = k1 * (3 - (2 * f0) / (1 + f0));
    this.meanRadius.homogeneous(r0, r1, k0, k1, 1);
    this.thickness.homogeneous(q0, q1, -k1, -k0, 0);
    const g0 = r0 * r0 * 0.5 + tc0 * tc0 * 0.125;
    const g1 = r1 * r1 * 0.5 + tc1 * tc1 * 0.125;
    this.gyrationSquared.homogeneous(g0, g1, c0 - k0, c1 - k1, 2);
    // A, I and J/ro grow with D and with t: their ends lie at the least tube and at the greatest
    const roA = Math.max(outerLo, wallLo * slimmest) / 2;
    const tcB = Math.min(wallHi, outerHi / slimmest) * kept;
    const rA = roA - tc0 / 2;
    const rB = ro1 - tcB / 2;
    const areaA = 2 * Math.PI * rA * tc0;
    const areaB = 2 * Math.PI * rB * tcB;
    const IA = areaA * (rA * rA * 0.5 + tc0 * tc0 * 0.125);
    const IB = areaB * (rB * rB * 0.5 + tcB * tcB * 0.125);
    const perA = 1 / IA;
    const perB = 1 / IB;
    this.area.homogeneous(areaA, areaB, k0, k1, 2);
    this.perSecondMoment.homogeneous(perB, perA, -c1, -c0, -4);
    this.shearPerTorque.homogeneous(0.5 * ro1 * perB, 0.5 * roA * perA, 1 - c1, 1 - c0, -3);
  }

  /** factor × the measure, enclosed */
  multiple(measure: Measure, factor: number, out: Span): Span {
    const { outerLo, outerHi, wallLo, wallHi, slimLo, slimHi } = this;
    switch (measure) {
      case 0:
        return out.scaled(this.shearPerTorque, factor);
      case 1:
        return out.scaled(this.perSecondMoment, factor);
      case 2:
        return out.homogeneous(factor * outerLo, factor * outerHi, 1, 1, 1);
      case 3:
        return out.homogeneous(factor / outerHi, factor / outerLo, -1, -1, -1);
      case 4:
        return out.homogeneous(factor / wallHi, factor / wallLo, 0, 0, -1);
      case 5:
        return out.homogeneous(factor * slimLo, factor * slimHi, 1, 1, 0);
      case 6:
        return out.homogeneous(factor / slimHi, factor / slimLo, -1, -1, 0);
      case 7:
        return this.perBore(factor, out);
    }
  }

  /**
   * factor × measure for all measures by number: the same as above, without a branch for each. Measures that are powers
   * of D and t have slopes that no box changes: they are left as `multiple` once set them.
   */
  multiples(factors: Float64Array, out: readonly Span[]): void {
    const { outerLo, outerHi, wallLo, wallHi, slimLo, slimHi } = this;
    const stress = factors[0] as number;
    const moment = factors[1] as number;
    const outer = factors[2] as number;
    const perOuter = factors[3] as number;
    const perWall = factors[4] as number;
    const slim = factors[5] as number;
    const perSlim = factors[6] as number;
    const perBore = factors[7] as number;
    if (stress > 0) (out[0] as Span).scaled(this.shearPerTorque, stress);
    if (moment > 0) (out[1] as Span).scaled(this.perSecondMoment, moment);
    if (outer > 0) (out[2] as Span).between(outer * outerLo, outer * outerHi);
    if (perOuter > 0) (out[3] as Span).between(perOuter / outerHi, perOuter / outerLo);
    if (perWall > 0) (out[4] as Span).between(perWall / wallHi, perWall / wallLo);
    if (slim > 0) (out[5] as Span).between(slim * slimLo, slim * slimHi);
    if (perSlim > 0) (out[6] as Span).between(perSlim / slimHi, perSlim / slimLo);
    if (perBore > 0) this.perBore(perBore, out[7] as Span);
  }

  /** D − 2t = D(1 − u), u = 2t/D, has the slope 1/(1 − u) in D and is homogeneous of degree 1. */
  private perBore(factor: number, out: Span): Span {
    const k0 = 1 / (1 - 2 / this.slimHi);
    const k1 = 1 / (1 - 2 / this.slimLo);
    const lo = Math.max(this.outerLo - 2 * this.wallHi, this.outerLo / k1);
    const hi = Math.max(this.outerHi - 2 * this.wallLo, lo);
    return out.homogeneous(factor / hi, factor / lo, -k1, -k0, -1);
  }
}
