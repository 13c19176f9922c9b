import type { Box } from '../tube/box.js';
import { times, type Span } from '../tube/span.js';
import { decayOver, knockdown } from './knockdown.js';
import { parabola, slope } from './parabola.js';

/**
 * Critical direct stress of a round wall, in compression or in bending: the classical stress E·tc/(r√(3(1 − ν²))) as
 * far as knocked down, then the parabola to compressive yield. Engineering basis §3, NASA SP-8007.
 */
export class DirectBuckling {
  private readonly loss = Number.NaN;
  private readonly classical = Number.NaN;
  private readonly plateau = Number.NaN;

  /**
   * @param loss of the knock-down
   * @param classical E/√(3(1 − ν²)), Pa
   * @param plateau Fcy, Pa
   */
  constructor(loss: number, classical: number, plateau: number) {
    this.loss = loss;
    this.classical = classical;
    this.plateau = plateau;
  }

  /**
   * A·σ_cr, N, over a box. σ_cr is a function of q = tc/r alone, dln γ/dln q = ½c·φe^(−φ)/γ, and A and q have the slopes
   * k and −k in D: so the force has k(1 − e), e = dln σ_cr/dln q ≥ 0, and is homogeneous of degree 2.
   */
  forceOver({ thickness, area }: Box, out: Span): void {
    const { loss, classical, plateau } = this;
    decayOver.set(thickness);
    const { dLo: k0, dHi: k1 } = area;
    const g0 = knockdown(decayOver.lo, loss);
    const g1 = knockdown(decayOver.hi, loss);
    const lo = g0 * classical * thickness.lo;
    const hi = g1 * classical * thickness.hi;
    const e0 = slope(hi, plateau) * (1 + (0.5 * loss * decayOver.flattest) / g1);
    const e1 = slope(lo, plateau) * (1 + (0.5 * loss * decayOver.steepest) / g0);
    const d0 = times(1 - e1, k0, k1);
    const d1 = times(1 - e0, k1, k0);
    out.lo = area.lo * parabola(lo, plateau);
    out.hi = area.hi * parabola(hi, plateau);
    out.dLo = d0;
    out.dHi = d1;
    out.tLo = 2 - d1;
    out.tHi = 2 - d0;
  }
}
