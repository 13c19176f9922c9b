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
  const z = p / (4 * e);
  return z < 0.5 ? z / (1 - z) : 1;
}
