import { share, type Span } from '../tube/span.js';

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
  const { lo: c0, hi: c1 } = c;
  const { lo: s0, hi: s1 } = s;
  const w0 = c0 / Math.sqrt(c0 * c0 + 4 * s1 * s1);
  const w1 = c1 / Math.sqrt(c1 * c1 + 4 * s0 * s0);
  const dLo = share(c.dLo, s.dLo, w0, w1);
  const dHi = share(c.dHi, s.dHi, w1, w0);
  const tLo = share(c.tLo, s.tLo, w0, w1);
  const tHi = share(c.tHi, s.tHi, w1, w0);
  out.lo = 0.5 * (c0 + Math.sqrt(c0 * c0 + 4 * s0 * s0));
  out.hi = 0.5 * (c1 + Math.sqrt(c1 * c1 + 4 * s1 * s1));
  out.dLo = dLo;
  out.dHi = dHi;
  out.tLo = tLo;
  out.tHi = tHi;
  return out;
}
