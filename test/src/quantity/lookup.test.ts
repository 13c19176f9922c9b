import { describe, expect, it } from 'vitest';
import { findUnit, nearestUnit, quantityOfUnit } from '../../../src/quantity/lookup.js';

describe('lookup', () => {
  it('finds a unit within its quantity only', () => {
    expect(findUnit('ft-lb', 'torque')?.symbol).toBe('lbf·ft');
    expect(findUnit('ft-lb', 'energy')?.symbol).toBe('ft·lbf');
    expect(findUnit('ft-lb', 'length')).toBeNull();
    expect(findUnit('__proto__', 'length')).toBeNull();
  });

  it('names the quantity of a unit, the commoner one first', () => {
    expect(quantityOfUnit('ft-lb')).toBe('torque');
    expect(quantityOfUnit('slug')).toBeNull();
  });

  it('suggests the nearest unit of the quantities wanted', () => {
    expect(nearestUnit('mpa', ['stress'])).toBe('MPa');
    expect(nearestUnit('inchs', ['length'])).toBe('in');
    expect(nearestUnit('deg/mn', ['angle', 'twistRate'])).toBe('deg/m');
    expect(nearestUnit('mpa', ['torque'])).toBeNull();
  });
});
