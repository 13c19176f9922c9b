import { expect, it } from 'vitest';
import { readMetal } from '../../../src/material/metal.js';
import { DENSITY, GAUGE, METAL_KEYS, MODULUS, STRENGTH } from '../../../src/material/metalKeys.js';
import { SAMPLE } from './sample.js';

it('lists each key of a metal once', () => {
  const result = readMetal(SAMPLE, '');
  expect(result.ok && Object.keys(result.metal).sort()).toEqual(Array.from(METAL_KEYS).sort());
});

it.each([
  [DENSITY, 100, 30_000],
  [MODULUS, 0.1e9, 2e12],
  [STRENGTH, 1e6, 10e9],
  [GAUGE, 1e-6, 1],
])('has its ranges in SI units: $expected', ({ range }, atLeast, atMost) => {
  expect(range).toEqual({ atLeast, atMost });
});
