import { describe, expect, it } from 'vitest';
import { proofText } from '../../../renderer/pick/proof.js';

const proof = { method: 'a method', lowerBoundMass: 1, gap: 9.04e-7, evaluations: 1412 };

describe('proofText', () => {
  it.each([
    [9.04e-7, 'Proved lightest of this material to within 0.90 parts per million: a method, 1 412 evaluations.'],
    [
      1e-13,
      'Proved lightest of this material to within less than 0.001 parts per million: a method, 1 412 evaluations.',
    ],
    [0.021, 'Proved lightest of this material to within 2.1 %: a method, 1 412 evaluations.'],
    [0, 'Lightest of this material: a method, 1 412 evaluations.'],
  ])('says a gap of %d as %j', (gap, expected) => {
    expect(proofText({ ...proof, gap })).toBe(expected);
  });
});
