import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { OUTWARD, share, Span, times } from '../../../src/tube/span.js';

/** A power law c·D^m·t^n over the box D, t ∈ [1, w]: its enclosure is known exactly. */
interface Power {
  readonly c: number;
  readonly m: number;
  readonly n: number;
}

const tenths = (min: number, max: number): fc.Arbitrary<number> =>
  fc.integer({ min: min * 1000, max: max * 1000 }).map((i) => i / 1000);
const powers = fc.record({ c: tenths(0.01, 10), m: tenths(-3, 3), n: tenths(-3, 3) });
const widths = tenths(0, 3).map(Math.exp);
const shares = fc.tuple(tenths(0, 1), tenths(0, 1));

const valueOf = ({ c, m, n }: Power, D: number, t: number): number => c * D ** m * t ** n;

function spanOf({ c, m, n }: Power, w: number): Span {
  const span = new Span();
  const exponents = [m, n];
  span.lo = c * exponents.reduce((value, e) => value * (e < 0 ? w ** e : 1), 1);
  span.hi = c * exponents.reduce((value, e) => value * (e > 0 ? w ** e : 1), 1);
  span.dLo = span.dHi = m;
  span.tLo = span.tHi = n;
  return span;
}

interface Operation {
  readonly name: string;
  readonly over: (out: Span, a: Span, b: Span) => Span;
  readonly at: (a: number, b: number) => number;
}

const OPERATIONS: readonly Operation[] = [
  { name: 'scaled', over: (out, a) => out.scaled(a, 2.5), at: (a) => 2.5 * a },
  { name: 'inverse', over: (out, a) => out.inverse(a, 2.5), at: (a) => 2.5 / a },
  { name: 'copy', over: (out, a) => out.copy(a), at: (a) => a },
];

const fields = (span: Span): number[] => [span.lo, span.hi, span.dLo, span.dHi, span.tLo, span.tHi];

describe.each(OPERATIONS)('Span.$name', ({ over, at }) => {
  it('holds every value and every slope', () => {
    fc.assert(
      fc.property(powers, powers, widths, shares, shares, (a, b, w, p, q) => {
        const span = over(new Span(), spanOf(a, w), spanOf(b, w));
        const value = ([u, v]: [number, number]): number => at(valueOf(a, w ** u, w ** v), valueOf(b, w ** u, w ** v));
        expect(value(p)).toBeGreaterThanOrEqual(span.lo * (1 - OUTWARD));
        expect(value(p)).toBeLessThanOrEqual(span.hi * (1 + OUTWARD));
        const dD = (q[0] - p[0]) * Math.log(w);
        const dt = (q[1] - p[1]) * Math.log(w);
        const grown = Math.log(value(q) / value(p));
        const ends = (d: number, lo: number, hi: number): [number, number] =>
          d < 0 ? [d * hi, d * lo] : [d * lo, d * hi];
        const [d0, d1] = ends(dD, span.dLo, span.dHi);
        const [t0, t1] = ends(dt, span.tLo, span.tHi);
        expect(grown).toBeGreaterThanOrEqual(d0 + t0 - 1e-11);
        expect(grown).toBeLessThanOrEqual(d1 + t1 + 1e-11);
      }),
      { numRuns: 1000 },
    );
  });

  it('is exact over a box of no width', () => {
    fc.assert(
      fc.property(powers, powers, (a, b) => {
        const span = over(new Span(), spanOf(a, 1), spanOf(b, 1));
        expect(span.lo).toBe(span.hi);
        expect(span.lo / at(a.c, b.c)).toBeCloseTo(1, 14);
        if (a.c === b.c) return;
        expect(span.dHi - span.dLo).toBeCloseTo(0, 13);
        const step = 1e-6;
        const slope = Math.log(at(valueOf(a, 1 + step, 1), valueOf(b, 1 + step, 1)) / at(a.c, b.c)) / Math.log1p(step);
        expect(span.dLo).toBeCloseTo(slope, 4);
      }),
    );
  });

  it('gives the same when it is written over its own argument', () => {
    fc.assert(
      fc.property(powers, powers, widths, (a, b, w) => {
        const wanted = fields(over(new Span(), spanOf(a, w), spanOf(b, w)));
        const first = spanOf(a, w);
        expect(fields(over(first, first, spanOf(b, w)))).toEqual(wanted);
        const second = spanOf(b, w);
        expect(fields(over(second, spanOf(a, w), second))).toEqual(wanted);
      }),
    );
  });

  it('may take one span for both arguments', () => {
    fc.assert(
      fc.property(powers, widths, (a, w) => {
        const wanted = fields(over(new Span(), spanOf(a, w), spanOf(a, w)));
        const both = spanOf(a, w);
        expect(fields(over(both, both, both))).toEqual(wanted);
      }),
    );
  });
});

describe('Span.between', () => {
  it('takes other values and keeps the slopes', () => {
    const span = new Span().homogeneous(1, 2, -2, 3, 1);
    span.between(4, 5);
    expect(fields(span)).toEqual([4, 5, -2, 3, -2, 3]);
  });
});

describe('Span.homogeneous', () => {
  it('gives t what D leaves of the degree', () => {
    expect(fields(new Span().homogeneous(5, 6, 1, 1.25, 4))).toEqual([5, 6, 1, 1.25, 2.75, 3]);
  });
});

describe('share', () => {
  it('mixes two slopes, at one share or at the other by which is the greater', () => {
    expect(share(2, 0, 0.25, 0.75)).toBe(0.5);
    expect(share(0, 2, 0.25, 0.75)).toBe(0.5);
    expect(share(3, 3, 0.25, 0.75)).toBe(3);
  });
});

describe('times', () => {
  it('takes one factor where the slope is positive and the other where it is negative', () => {
    expect([times(2, 3, 5), times(-2, 3, 5)]).toEqual([6, -10]);
    expect(Math.abs(times(0, 3, 5))).toBe(0);
  });
});
