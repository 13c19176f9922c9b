import { describe, expect, expectTypeOf, it } from 'vitest';
import { findUnit } from '../../../src/quantity/lookup.js';
import { parseQuantity } from '../../../src/quantity/parse.js';
import { quantities, quantityNames, shownUnit } from '../../../src/quantity/register.js';
import type { Quantity } from '../../../src/quantity/register.js';
import { unitKey } from '../../../src/quantity/spelling.js';

describe('the register', () => {
  it.each(quantityNames)('%s: its example and its shown units can be read', (name) => {
    const entry = quantities[name];
    expect(parseQuantity(entry.example, name).ok).toBe(true);
    expect(findUnit(shownUnit(name, 'SI'), name)?.symbol).toBe(entry.shown.SI);
    expect(findUnit(shownUnit(name, 'US'), name)?.symbol).toBe(entry.shown.US);
    expect(parseQuantity(`1 ${entry.si}`, name)).toEqual({ ok: true, value: 1, unit: entry.si });
  });

  it.each(quantityNames)('%s: no spelling stands for two units, every spelling leads to its own', (name) => {
    const owner = new Map<string, string>();
    for (const unit of quantities[name].units) {
      for (const spelling of [unit.symbol, ...unit.aliases]) {
        const key = unitKey(spelling) ?? '';
        expect(owner.get(key) ?? unit.symbol).toBe(unit.symbol);
        owner.set(key, unit.symbol);
        expect(findUnit(spelling, name)?.symbol).toBe(unit.symbol);
      }
    }
  });

  it('cannot be changed', () => {
    expect(Object.isFrozen(quantities)).toBe(true);
    for (const name of quantityNames) {
      expect(Object.isFrozen(quantities[name])).toBe(true);
      expect(Object.isFrozen(quantities[name].units)).toBe(true);
      expect(quantities[name].units.every((unit) => Object.isFrozen(unit))).toBe(true);
    }
  });

  it('shows a torque in newton metres or in pound-force inches', () => {
    expect([shownUnit('torque', 'SI'), shownUnit('torque', 'US')]).toEqual(['N·m', 'lbf·in']);
  });

  it('lets a plain number stand for a quantity, not one quantity for another', () => {
    expectTypeOf<number>().toExtend<Quantity<'torque'>>();
    expectTypeOf<Quantity<'torque'>>().toExtend<number>();
    expectTypeOf<Quantity<'length'>>().not.toExtend<Quantity<'torque'>>();
  });
});
