/**
 * A positive quantity q(D, t) of the tube, enclosed over a box: its value lies in [lo, hi], and its logarithmic slopes
 * ∂ln q/∂ln D and ∂ln q/∂ln t in [dLo, dHi] and [tLo, tHi]. Over a box of no width it is the value and the gradient.
 *
 * Every limit is made of products, quotients, roots and sums of positive quantities, so in logarithms products add
 * slopes and a sum mixes them by its shares; nothing cancels. That leaves each result with less than a few hundred
 * roundings of 2⁻⁵³, which `OUTWARD` covers a thousandfold: whoever relies on an enclosure widens it by that much.
 *
 * Results are written into the span they are called on, so that the inner loop makes no objects.
 */
export class Span {
  // NaN, not 0: the fields are doubles from the start
  lo = Number.NaN;
  hi = Number.NaN;
  dLo = Number.NaN;
  dHi = Number.NaN;
  tLo = Number.NaN;
  tHi = Number.NaN;

  /** q = c·a */
  scaled(a: Span, c: number): this {
    this.lo = c * a.lo;
    this.hi = c * a.hi;
    this.dLo = a.dLo;
    this.dHi = a.dHi;
    this.tLo = a.tLo;
    this.tHi = a.tHi;
    return this;
  }

  /** q = c/a */
  inverse(a: Span, c: number): this {
    const lo = c / a.hi;
    this.hi = c / a.lo;
    this.lo = lo;
    const { dLo, tLo } = a;
    this.dLo = -a.dHi;
    this.tLo = -a.tHi;
    this.dHi = -dLo;
    this.tHi = -tLo;
    return this;
  }

  /** Another value in [lo, hi], with the slopes as they are. */
  between(lo: number, hi: number): void {
    this.lo = lo;
    this.hi = hi;
  }

  copy(a: Span): this {
    this.lo = a.lo;
    this.hi = a.hi;
    this.dLo = a.dLo;
    this.dHi = a.dHi;
    this.tLo = a.tLo;
    this.tHi = a.tHi;
    return this;
  }

  /** A value in [lo, hi] whose slope in D lies in [d0, d1] and which is homogeneous of the given degree in (D, t). */
  homogeneous(lo: number, hi: number, d0: number, d1: number, degree: number): this {
    this.lo = lo;
    this.hi = hi;
    this.dLo = d0;
    this.dHi = d1;
    this.tLo = degree - d1;
    this.tHi = degree - d0;
    return this;
  }
}

/**
 * An end of w·a + (1 − w)·b, linear in w: at w where a is the greater, else at v. So sums mix the
 * slopes of their parts: the functions here take numbers and are as short as this so that they cost no call.
 */
export function share(a: number, b: number, w: number, v: number): number {
  return b + (a - b) * (a > b ? w : v);
}

/** An end of f·a, the slope of a growing function of what has the slope a: at f where a is positive, else at g. */
export function times(a: number, f: number, g: number): number {
  return a * (a < 0 ? g : f);
}

/** What covers the rounding of an enclosure: relative for values, absolute for logarithmic slopes. */
export const OUTWARD = 1e-12;
