import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { writeQuantity, writeTwist } from '../../../src/job/writeQuantity.js';
import { parseQuantity } from '../../../src/quantity/parse.js';
import { quantities, quantityNames } from '../../../src/quantity/register.js';

const value = fc.double({ min: 1e-9, max: 1e12, noNaN: true });

describe('writeQuantity', () => {
  it('gives a text that reads back to the same double, in every unit of every quantity', () => {
    const unit = fc
      .constantFrom(...quantityNames)
      .chain((name) => fc.constantFrom(...quantities[name].units.map(({ symbol }) => [name, symbol] as const)));
    fc.assert(
      fc.property(value, unit, (si, [name, symbol]) => {
        const parsed = parseQuantity(writeQuantity(si, name, symbol), name);
        expect(parsed.ok ? parsed.value : parsed.message).toBe(si);
      }),
      { numRuns: 2000 },
    );
  });

  it.each([
    [1.4, 'length', 'm', '1.4 m'],
    [0.0508, 'length', 'in', '2 in'],
    [-8000, 'force', 'kN', '-8 kN'],
    [0, 'torque', 'N·m', '0 N·m'],
    [2.41e8, 'stress', 'MPa', '241 MPa'],
  ] as const)('writes %d of %s in %s as %s', (si, quantity, unit, text) => {
    expect(writeQuantity(si, quantity, unit)).toBe(text);
  });
});

describe('writeTwist', () => {
  it('gives a text that reads back to the same double, end to end or per length', () => {
    const units = [...quantities.angle.units, ...quantities.twistRate.units].map(({ symbol }) => symbol);
    const length = fc.double({ min: 1e-3, max: 1e3, noNaN: true });
    fc.assert(
      fc.property(value, fc.constantFrom(...units), length, (twist, unit, metres) => {
        const text = writeTwist(twist, unit, metres);
        const rate = parseQuantity(text, 'twistRate');
        const angle = parseQuantity(text, 'angle');
        expect(rate.ok ? rate.value * metres : angle.ok ? angle.value : text).toBe(twist);
      }),
      { numRuns: 2000 },
    );
  });

  it('keeps a twist per length as it was entered', () => {
    const parsed = parseQuantity('1.7 deg/ft', 'twistRate');
    expect(writeTwist((parsed.ok ? parsed.value : NaN) * 1.37, 'deg/ft', 1.37)).toBe('1.7 deg/ft');
  });
});
