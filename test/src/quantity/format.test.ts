import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { QuantityError } from '../../../src/quantity/error.js';
import { formatQuantity, inUnit, roundedDown, roundedUp } from '../../../src/quantity/format.js';
import { parseQuantity } from '../../../src/quantity/parse.js';
import { quantities, quantityNames, type QuantityName } from '../../../src/quantity/register.js';

const PAIRS = quantityNames.flatMap((quantity) =>
  quantities[quantity].units.map((unit) => ({ quantity, unit: unit.symbol })),
);
const pair = fc.constantFrom(...PAIRS);
const size = fc
  .tuple(fc.double({ min: 1, max: 10, noNaN: true }), fc.integer({ min: -30, max: 30 }), fc.constantFrom(1, -1))
  .map(([mantissa, exponent, sign]) => sign * mantissa * 10 ** exponent);

function read(text: string, quantity: QuantityName): number {
  const parsed = parseQuantity(text, quantity);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
}

describe('formatQuantity', () => {
  it.each([
    [900, 'torque', 'N·m', {}, '900 N·m'],
    [900, 'torque', 'N·m', { significant: 4 }, '900 N·m'],
    [-900, 'torque', 'lbf·in', { significant: 4 }, '−7966 lbf·in'],
    [-900, 'torque', 'lbf·in', { decimals: 1 }, '−7965.7 lbf·in'],
    [0.0009, 'length', 'mm', {}, '0.9 mm'],
    [0.0635, 'length', 'in', {}, '2.5 in'],
    [1.4, 'length', 'm', { decimals: 2 }, '1.40 m'],
    [Math.PI / 60, 'angle', 'deg', {}, '3 deg'],
    [Math.PI / 60, 'angle', '°', { significant: 3 }, '3 deg'],
    [123456, 'force', 'N', { significant: 3 }, '123000 N'],
    [-0.00001, 'length', 'mm', { decimals: 1 }, '0.0 mm'],
    [-0, 'length', 'mm', {}, '0 mm'],
    [1e-12, 'length', 'm', {}, '1e−12 m'],
  ] as const)('%d as %s in %s with %j: %s', (value, quantity, unit, figures, text) => {
    expect(formatQuantity(value, quantity, unit, figures)).toBe(text);
  });

  it('reads back to the value within two places of the last binary digit', () => {
    fc.assert(
      fc.property(pair, size, ({ quantity, unit }, value) => {
        const near = 2 * Number.EPSILON * Math.abs(value);
        expect(Math.abs(read(formatQuantity(value, quantity, unit), quantity) - value)).toBeLessThanOrEqual(near);
        const full = formatQuantity(value, quantity, unit, { significant: 17 });
        expect(Math.abs(read(full, quantity) - value)).toBeLessThanOrEqual(near);
      }),
      { numRuns: 2000 },
    );
  });

  it('gives back the figures that were entered', () => {
    const entered = fc.tuple(pair, fc.integer({ min: 1, max: 999_999_999 }), fc.integer({ min: -6, max: 0 }));
    fc.assert(
      fc.property(entered, ([{ quantity, unit }, figures, exponent]) => {
        const text = `${Number(`${figures}e${exponent}`)} ${unit}`;
        const again = formatQuantity(read(text, quantity), quantity, unit);
        expect(read(again, quantity)).toBe(read(text, quantity));
        expect(again.replaceAll('−', '-')).toBe(text);
      }),
      { numRuns: 2000 },
    );
  });

  it.each([
    [() => formatQuantity(1, 'length', 'N'), 'unknown-unit', '"N" is no unit of a length.'],
    [() => formatQuantity(NaN, 'length', 'm'), 'not-finite', 'NaN cannot be shown in m.'],
    [() => formatQuantity(1e308, 'length', 'mm'), 'not-finite', '1e+308 cannot be shown in mm.'],
    [
      () => formatQuantity(1, 'length', 'm', { significant: 0 }),
      'bad-digits',
      '0 figures were asked for; 1 to 17 can be given.',
    ],
    [() => roundedUp(1, 'length', 'm', 16), 'bad-digits', '16 figures were asked for; 1 to 15 can be given.'],
    [
      () => roundedUp(Number.MAX_VALUE, 'length', 'm', 2),
      'not-finite',
      `${Number.MAX_VALUE} has no neighbour to be shown in m.`,
    ],
  ])('tells a caller of its mistake (%#)', (call, code, message) => {
    try {
      call();
    } catch (error) {
      expect(error).toBeInstanceOf(QuantityError);
      expect(error).toMatchObject({ code, message });
      return;
    }
    throw new Error('nothing was thrown');
  });
});

describe('inUnit', () => {
  it('gives the number of units', () => {
    expect(inUnit(0.0635, 'length', 'in')).toBe(2.5);
    expect(inUnit(Math.PI, 'angle', 'deg')).toBe(180);
  });
});

describe('roundedUp and roundedDown', () => {
  it.each([
    [0.09787, 3, '97.9 mm', '97.8 mm'],
    [0.0979, 3, '97.9 mm', '97.9 mm'],
    [-0.09787, 3, '−97.8 mm', '−97.9 mm'],
    [0.0999999, 3, '100 mm', '99.9 mm'],
    [0.1, 3, '100 mm', '100 mm'],
    [0.0012, 1, '2 mm', '1 mm'],
    [0, 3, '0 mm', '0 mm'],
  ])('%d m to %i figures: %s, %s', (value, significant, up, down) => {
    expect(roundedUp(value, 'length', 'mm', significant).text).toBe(up);
    expect(roundedDown(value, 'length', 'mm', significant).text).toBe(down);
  });

  it('lie on the stated side as they are read, and less than one step away', () => {
    fc.assert(
      fc.property(pair, size, fc.integer({ min: 1, max: 15 }), ({ quantity, unit }, value, significant) => {
        const up = roundedUp(value, quantity, unit, significant);
        const down = roundedDown(value, quantity, unit, significant);
        expect(read(up.text, quantity)).toBe(up.value);
        expect(read(down.text, quantity)).toBe(down.value);
        expect(up.value).toBeGreaterThanOrEqual(value);
        expect(down.value).toBeLessThanOrEqual(value);
        const step = Math.abs(value) * (10 ** (1 - significant) + 8 * Number.EPSILON);
        expect(up.value - value).toBeLessThanOrEqual(step);
        expect(value - down.value).toBeLessThanOrEqual(step);
      }),
      { numRuns: 3000 },
    );
  });

  it('leave a value alone that has few enough figures', () => {
    fc.assert(
      fc.property(pair, fc.integer({ min: 1, max: 9999 }), ({ quantity, unit }, figures) => {
        const value = read(`${figures} ${unit}`, quantity);
        expect(roundedUp(value, quantity, unit, 4).text).toBe(`${figures} ${unit}`);
        expect(roundedDown(value, quantity, unit, 4).text).toBe(`${figures} ${unit}`);
      }),
    );
  });
});
