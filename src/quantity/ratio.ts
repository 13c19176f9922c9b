/**
 * A factor kept as a quotient, so that a conversion rounds twice at most and metric prefixes divide by whole powers of
 * ten: 70 mm is 70/1000 m, the very number 0.07.
 */
export interface Ratio {
  readonly times: number;
  readonly over: number;
}

/** times/over in lowest terms where both are whole numbers; a factor with π in it stays as it is. */
export function ratio(times: number, over = 1): Ratio {
  const divisor = commonDivisor(times, over);
  return { times: times / divisor, over: over / divisor };
}

/** a·b, cancelled crosswise first so that whole numbers stay exact. */
export function product(a: Ratio, b: Ratio): Ratio {
  const left = ratio(a.times, b.over);
  const right = ratio(b.times, a.over);
  return { times: left.times * right.times, over: left.over * right.over };
}

/** a/b. */
export function quotient(a: Ratio, b: Ratio): Ratio {
  return product(a, { times: b.over, over: b.times });
}

/** a to a whole power ≥ 1. */
export function power(a: Ratio, exponent: number): Ratio {
  return exponent <= 1 ? a : product(a, power(a, exponent - 1));
}

function commonDivisor(a: number, b: number): number {
  if (!Number.isInteger(a) || !Number.isInteger(b)) return 1;
  return b === 0 ? a : commonDivisor(b, a % b);
}
