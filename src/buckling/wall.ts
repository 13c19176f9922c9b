import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import { Span } from '../tube/span.js';
import { interaction, interactionOver } from './interaction.js';
import { BENDING_LOSS, COMPRESSION_LOSS, decayOf, knockdown, knockdownOver } from './knockdown.js';
import { parabola, parabolaOver, slope } from './parabola.js';
import type { ThrustedBending } from './thrust.js';
import type { TorsionBuckling } from './torsion.js';

/** Factored loads on the wall. */
export interface WallLoads {
  /** n_b·|T|, N·m */
  readonly torque: number;
  /** n_b·P, N */
  readonly thrust: number;
  /** n_b, and the amplified moment it multiplies; null where there is no bending */
  readonly factor: number;
  readonly bending: ThrustedBending | null;
}

/** What the wall is made of. */
export interface WallMaterial {
  readonly youngsModulus: number;
  readonly poissonRatio: number;
  /** Fp = min(Fsu, 1.2·Fsy), Pa */
  readonly shearPlateau: number;
  /** Fcy, Pa */
  readonly compressiveYield: number;
}

/**
 * Buckling of a round metal wall under torsion with thrust and bending (engineering basis §3, NASA SP-8007):
 * R_s = n_b·T/(2πr²tc)/τcr, R_c = n_b·P/(2πr·tc)/σ_c,cr, R_b = n_b·M* / (πr²tc)/σ_b,cr, and U = ½[R_c + R_b +
 * √((R_c + R_b)² + 4R_s²)]. Elastic stresses pass to the plateau by the parabola.
 */
export class WallBuckling {
  private readonly classical = Number.NaN;
  private readonly plateau = Number.NaN;
  private readonly compressiveYield = Number.NaN;
  private readonly torque = Number.NaN;
  private readonly thrust = Number.NaN;
  private readonly factor = Number.NaN;
  private readonly bending: ThrustedBending | null;
  private readonly a = new Span();
  private readonly b = new Span();
  private readonly c = new Span();
  private readonly s = new Span();

  constructor(
    private readonly torsion: TorsionBuckling,
    material: WallMaterial,
    loads: WallLoads,
  ) {
    const { youngsModulus, poissonRatio } = material;
    this.plateau = material.shearPlateau;
    this.compressiveYield = material.compressiveYield;
    this.torque = loads.torque;
    this.thrust = loads.thrust;
    this.factor = loads.factor;
    this.bending = loads.bending;
    this.classical = youngsModulus / Math.sqrt(3 * (1 - poissonRatio * poissonRatio));
  }

  /** Torque at which the wall buckles in pure torsion, N·m. */
  criticalTorque(at: Section): number {
    const r = at.meanRadius;
    return r * at.area * parabola(this.torsion.stress(at), this.plateau);
  }

  /** U at a point. */
  utilisation(at: Section): number {
    const shear = this.torque / this.criticalTorque(at);
    return this.thrust === 0 && this.bending === null ? shear : interaction(this.direct(at), shear);
  }

  /** U over a box. */
  bound(over: Box, out: Span): void {
    const { a, b, c, s, torque, thrust, bending } = this;
    if (torque > 0) {
      parabolaOver(a, this.torsion.stressOver(over, a), this.plateau);
      s.inverse(b.product(b.product(over.area, over.meanRadius), a), torque);
      if (thrust === 0 && bending === null) return void out.copy(s);
    }
    if (thrust > 0) this.compressionOver(over, c);
    if (bending !== null) {
      this.bendingOver(over, bending, b);
      if (thrust > 0) c.sum(c, b);
      else c.copy(b);
    }
    if (torque > 0) interactionOver(out, c, s);
    else out.copy(c);
  }

  /** R_c + R_b */
  private direct(at: Section): number {
    const { thrust, bending, compressiveYield } = this;
    const { area, thickness } = at;
    const elastic = this.classical * thickness;
    const decay = decayOf(thickness);
    let ratio = 0;
    if (thrust > 0) ratio = thrust / (area * parabola(knockdown(decay, COMPRESSION_LOSS) * elastic, compressiveYield));
    if (bending === null) return ratio;
    const stress = parabola(knockdown(decay, BENDING_LOSS) * elastic, compressiveYield);
    return ratio + (2 * this.factor * bending.moment(at)) / (area * at.meanRadius * stress);
  }

  /**
   * A·σ_cr, N, in compression or in bending, over a box. σ_cr is a function of q = tc/r alone, and A and q have the
   * slopes k and −k in D: so the force has k(1 − e), e = dln σ_cr/dln q ≥ 0, and is homogeneous of degree 2.
   */
  private forceOver({ thickness, area }: Box, loss: number, out: Span): Span {
    const { classical, compressiveYield: plateau } = this;
    const { dLo: k0, dHi: k1 } = area;
    const { a } = this;
    knockdownOver(a, thickness, loss);
    const lo = a.lo * classical * thickness.lo;
    const hi = a.hi * classical * thickness.hi;
    const e0 = slope(hi, plateau) * (1 + a.tLo / k1);
    const e1 = slope(lo, plateau) * (1 + a.tHi / k0);
    const d0 = Math.min(k0 * (1 - e1), k1 * (1 - e1));
    const d1 = Math.max(k0 * (1 - e0), k1 * (1 - e0));
    return out.homogeneous(area.lo * parabola(lo, plateau), area.hi * parabola(hi, plateau), d0, d1, 2);
  }

  private compressionOver(over: Box, out: Span): void {
    out.inverse(this.forceOver(over, COMPRESSION_LOSS, out), this.thrust);
  }

  private bendingOver(over: Box, bending: ThrustedBending, out: Span): void {
    const { a } = this;
    this.forceOver(over, BENDING_LOSS, out);
    out.inverse(out.product(out, over.meanRadius), 2 * this.factor);
    out.product(out, bending.momentOver(over, a));
  }
}
