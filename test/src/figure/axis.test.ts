import { describe, expect, it } from 'vitest';
import { linearAxis, logAxis, roundStep, stepDecimals } from '../../../src/figure/axis.js';

const texts = (axis: { ticks: readonly { text: string }[] }): string[] => axis.ticks.map(({ text }) => text);

describe('a round step', () => {
  it('is the next 1, 2 or 5 times a power of ten', () => {
    expect([0.9, 1, 1.01, 2, 2.1, 5, 5.1, 0.013, 470].map(roundStep)).toEqual([1, 1, 2, 2, 5, 5, 10, 0.02, 500]);
  });

  it('has as many decimals as it needs', () => {
    expect([10, 2, 0.5, 0.02].map(stepDecimals)).toEqual([0, 0, 1, 2]);
  });
});

describe('a linear axis', () => {
  it('runs between half steps that hold what it is for', () => {
    const axis = linearAxis(0.0405, 0.1056, 1e-3, 9);
    expect(axis.lo).toBeCloseTo(0.04, 12);
    expect(axis.hi).toBeCloseTo(0.11, 12);
    expect(texts(axis)).toEqual(['40', '50', '60', '70', '80', '90', '100', '110']);
  });

  it('says no nought, and shares decimals', () => {
    expect(texts(linearAxis(0, 0.0024, 1e-3, 9))).toEqual(['0.5', '1.0', '1.5', '2.0', '2.5']);
  });
});

describe('a logarithmic axis', () => {
  it('has marks enough, and marks at its ends', () => {
    const axis = logAxis(0.042, 0.118, 1e-3);
    expect(axis.lo).toBeCloseTo(0.04, 12);
    expect(axis.hi).toBeCloseTo(0.15, 12);
    expect(axis.ticks.length).toBeGreaterThan(5);
    expect(texts(axis)[0]).toBe('40');
    expect(texts(logAxis(0.0004, 0.03, 1e-3))).toEqual(['0.2', '0.5', '1', '2', '5', '10', '20', '50']);
  });
});
