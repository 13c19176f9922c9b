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
    return this.slopesOf(a);
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

  /** q = a·b */
  product(a: Span, b: Span): this {
    this.lo = a.lo * b.lo;
    this.hi = a.hi * b.hi;
    this.dLo = a.dLo + b.dLo;
    this.dHi = a.dHi + b.dHi;
    this.tLo = a.tLo + b.tLo;
    this.tHi = a.tHi + b.tHi;
    return this;
  }

  /** q = √a */
  root(a: Span): this {
    this.lo = Math.sqrt(a.lo);
    this.hi = Math.sqrt(a.hi);
    this.dLo = 0.5 * a.dLo;
    this.dHi = 0.5 * a.dHi;
    this.tLo = 0.5 * a.tLo;
    this.tHi = 0.5 * a.tHi;
    return this;
  }

  /** q = a + b: slopes mixed by a's share of the sum */
  sum(a: Span, b: Span): this {
    this.mix(a, b, a.lo / (a.lo + b.hi), a.hi / (a.hi + b.lo));
    this.lo = a.lo + b.lo;
    this.hi = a.hi + b.hi;
    return this;
  }

  /** q = √(a² + b²) */
  hypotenuse(a: Span, b: Span): this {
    const aLo = a.lo * a.lo;
    const aHi = a.hi * a.hi;
    const bLo = b.lo * b.lo;
    const bHi = b.hi * b.hi;
    this.mix(a, b, aLo / (aLo + bHi), aHi / (aHi + bLo));
    this.lo = Math.sqrt(aLo + bLo);
    this.hi = Math.sqrt(aHi + bHi);
    return this;
  }

  /** q = max(a, b) */
  greater(a: Span, b: Span): this {
    if (a.lo >= b.hi) return this.copy(a);
    if (b.lo >= a.hi) return this.copy(b);
    this.lo = Math.max(a.lo, b.lo);
    this.hi = Math.max(a.hi, b.hi);
    this.dLo = Math.min(a.dLo, b.dLo);
    this.dHi = Math.max(a.dHi, b.dHi);
    this.tLo = Math.min(a.tLo, b.tLo);
    this.tHi = Math.max(a.tHi, b.tHi);
    return this;
  }

  copy(a: Span): this {
    this.lo = a.lo;
    this.hi = a.hi;
    return this.slopesOf(a);
  }

  /** Slopes of w·ln a + (1 − w)·ln b for a share w in [w0, w1]; the value is the caller's to set. */
  mix(a: Span, b: Span, w0: number, w1: number): this {
    // each end is linear in w, so it lies at w0 or at w1
    const dLo = b.dLo + (a.dLo - b.dLo) * (a.dLo > b.dLo ? w0 : w1);
    const dHi = b.dHi + (a.dHi - b.dHi) * (a.dHi > b.dHi ? w1 : w0);
    const tLo = b.tLo + (a.tLo - b.tLo) * (a.tLo > b.tLo ? w0 : w1);
    const tHi = b.tHi + (a.tHi - b.tHi) * (a.tHi > b.tHi ? w1 : w0);
    this.dLo = dLo;
    this.dHi = dHi;
    this.tLo = tLo;
    this.tHi = tHi;
    return this;
  }

  /** Slopes of a growing function of a alone, 0 ≤ f0 ≤ dln q/dln a ≤ f1; the value is the caller's to set. */
  growing(a: Span, f0: number, f1: number): this {
    const { dLo, dHi, tLo, tHi } = a;
    this.dLo = dLo * (dLo < 0 ? f1 : f0);
    this.dHi = dHi * (dHi < 0 ? f0 : f1);
    this.tLo = tLo * (tLo < 0 ? f1 : f0);
    this.tHi = tHi * (tHi < 0 ? f0 : f1);
    return this;
  }

  /** Slopes of a function of a alone, dln q/dln a in [f0, f1] of either sign; the value is the caller's to set. */
  chain(a: Span, f0: number, f1: number): this {
    const { dLo, dHi, tLo, tHi } = a;
    this.dLo = Math.min(f0 * dLo, f1 * dLo, f0 * dHi, f1 * dHi);
    this.dHi = Math.max(f0 * dLo, f1 * dLo, f0 * dHi, f1 * dHi);
    this.tLo = Math.min(f0 * tLo, f1 * tLo, f0 * tHi, f1 * tHi);
    this.tHi = Math.max(f0 * tLo, f1 * tLo, f0 * tHi, f1 * tHi);
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

  private slopesOf(a: Span): this {
    this.dLo = a.dLo;
    this.dHi = a.dHi;
    this.tLo = a.tLo;
    this.tHi = a.tHi;
    return this;
  }
}

/** What covers the rounding of an enclosure: relative for values, absolute for logarithmic slopes. */
export const OUTWARD = 1e-12;
