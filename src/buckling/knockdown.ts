import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';

/** 0.901 and 0.731: how much of the classical stress imperfections may take in compression and in bending. */
export const COMPRESSION_LOSS = 0.901;
export const BENDING_LOSS = 0.731;

/**
 * φ = (1/16)√(r/tc)
 *
 * @param thickness tc/r
 */
function phi(thickness: number): number {
  return 0.0625 / Math.sqrt(thickness);
}

/** e^(−i/32), from which `exponential` goes on by a polynomial */
const STEPS = Float64Array.from({ length: 16 * 32 + 1 }, (_, i) => Math.exp(-i / 32));

/** e^(−x) for x ≥ 0, to 5·10⁻¹⁶: the engine's own takes twice as long, and the inner loop asks for many. */
export function exponential(x: number): number {
  if (!(x < 16)) return Math.exp(-x);
  const step = (x * 32 + 0.5) | 0;
  const z = step * 0.03125 - x;
  const zz = z * z;
  // 1/3!, 1/4!, 1/5!, 1/6!
  const tail = 0.16666666666666666 + z * 0.041666666666666664 + zz * (0.008333333333333333 + z * 0.001388888888888889);
  return (STEPS[step] as number) * (1 + (z + zz * (0.5 + z * tail)));
}

/** e^(−φ) at a point. Kept for the wall last asked about: all load cases ask about one, and the exponential is dear. */
class Decay {
  value = Number.NaN;
  private thickness = Number.NaN;

  /** @param section whose tc/r counts */
  at(section: Section): this {
    if (section.thickness !== this.thickness) this.renew(section);
    return this;
  }

  private renew({ thickness }: Section): void {
    this.thickness = thickness;
    this.value = exponential(phi(thickness));
  }
}

export const decay = new Decay();

/**
 * γ = 1 − c(1 − e^(−φ)): lower bound of test results for round walls under compression (c = 0.901) or bending
 * (c = 0.731). NASA SP-8007 (1968) §4.2; from memory.
 *
 * @param decayed e^(−φ)
 */
export function knockdown(decayed: number, loss: number): number {
  return 1 - loss * (1 - decayed);
}

/** e^(−φ) and its slope over a box. Kept for the box last asked about: all load cases ask about one wall. */
class DecayOver {
  private thinnest = Number.NaN;
  private thickest = Number.NaN;
  /** e^(−φ) */
  lo = Number.NaN;
  hi = Number.NaN;
  /** φ·e^(−φ): it grows up to φ = 1, where it is 1/e, then falls */
  flattest = Number.NaN;
  steepest = Number.NaN;

  /** @param thickness tc/r */
  set(thickness: Span): void {
    const { lo: thinnest, hi: thickest } = thickness;
    if (thinnest !== this.thinnest || thickest !== this.thickest) this.renew(thickness);
  }

  private renew({ lo: thinnest, hi: thickest }: Span): void {
    this.thinnest = thinnest;
    this.thickest = thickest;
    const most = phi(thinnest);
    const least = phi(thickest);
    const lo = exponential(most);
    const hi = exponential(least);
    this.lo = lo;
    this.hi = hi;
    const h0 = least * hi;
    const h1 = most * lo;
    this.flattest = Math.min(h0, h1);
    this.steepest = least < 1 && most > 1 ? 1 / Math.E : Math.max(h0, h1);
  }
}

export const decayOver = new DecayOver();
