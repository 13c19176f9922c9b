import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import { share, Span, times } from '../tube/span.js';
import { DirectBuckling } from './direct.js';
import { interaction, interactionOver } from './interaction.js';
import { BENDING_LOSS, COMPRESSION_LOSS, decay, knockdown } from './knockdown.js';
import { parabola, slope } from './parabola.js';
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
  private readonly compressiveYield = Number.NaN;
  private readonly plateau = Number.NaN;
  private readonly torque = Number.NaN;
  private readonly thrust = Number.NaN;
  private readonly factor = Number.NaN;
  private readonly bending: ThrustedBending | null;
  private readonly compression: DirectBuckling;
  private readonly flexure: DirectBuckling;
  private readonly elastic = new Span();
  private readonly moment = new Span();
  private readonly force = new Span();
  private readonly direct = new Span();

  constructor(
    private readonly torsion: TorsionBuckling,
    material: WallMaterial,
    loads: WallLoads,
  ) {
    const { youngsModulus, poissonRatio, compressiveYield } = material;
    this.plateau = material.shearPlateau;
    this.torque = loads.torque;
    this.thrust = loads.thrust;
    this.factor = loads.factor;
    this.bending = loads.bending;
    this.compressiveYield = compressiveYield;
    this.classical = youngsModulus / Math.sqrt(3 * (1 - poissonRatio * poissonRatio));
    this.compression = new DirectBuckling(COMPRESSION_LOSS, this.classical, compressiveYield);
    this.flexure = new DirectBuckling(BENDING_LOSS, this.classical, compressiveYield);
  }

  /** Torque at which the wall buckles in pure torsion, N·m. */
  criticalTorque(at: Section): number {
    const r = at.meanRadius;
    return r * at.area * parabola(this.torsion.stress(at), this.plateau);
  }

  /** U at a point. */
  utilisation(at: Section): number {
    const shear = this.torque / this.criticalTorque(at);
    return this.thrust === 0 && this.bending === null ? shear : interaction(this.directAt(at), shear);
  }

  /** U over a box. */
  bound(over: Box, out: Span): void {
    const { direct, torque, thrust, bending } = this;
    if (torque > 0) this.shearOver(over, out);
    if (thrust === 0 && bending === null) return;
    this.directOver(over, direct);
    if (torque > 0) interactionOver(out, direct, out);
    else out.copy(direct);
  }

  /** R_c + R_b */
  private directAt(at: Section): number {
    const { thrust, bending, compressiveYield } = this;
    const elastic = this.classical * at.thickness;
    const decayed = decay.at(at).value;
    let ratio = 0;
    if (thrust > 0)
      ratio = thrust / (at.area * parabola(knockdown(decayed, COMPRESSION_LOSS) * elastic, compressiveYield));
    if (bending === null) return ratio;
    const stress = parabola(knockdown(decayed, BENDING_LOSS) * elastic, compressiveYield);
    return ratio + (2 * this.factor * bending.moment(at)) / (at.area * at.meanRadius * stress);
  }

  private directOver(over: Box, out: Span): void {
    const { thrust, bending, force } = this;
    if (bending !== null) this.bendingOver(over, bending, out);
    if (thrust === 0) return;
    this.compression.forceOver(over, force);
    if (bending === null) out.inverse(force, thrust);
    else this.addThrust(force, out);
  }

  /** Adds R_c to R_b over a box: slopes mixed by the share of R_c. */
  private addThrust(force: Span, out: Span): void {
    const { thrust } = this;
    const { lo: b0, hi: b1 } = out;
    const c0 = thrust / force.hi;
    const c1 = thrust / force.lo;
    const w0 = c0 / (c0 + b1);
    const w1 = c1 / (c1 + b0);
    out.lo = c0 + b0;
    out.hi = c1 + b1;
    out.dLo = share(-force.dHi, out.dLo, w0, w1);
    out.dHi = share(-force.dLo, out.dHi, w1, w0);
    out.tLo = share(-force.tHi, out.tLo, w0, w1);
    out.tHi = share(-force.tLo, out.tHi, w1, w0);
  }

  /** R_s over a box. */
  private shearOver(over: Box, out: Span): void {
    const { elastic, plateau, torque } = this;
    const { area, meanRadius: r } = over;
    this.torsion.stressOver(over, elastic);
    const f0 = slope(elastic.hi, plateau);
    const f1 = slope(elastic.lo, plateau);
    out.lo = torque / (area.hi * r.hi * parabola(elastic.hi, plateau));
    out.hi = torque / (area.lo * r.lo * parabola(elastic.lo, plateau));
    out.dLo = -(area.dHi + r.dHi + times(elastic.dHi, f1, f0));
    out.dHi = -(area.dLo + r.dLo + times(elastic.dLo, f0, f1));
    out.tLo = -(area.tHi + r.tHi + times(elastic.tHi, f1, f0));
    out.tHi = -(area.tLo + r.tLo + times(elastic.tLo, f0, f1));
  }

  /** R_b over a box. */
  private bendingOver(over: Box, bending: ThrustedBending, out: Span): void {
    const { moment, force } = this;
    const { meanRadius: r } = over;
    this.flexure.forceOver(over, force);
    bending.momentOver(over, moment);
    out.lo = (2 * this.factor * moment.lo) / (force.hi * r.hi);
    out.hi = (2 * this.factor * moment.hi) / (force.lo * r.lo);
    out.dLo = moment.dLo - force.dHi - r.dHi;
    out.dHi = moment.dHi - force.dLo - r.dLo;
    out.tLo = moment.tLo - force.tHi - r.tHi;
    out.tHi = moment.tHi - force.tLo - r.tLo;
  }
}
