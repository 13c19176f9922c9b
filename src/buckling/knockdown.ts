import { Span } from '../tube/span.js';

/** 0.901 and 0.731: how much of the classical stress imperfections may take in compression and in bending. */
export const COMPRESSION_LOSS = 0.901;
export const BENDING_LOSS = 0.731;

/** The last e^(−x): several checks ask about one wall, and the exponential is dear. */
class Decay {
  private x = Number.NaN;
  private value = Number.NaN;

  at(x: number): number {
    if (x === this.x) return this.value;
    this.x = x;
    return (this.value = Math.exp(-x));
  }
}

const decay = new Decay();
const decayLo = new Decay();
const decayHi = new Decay();

/**
 * e^(−φ), φ = (1/16)√(r/tc)
 *
 * @param thickness tc/r
 */
export function decayOf(thickness: number): number {
  return decay.at(0.0625 / Math.sqrt(thickness));
}

/**
 * γ = 1 − c(1 − e^(−φ)): lower bound of test results for round walls under compression (c = 0.901) or bending
 * (c = 0.731). NASA SP-8007 (1968) §4.2; from memory.
 *
 * @param decayed e^(−φ)
 */
export function knockdown(decayed: number, loss: number): number {
  return 1 - loss * (1 - decayed);
}

const phi = new Span();
const MOST = Math.exp(-1);

/** γ over a box, where tc/r is enclosed by `thickness`; φ·e^(−φ), its slope in φ, grows up to φ = 1, then falls. */
export function knockdownOver(out: Span, thickness: Span, loss: number): Span {
  phi.inverse(phi.root(thickness), 1 / 16);
  const p0 = phi.lo;
  const p1 = phi.hi;
  const e0 = decayLo.at(p0);
  const e1 = decayHi.at(p1);
  const h0 = p0 * e0;
  const h1 = p1 * e1;
  const top = p0 < 1 && p1 > 1 ? MOST : Math.max(h0, h1);
  const hi = 1 - loss * (1 - e0);
  const lo = 1 - loss * (1 - e1);
  out.chain(phi, (-loss * top) / lo, (-loss * Math.min(h0, h1)) / hi);
  out.lo = lo;
  out.hi = hi;
  return out;
}
