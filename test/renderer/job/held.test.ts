import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { heldEntry, heldName, roundedSizes } from '../../../renderer/job/held.js';
import { parseQuantity } from '../../../src/quantity/parse.js';

const SIZE = { outerDiameter: 0.0848172345, wall: 0.00175261 };

describe('a tube taken in hand', () => {
  it('has few figures: the wall goes up, the diameter to the nearer side first', () => {
    const sizes = roundedSizes(SIZE, 'SI').flatMap(({ outerDiameter, wall }) => [outerDiameter, wall]);
    for (const [index, size] of [0.084817, 0.001753, 0.084818, 0.001753].entries())
      expect(sizes[index]).toBeCloseTo(size, 12);
    expect(sizes).toHaveLength(4);
  });

  it('keeps its bore', () => {
    expect(roundedSizes({ outerDiameter: 0.01, wall: 0.00499999 }, 'SI')).toEqual([]);
  });

  it('bears a name that no other has', () => {
    expect(heldName(SIZE, [], 'SI')).toBe('84.82 × 1.753');
    const held = [{ name: '84.82 × 1.753' }, { name: '84.82 × 1.753 (2)' }, null];
    expect(heldName(SIZE, held, 'SI')).toBe('84.82 × 1.753 (3)');
    expect(heldName(SIZE, [], 'US')).toBe('3.3393 × 0.0690');
  });

  it('is written so that it reads back to the same size', () => {
    const length = fc.double({ min: 1e-4, max: 1, noNaN: true });
    fc.assert(
      fc.property(length, fc.constantFrom('SI' as const, 'US' as const), (outerDiameter, system) => {
        const entry = heldEntry('own', 'al', { outerDiameter, wall: outerDiameter / 7 }, system);
        const read = parseQuantity(String(entry['outerDiameter']), 'length');
        expect(read.ok ? read.value : NaN).toBeCloseTo(outerDiameter, 14);
      }),
    );
  });
});
