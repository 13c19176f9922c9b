import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { editDistance, nearest } from '../../../src/quantity/nearest.js';

describe('editDistance', () => {
  it.each([
    ['', '', 0],
    ['', 'abc', 3],
    ['kitten', 'sitting', 3],
    ['lenght', 'length', 1],
    ['ca', 'abc', 3],
    ['torque', 'torque', 0],
  ])('%s to %s: %i', (a, b, distance) => {
    expect(editDistance(a, b)).toBe(distance);
  });

  it('is symmetric, and 0 for equal words only', () => {
    const word = fc.string({ maxLength: 12 });
    fc.assert(
      fc.property(word, word, (a, b) => {
        expect(editDistance(a, b)).toBe(editDistance(b, a));
        expect(editDistance(a, b) === 0).toBe(a === b);
      }),
    );
  });
});

describe('nearest', () => {
  it.each([
    ['lenght', ['loads', 'length'], 'length'],
    ['outerDiametreMax', ['outerDiameterMin', 'outerDiameterMax'], 'outerDiameterMax'],
    ['AL-6061-T6', ['al-6061-t4', 'al-6061-t6'], 'al-6061-t6'],
    ['mM', ['mm', 'MM'], 'mm'],
    ['speed', ['speeds', 'spee'], 'speeds'],
  ])('%s among %j: %s', (word, known, expected) => {
    expect(nearest(word, known)).toBe(expected);
  });

  it.each([
    ['x', ['m']],
    ['', ['m']],
    ['wall', ['torque']],
    ['length', []],
    ['l'.repeat(61), ['l'.repeat(61)]],
  ])('%s among %j: nothing', (word, known) => {
    expect(nearest(word, known)).toBeNull();
  });

  it('finds a known word itself', () => {
    fc.assert(
      fc.property(fc.array(fc.string({ minLength: 1, maxLength: 20 }), { minLength: 1, maxLength: 20 }), (known) => {
        const word = known[0] ?? '';
        expect(nearest(word, known)).toBe(word);
      }),
    );
  });
});
