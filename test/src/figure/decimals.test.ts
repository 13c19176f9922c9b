import { describe, expect, it } from 'vitest';
import { fixed, sharedDecimals, sizeTexts } from '../../../src/figure/decimals.js';

describe('fixed', () => {
  it('writes a true minus, and none before what has rounded to 0', () => {
    expect(fixed(-1.25, 1)).toBe('−1.3');
    expect(fixed(-0.001, 2)).toBe('0.00');
  });
});

describe('sharedDecimals', () => {
  it.each([
    [[90, 84.8], 1, 2, 1],
    [[90, 84.85], 1, 2, 2],
    [[90, 84.856789], 1, 2, 2],
    [[], 1, 2, 1],
  ])('of %j between %d and %d is %d', (numbers, least, most, expected) => {
    expect(sharedDecimals(numbers, least, most)).toBe(expected);
  });
});

describe('sizeTexts', () => {
  it('keeps the zeros of listed sizes, and gives the whole column what one free size needs', () => {
    expect(sizeTexts([0.12, 0.0635], 'outerDiameter', 'SI')).toEqual(['120.0', '63.5']);
    expect(sizeTexts([0.12, 0.0632174], 'outerDiameter', 'SI')).toEqual(['120.00', '63.22']);
    expect(sizeTexts([0.002, 0.0018], 'wall', 'SI')).toEqual(['2.00', '1.80']);
    expect(sizeTexts([0.0017961], 'wall', 'SI')).toEqual(['1.796']);
  });

  it('shows inches to a thousandth, or to a tenth of it', () => {
    expect(sizeTexts([0.0254 * 2.5], 'outerDiameter', 'US')).toEqual(['2.500']);
    expect(sizeTexts([0.0254 * 0.065], 'wall', 'US')).toEqual(['0.065']);
    expect(sizeTexts([0.0254 * 0.08224], 'wall', 'US')).toEqual(['0.0822']);
  });
});
