import { describe, expect, it } from 'vitest';
import { isUnitOf, shownText, stepped, valueOf } from '../../../renderer/field/kind.js';
import { quantities, quantityNames } from '../../../src/quantity/register.js';

describe('isUnitOf', () => {
  it('knows where the units that views show are at home', () => {
    for (const name of quantityNames) {
      const { SI, US } = quantities[name].shown;
      expect(isUnitOf(SI, 'SI'), SI).toBe(true);
      expect(isUnitOf(US, 'US'), US).toBe(true);
      if (SI !== US) expect(isUnitOf(SI, 'US') || isUnitOf(US, 'SI'), name).toBe(false);
    }
  });

  it.each(['in', 'ft', 'thou', 'lbf·in', 'lbf·ft', 'kip·in', 'lbf', 'kip', 'psi', 'ksi', 'Msi', 'lb/in³', 'deg/ft'])(
    'has %s for a US unit',
    (unit) => {
      expect(isUnitOf(unit, 'US')).toBe(true);
      expect(isUnitOf(unit, 'SI')).toBe(false);
    },
  );

  it.each(['m', 'mm', 'kN·m', 'N·mm', 'kgf·m', 'MPa', 'bar', 'deg/m', 'rad/mm'])('has %s for a metric unit', (unit) => {
    expect(isUnitOf(unit, 'SI')).toBe(true);
    expect(isUnitOf(unit, 'US')).toBe(false);
  });

  it.each(['deg', 'rad', 'rpm', 'Hz'])('has %s for a unit of both', (unit) => {
    expect(isUnitOf(unit, 'SI') && isUnitOf(unit, 'US')).toBe(true);
  });
});

describe('shownText', () => {
  it('shows what was typed where its unit is at home', () => {
    expect(shownText('1.40 m', ['length'], 'SI')).toBe('1.40 m');
    expect(shownText('2400 lbf*in', ['torque'], 'US')).toBe('2400 lbf*in');
    expect(shownText('3 deg', ['angle', 'twistRate'], 'US')).toBe('3 deg');
  });

  it('converts what was typed in the other system', () => {
    expect(shownText('25.4 mm', ['length'], 'US')).toBe('1 in');
    expect(shownText('31.5 in', ['length'], 'SI')).toBe('800.1 mm');
    expect(shownText('100 N·m', ['torque'], 'US')).toBe('885.07 lbf·in');
    expect(shownText('1 deg/m', ['angle', 'twistRate'], 'US')).toBe('0.3048 deg/ft');
  });

  it('shows what cannot be read as it stands, and nothing where nothing was entered', () => {
    expect(shownText('900 Nmm/s', ['torque'], 'US')).toBe('900 Nmm/s');
    expect(shownText(undefined, ['torque'], 'SI')).toBe('');
  });

  it('has a true minus sign, and two decimals for a price', () => {
    expect(shownText('-2 kN', ['force'], 'SI')).toBe('−2 kN');
    expect(shownText(6.5, 'price', 'SI')).toBe('6.50');
    expect(shownText(0.125, 'price', 'SI')).toBe('0.125');
    expect(shownText(1.5, 'number', 'SI')).toBe('1.5');
  });
});

describe('valueOf', () => {
  it('has a number for a bare number, a text for all else, and nothing for an empty field', () => {
    expect(valueOf(' 1.5 ', 'number')).toBe(1.5);
    expect(valueOf('one', 'number')).toBe('one');
    expect(valueOf('1.5 mm', 'number')).toBe('1.5 mm');
    expect(valueOf('7', 'text')).toBe('7');
    expect(valueOf(' 900 N·m ', ['torque'])).toBe('900 N·m');
    expect(valueOf('  ', ['torque'])).toBeUndefined();
  });
});

describe('stepped', () => {
  it.each([
    ['900 N·m', 1, '901 N·m'],
    ['1.40 m', -1, '1.39 m'],
    ['0.9 mm', 10, '1.9 mm'],
    ['−2 kN', 1, '−1 kN'],
    ['-1 kN', 1, '0 kN'],
    ['0.1 mm', -2, '−0.1 mm'],
    ['.5 m', 1, '0.6 m'],
  ])('moves the last digit of %s by %i', (text, steps, moved) => {
    expect(stepped(text, steps)).toBe(moved);
  });

  it('leaves what does not begin with a number', () => {
    expect(stepped('any', 1)).toBeNull();
    expect(stepped('', 1)).toBeNull();
  });
});
