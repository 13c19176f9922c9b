import { describe, expect, it } from 'vitest';
import { power, product, quotient, ratio } from '../../../src/quantity/ratio.js';

describe('ratio', () => {
  it('is kept in lowest terms', () => {
    expect(ratio(254, 10_000)).toEqual({ times: 127, over: 5000 });
  });

  it('leaves a factor with π alone', () => {
    expect(ratio(Math.PI, 180)).toEqual({ times: Math.PI, over: 180 });
  });

  it('cancels crosswise, so that whole numbers stay exact', () => {
    const force = ratio(8_896_443_230_521, 2e12);
    expect(product(force, ratio(381, 1250))).toEqual({ times: 3_389_544_870_828_501, over: 2.5e15 });
    expect(product(ratio(9_007_199_254_740_991, 7), ratio(7, 9_007_199_254_740_991))).toEqual({ times: 1, over: 1 });
  });

  it('divides and raises', () => {
    expect(quotient(ratio(1, 3), ratio(2, 3))).toEqual({ times: 1, over: 2 });
    expect(power(ratio(127, 5000), 2)).toEqual({ times: 16_129, over: 25_000_000 });
  });
});
