import type { Span } from '../tube/span.js';

/**
 * F(e; p): the tangent (Johnson) parabola from an elastic critical stress e to a plateau p,
 * p·(1 − p/(4e)) where e ≥ p/2, else e. Smooth at the joint. Engineering basis §3; J. B. Johnson's column formula.
 *
 * @param e elastic critical stress, Pa
 * @param p plateau, Pa
 * @returns critical stress, Pa
 */
export function parabola(e: number, p: number): number {
  const z = p / (4 * e);
  return z < 0.5 ? p * (1 - z) : e;
}

/** dln F/dln e: z/(1 − z) with z = p/(4e) on the parabola, 1 below it; it falls as e grows. */
export function slope(e: number, p: number): number {
  if (e < p / 2) return 1;
  const z = p / (4 * e);
  return z / (1 - z);
}

/** F over a box, where e is enclosed by `elastic`. */
export function parabolaOver(out: Span, elastic: Span, plateau: number): Span {
  const { lo, hi } = elastic;
  out.growing(elastic, slope(hi, plateau), slope(lo, plateau));
  out.lo = parabola(lo, plateau);
  out.hi = parabola(hi, plateau);
  return out;
}
