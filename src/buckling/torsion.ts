import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';

/**
 * Elastic critical shear stress of a round wall in torsion, simply supported ends: engineering basis §3.
 *
 * - moderately long: τ_m = κ·0.85·π²/12·E·(1 − ν²)^(−5/8)·(tc/r)^(5/4)·(r/L)^(1/2), from k_xy = 0.85(γZ)^(3/4), NASA
 *   SP-8007 (1968) §4.2; Batdorf, NACA Report 887. The printed 0.747 for ν = 0.3 is 0.7 % above what 0.85 gives; this
 *   code uses 0.85.
 * - long: τ_l = κ^(4/3)·E/(3√2·(1 − ν²)^(3/4))·(tc/r)^(3/2), SP-8007; Timoshenko & Gere, Theory of Elastic Stability,
 *   §11.13. It carries γ = κ^(4/3), so the two cross where γZ = 77.4(1 − ν²)(r/tc)² and the curve does not jump.
 *
 * τ_e = max(τ_m, τ_l). Short walls (γZ < 50) stand a little more than τ_m says.
 */
export class TorsionBuckling {
  private readonly moderate = Number.NaN;
  private readonly long = Number.NaN;

  /**
   * @param youngsModulus E, Pa
   * @param poissonRatio ν
   * @param length L between the end fittings, m
   * @param knockdown κ
   */
  constructor(youngsModulus: number, poissonRatio: number, length: number, knockdown: number) {
    const m = 1 - poissonRatio * poissonRatio;
    this.moderate = (knockdown * 0.85 * Math.PI * Math.PI * youngsModulus) / (12 * m ** 0.625 * Math.sqrt(length));
    this.long = (knockdown ** (4 / 3) * youngsModulus) / (3 * Math.SQRT2 * m ** 0.75);
  }

  /** τ_m, Pa, of a wall of mean radius r and checked wall tc, m. */
  moderateStress(r: number, tc: number): number {
    const q = tc / r;
    const root = Math.sqrt(q);
    return this.moderate * q * Math.sqrt(root * r);
  }

  /** τ_l, Pa, of a wall of mean radius r and checked wall tc, m. */
  longStress(r: number, tc: number): number {
    const q = tc / r;
    return this.long * q * Math.sqrt(q);
  }

  /** τ_e, Pa. */
  stress(at: Section): number {
    const r = at.meanRadius;
    const q = at.thickness;
    const root = Math.sqrt(q);
    return q * Math.max(this.moderate * Math.sqrt(root * r), this.long * root);
  }

  /**
   * τ_e over a box. With k = ro/r, the slope of r and of A in D, the slope of q = tc/r in D is −k: so the slope of τ_m is
   * −¾k at degree ½ in (D, t), that of τ_l −1½k at degree 0.
   */
  stressOver(over: Box, out: Span): Span {
    const { lo: q0, hi: q1 } = over.thickness;
    const { lo: r0, hi: r1, dLo: k0, dHi: k1 } = over.meanRadius;
    const root0 = Math.sqrt(q0);
    const root1 = Math.sqrt(q1);
    const m0 = this.moderate * q0 * Math.sqrt(root0 * r0);
    const m1 = this.moderate * q1 * Math.sqrt(root1 * r1);
    const l0 = this.long * q0 * root0;
    const l1 = this.long * q1 * root1;
    const moderate = m0 >= l1;
    const long = !moderate && l0 >= m1;
    const t0 = 0.5 + 0.75 * k0;
    const t1 = 0.5 + 0.75 * k1;
    out.lo = Math.max(m0, l0);
    out.hi = Math.max(m1, l1);
    out.dLo = (moderate ? -0.75 : -1.5) * k1;
    out.dHi = (long ? -1.5 : -0.75) * k0;
    out.tLo = moderate ? t0 : long ? 1.5 * k0 : Math.min(t0, 1.5 * k0);
    out.tHi = moderate ? t1 : long ? 1.5 * k1 : Math.max(t1, 1.5 * k1);
    return out;
  }
}
