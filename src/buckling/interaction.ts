import type { Span } from '../tube/span.js';

/**
 * Load-proportional root of c/U + (s/U)² = 1: U = ½[c + √(c² + 4s²)], the interaction of direct stress (linear) with
 * torsion (squared). For the wall R_c + R_b + R_s² = 1 (NASA SP-8007; from memory), for the shaft Greenhill's formula.
 *
 * @param c ratio that enters linearly
 * @param s ratio that enters squared
 */
export function interaction(c: number, s: number): number {
  return 0.5 * (c + Math.sqrt(c * c + 4 * s * s));
}

/** The same over a box: the shares of c and s in dln U are w and 1 − w, w = c/√(c² + 4s²). */
export function interactionOver(out: Span, c: Span, s: Span): Span {
  const w0 = c.lo / Math.sqrt(c.lo * c.lo + 4 * s.hi * s.hi);
  const w1 = c.hi / Math.sqrt(c.hi * c.hi + 4 * s.lo * s.lo);
  const lo = interaction(c.lo, s.lo);
  const hi = interaction(c.hi, s.hi);
  out.mix(c, s, w0, w1);
  out.lo = lo;
  out.hi = hi;
  return out;
}
