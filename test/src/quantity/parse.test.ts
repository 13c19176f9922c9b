import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expected, parseOneOf, parseQuantity, TEXT_MAX } from '../../../src/quantity/parse.js';
import { quantityNames, type QuantityName } from '../../../src/quantity/register.js';

const FORMS: readonly (readonly [string, QuantityName, number, string])[] = [
  ['900 N·m', 'torque', 900, 'N·m'],
  ['900N·m', 'torque', 900, 'N·m'],
  ['900 N*m', 'torque', 900, 'N·m'],
  ['900 N.m', 'torque', 900, 'N·m'],
  ['900 N-m', 'torque', 900, 'N·m'],
  ['900 N m', 'torque', 900, 'N·m'],
  ['900 Nm', 'torque', 900, 'N·m'],
  ['900 m·N', 'torque', 900, 'N·m'],
  ['  900\tN·m\n', 'torque', 900, 'N·m'],
  ['9e2 N·m', 'torque', 900, 'N·m'],
  ['+900.0 N·m', 'torque', 900, 'N·m'],
  ['\u2212900 N·m', 'torque', -900, 'N·m'],
  ['-9E+2 N·m', 'torque', -900, 'N·m'],
  ['0.9 kNm', 'torque', 900, 'kN·m'],
  ['0.9 kN-m', 'torque', 900, 'kN·m'],
  ['900000 Nmm', 'torque', 900, 'N·mm'],
  ['0.5 MN·m', 'torque', 500_000, 'MN·m'],
  ['1 lbf·ft', 'torque', 1.3558179483314004, 'lbf·ft'],
  ['1 ft·lb', 'torque', 1.3558179483314004, 'lbf·ft'],
  ['1 lb·ft', 'torque', 1.3558179483314004, 'lbf·ft'],
  ['1 ft-lb', 'torque', 1.3558179483314004, 'lbf·ft'],
  ['1 ft-lbs', 'torque', 1.3558179483314004, 'lbf·ft'],
  ['1 in-lb', 'torque', 0.1129848290276167, 'lbf·in'],
  ['1 lbf in.', 'torque', 0.1129848290276167, 'lbf·in'],
  ['2 kgf·m', 'torque', 19.6133, 'kgf·m'],
  ['0 N·m', 'torque', 0, 'N·m'],
  ['-0 N·m', 'torque', 0, 'N·m'],
  ['1.40 m', 'length', 1.4, 'm'],
  ['70 mm', 'length', 0.07, 'mm'],
  ['0.9 mm', 'length', 0.0009, 'mm'],
  ['7 cm', 'length', 0.07, 'cm'],
  ['2.5"', 'length', 0.0635, 'in'],
  ['2.5 inches', 'length', 0.0635, 'in'],
  ["5'", 'length', 1.524, 'ft'],
  ['5 feet', 'length', 1.524, 'ft'],
  ['65 mil', 'length', 0.001651, 'thou'],
  ['50 um', 'length', 0.00005, 'µm'],
  ['180°', 'angle', Math.PI, 'deg'],
  ['180 degrees', 'angle', Math.PI, 'deg'],
  ['0.5 turn', 'angle', Math.PI, 'rev'],
  ['10800 arcmin', 'angle', Math.PI, 'arcmin'],
  ['35 mrad', 'angle', 0.035, 'mrad'],
  ['180 deg/m', 'twistRate', Math.PI, 'deg/m'],
  ['180 degrees per metre', 'twistRate', Math.PI, 'deg/m'],
  ['3 rad/mm', 'twistRate', 3000, 'rad/mm'],
  ['250 MPa', 'stress', 2.5e8, 'MPa'],
  ['250 N/mm²', 'stress', 2.5e8, 'N/mm²'],
  ['250 N/mm^2', 'stress', 2.5e8, 'N/mm²'],
  ['250 N/mm2', 'stress', 2.5e8, 'N/mm²'],
  ['250 N·mm-2', 'stress', 2.5e8, 'N/mm²'],
  ['3 bar', 'stress', 3e5, 'bar'],
  ['0bar', 'stress', 0, 'bar'],
  ['2710 kg/m3', 'density', 2710, 'kg/m³'],
  ['2.71 g/cc', 'density', 2710, 'g/cm³'],
  ['60 rpm', 'rotationalSpeed', 2 * Math.PI, 'rpm'],
  ['60 1/min', 'rotationalSpeed', 2 * Math.PI, 'rpm'],
  ['60 r/min', 'rotationalSpeed', 2 * Math.PI, 'rpm'],
  ['60 rev / min', 'rotationalSpeed', 2 * Math.PI, 'rpm'],
  ['1 Hz', 'rotationalSpeed', 2 * Math.PI, 'Hz'],
  ['1 rev/s', 'rotationalSpeed', 2 * Math.PI, 'Hz'],
  ['18.4 kN·m/rad', 'torsionalStiffness', 18_400, 'kN·m/rad'],
  ['22 N·m', 'energy', 22, 'J'],
];

