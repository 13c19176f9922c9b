import { describe, expect, it } from 'vitest';
import { findUnit } from '../../../src/quantity/lookup.js';
import { quantities, quantityNames, type QuantityName } from '../../../src/quantity/register.js';

// Factors to SI, exact by definition; NIST SP 811, Appendix B. Where 16 figures do not hold the value it is rounded.
const FACTORS: Readonly<Record<QuantityName, Readonly<Record<string, number>>>> = {
  length: { m: 1, mm: 1e-3, cm: 1e-2, km: 1e3, µm: 1e-6, in: 0.0254, ft: 0.3048, thou: 2.54e-5 },
  angle: {
    rad: 1,
    mrad: 1e-3,
    deg: 0.017453292519943296,
    arcmin: 2.908882086657216e-4,
    rev: 6.283185307179586,
  },
  twistRate: {
    'rad/m': 1,
    'mrad/m': 1e-3,
    'deg/m': 0.017453292519943296,
    'deg/ft': 0.017453292519943296 / 0.3048,
    'deg/in': 0.017453292519943296 / 0.0254,
    'rad/in': 1 / 0.0254,
    'rad/ft': 1 / 0.3048,
    'rad/mm': 1e3,
    'rev/m': 6.283185307179586,
    'arcmin/m': 2.908882086657216e-4,
    'mrad/mm': 1,
  },
  torque: {
    'N·m': 1,
    'kN·m': 1e3,
    'MN·m': 1e6,
    'N·mm': 1e-3,
    'lbf·in': 0.1129848290276167,
    'lbf·ft': 1.3558179483314004,
    'kip·in': 112.9848290276167,
    'kip·ft': 1355.8179483314004,
    'kgf·m': 9.80665,
  },
  force: { N: 1, kN: 1e3, MN: 1e6, lbf: 4.4482216152605, kip: 4448.2216152605, kgf: 9.80665 },
  stress: {
    Pa: 1,
    kPa: 1e3,
    MPa: 1e6,
    GPa: 1e9,
    'N/mm²': 1e6,
    psi: 6894.757293168361,
    ksi: 6.894757293168361e6,
    Msi: 6.894757293168361e9,
    bar: 1e5,
  },
  density: { 'kg/m³': 1, 'g/cm³': 1e3, 'lb/in³': 27679.90471020312, 'lb/ft³': 27679.90471020312 / 1728 },
  rotationalSpeed: { 'rad/s': 1, rpm: 0.10471975511965977, Hz: 6.283185307179586 },
  mass: { kg: 1, g: 1e-3, t: 1e3, lb: 0.45359237, oz: 0.028349523125 },
  linearMass: { 'kg/m': 1, 'g/m': 1e-3, 'lb/ft': 1.4881639435695538, 'lb/in': 17.857967322834646 },
  torsionalStiffness: {
    'N·m/rad': 1,
    'N·m/deg': 57.29577951308232,
    'lbf·in/rad': 0.1129848290276167,
    'lbf·ft/deg': 1.3558179483314004 * 57.29577951308232,
  },
  energy: { J: 1, kJ: 1e3, 'ft·lbf': 1.3558179483314004, 'in·lbf': 0.1129848290276167 },
  area: { 'm²': 1, 'mm²': 1e-6, 'cm²': 1e-4, 'in²': 6.4516e-4, 'ft²': 0.09290304 },
  secondMoment: { 'm⁴': 1, 'mm⁴': 1e-12, 'cm⁴': 1e-8, 'in⁴': 4.162314256e-7 },
};

const ROWS = quantityNames.flatMap((quantity) =>
  Object.entries(FACTORS[quantity]).map(([symbol, factor]) => ({ quantity, symbol, factor })),
);

describe('factors to SI', () => {
  it.each(ROWS)('$quantity: 1 $symbol = $factor', ({ quantity, symbol, factor }) => {
    const unit = findUnit(symbol, quantity);
    if (unit === null) throw new Error(`${symbol} is missing`);
    expect(unit.symbol).toBe(symbol);
    expect(Math.abs(unit.times / unit.over / factor - 1)).toBeLessThan(5e-16);
  });

  it('leaves no unit out but those built from others', () => {
    const listed = (name: QuantityName) => new Set(Object.keys(FACTORS[name]));
    const missing = quantityNames
      .filter((name) => name !== 'twistRate' && name !== 'torsionalStiffness')
      .flatMap((name) => quantities[name].units.filter((unit) => !listed(name).has(unit.symbol)));
    expect(missing).toEqual([]);
  });

  it('builds a twist rate from every angle and length, a stiffness from every torque', () => {
    const count = (name: QuantityName) => quantities[name].units.length;
    expect(count('twistRate')).toBe(count('angle') * count('length'));
    expect(count('torsionalStiffness')).toBe(2 * count('torque'));
  });
});