const TORQUE = 'expected a torque such as "900 N·m"';
const LENGTH = 'expected a length such as "1.4 m"';
const STRESS = 'expected a stress or modulus such as "240 MPa"';

const REFUSALS: readonly (readonly [unknown, QuantityName, string])[] = [
  ['900 mm', 'torque', `"900 mm" is a length; ${TORQUE}`],
  ['900 N', 'torque', `"900 N" is a force; ${TORQUE}`],
  ['22 J', 'torque', `"22 J" is an energy; ${TORQUE}`],
  ['5 ft-lb', 'length', `"5 ft-lb" is a torque; ${LENGTH}`],
  ['5 lb', 'force', '"5 lb" is a mass; expected a force such as "2500 N"'],
  ['2 deg/m', 'angle', '"2 deg/m" is a twist per length; expected an angle such as "3 deg"'],
  ['900', 'torque', `"900" has no unit; ${TORQUE}`],
  [900, 'torque', `900 has no unit; ${TORQUE}`],
  [NaN, 'torque', `NaN has no unit; ${TORQUE}`],
  [null, 'torque', `null is not a number with a unit; ${TORQUE}`],
  [undefined, 'torque', `nothing is not a number with a unit; ${TORQUE}`],
  [true, 'torque', `true is not a number with a unit; ${TORQUE}`],
  [['900 N·m'], 'torque', `a list is not a number with a unit; ${TORQUE}`],
  [{ torque: 1 }, 'torque', `an object is not a number with a unit; ${TORQUE}`],
  ['', 'torque', `"" is empty; ${TORQUE}`],
  [' ', 'torque', `" " is empty; ${TORQUE}`],
  ['N·m', 'torque', `"N·m" does not begin with a number; ${TORQUE}`],
  ['NaN N·m', 'torque', `"NaN N·m" does not begin with a number; ${TORQUE}`],
  ['-Infinity m', 'length', `"-Infinity m" does not begin with a number; ${LENGTH}`],
  ['--5 m', 'length', `"--5 m" does not begin with a number; ${LENGTH}`],
  ['±5 m', 'length', `"±5 m" does not begin with a number; ${LENGTH}`],
  ['\u0665 m', 'length', `"\u0665 m" does not begin with a number; ${LENGTH}`],
  ['0x10 m', 'length', `"0x10 m" is not in decimal notation; ${LENGTH}`],
  ['0b1 m', 'length', `"0b1 m" is not in decimal notation; ${LENGTH}`],
  ['1,4 m', 'length', `"1,4 m" has a decimal comma: use a point; ${LENGTH}`],
  [
    '1,400 m',
    'length',
    `"1,400 m" has a comma in its number: use a point for decimals and no thousands separators; ${LENGTH}`,
  ],
  ['4, m', 'length', `"4, m" has a comma after its number; ${LENGTH}`],
  ['1 400 m', 'length', `"1 400 m" has a thousands separator: write the figures together; ${LENGTH}`],
  ["1'400 m", 'length', `"1'400 m" has a thousands separator: write the figures together; ${LENGTH}`],
  ['1_400 m', 'length', `"1_400 m" has a thousands separator: write the figures together; ${LENGTH}`],
  ['1.4.5 m', 'length', `"1.4.5 m" is not one decimal number with one unit; ${LENGTH}`],
  ['1/2 in', 'length', `"1/2 in" is not one decimal number with one unit; ${LENGTH}`],
  ['1 1/2 in', 'length', `"1 1/2 in" is not one decimal number with one unit; ${LENGTH}`],
  ['5\'3"', 'length', `"5'3"" is not one decimal number with one unit; ${LENGTH}`],
  ['1e400 m', 'length', `"1e400 m" is too large a number; ${LENGTH}`],
  ['1e308 km', 'length', `"1e308 km" is too large a number; ${LENGTH}`],
  ['1e-400 m', 'length', `"1e-400 m" is too small a number to be told from 0; ${LENGTH}`],
  ['5e-324 mm', 'length', `"5e-324 mm" is too small a number to be told from 0; ${LENGTH}`],
  ['241 mpa', 'stress', `"241 mpa" has an unknown unit (did you mean "MPa"?); ${STRESS}`],
  ['241 mPa', 'stress', `"241 mPa" has an unknown unit (did you mean "MPa"?); ${STRESS}`],
  ['241 KPA', 'stress', `"241 KPA" has an unknown unit (did you mean "kPa"?); ${STRESS}`],
  ['5 Mm', 'length', `"5 Mm" has an unknown unit (did you mean "mm"?); ${LENGTH}`],
  ['900 NM', 'torque', `"900 NM" has an unknown unit (did you mean "N·m"?); ${TORQUE}`],
  ['900 mN·m', 'torque', `"900 mN·m" has an unknown unit (did you mean "MN·m"?); ${TORQUE}`],
  ['900 N·m²', 'torque', `"900 N·m²" has an unknown unit (did you mean "N·m"?); ${TORQUE}`],
  ['5 metrs', 'length', `"5 metrs" has an unknown unit (did you mean "m"?); ${LENGTH}`],
  ['5 N/mm·mm', 'torque', `"5 N/mm·mm" has an unknown unit; ${TORQUE}`],
  ['5 furlongs', 'length', `"5 furlongs" has an unknown unit; ${LENGTH}`],
  ['5 __proto__', 'length', `"5 __proto__" has an unknown unit; ${LENGTH}`],
  ['5 \u0000\u202em', 'length', `"5 \\u{0}\\u{202e}m" has an unknown unit; ${LENGTH}`],
  ['7'.repeat(101), 'length', `"${'7'.repeat(59)}…" is longer than 100 characters; ${LENGTH}`],
];

describe('parseQuantity', () => {
  it.each(FORMS)('reads "%s" as %s', (text, quantity, value, unit) => {
    const parsed = parseQuantity(text, quantity);
    if (!parsed.ok) throw new Error(parsed.message);
    expect(parsed.unit).toBe(unit);
    expect(Object.is(parsed.value, -0)).toBe(false);
    expect(Math.abs(parsed.value - value)).toBeLessThanOrEqual(2.3e-16 * Math.abs(value));
  });

  it.each(REFUSALS)('refuses %j as %s', (value, quantity, message) => {
    expect(parseQuantity(value, quantity)).toEqual({ ok: false, message });
  });

  it('never throws, whatever the text, and answers in the one form', () => {
    const text = fc.oneof(
      fc.string({ unit: 'binary', maxLength: 150 }),
      fc.string({ unit: fc.constantFrom(...Array.from('0123456789.,-+eE/·*^ ²³mNPaklbft\'"°')), maxLength: 110 }),
      fc.tuple(fc.double(), fc.string({ unit: 'grapheme', maxLength: 20 })).map(([n, s]) => `${n} ${s}`),
    );
    fc.assert(
      fc.property(text, fc.constantFrom(...quantityNames), (value, quantity) => {
        const parsed = parseQuantity(value, quantity);
        if (parsed.ok) expect(Number.isFinite(parsed.value)).toBe(true);
        else expect(parsed.message.endsWith(`; expected ${expected([quantity])}`)).toBe(true);
      }),
      { numRuns: 2000 },
    );
  });

  it('never throws, whatever the value', () => {
    fc.assert(
      fc.property(fc.anything(), (value) => {
        expect(typeof parseQuantity(value, 'length').ok).toBe('boolean');
      }),
    );
  });

  it('refuses a huge text at once', () => {
    const huge = `${'1 '.repeat(10_000_000)}m`;
    const start = performance.now();
    expect(parseQuantity(huge, 'length').ok).toBe(false);
    expect(performance.now() - start).toBeLessThan(500);
  });

  it.each([' ', '1', '1 ', '- ', '. ', '·', '^', "'", '1e', 'm·', 'a', '\u00a0'])(
    'takes no long time over the longest text of "%s"',
    (piece) => {
      const tail = piece.repeat(TEXT_MAX).slice(0, TEXT_MAX - 2);
      const start = performance.now();
      for (let time = 0; time < 200; time += 1) parseQuantity(`1${tail}!`, 'twistRate');
      expect((performance.now() - start) / 200).toBeLessThan(5);
    },
  );
});

describe('parseOneOf', () => {
  const wanted = ['angle', 'twistRate'] as const;

  it('says which quantity it was', () => {
    expect(parseOneOf('35 mrad', wanted)).toEqual({ ok: true, quantity: 'angle', value: 0.035, unit: 'mrad' });
    expect(parseOneOf('35 mrad/m', wanted)).toEqual({ ok: true, quantity: 'twistRate', value: 0.035, unit: 'mrad/m' });
  });

  it('names all that would have done', () => {
    expect(parseOneOf('3 m', wanted)).toEqual({
      ok: false,
      message: '"3 m" is a length; expected an angle such as "3 deg" or a twist per length such as "2 deg/m"',
    });
  });
});
