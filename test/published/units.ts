import type { QuantityName } from '../../src/quantity/register.js';

/** One exact conversion: the text as a user writes it and the SI value that the definitions give. */
export interface UnitRow {
  readonly id: string;
  readonly source: string;
  readonly quantity: QuantityName;
  readonly text: string;
  /** SI unit of the expected value */
  readonly si: string;
  readonly expected: number;
  /** relative: 0 where the value is an exact decimal, else from the figures given: one place of a double, or as printed */
  readonly tolerance: number;
}

const SOURCE = 'exact by definition; NIST SP 811, Appendix B';
const SIXTEEN = 2.3e-16;

export const unitRows: readonly UnitRow[] = [
  row('U1', 'length', '1 in', 'm', 0.0254),
  row('U2', 'length', '1 ft', 'm', 0.3048),
  row('U3', 'mass', '1 lb', 'kg', 0.45359237),
  row('U4', 'force', '1 lbf', 'N', 4.4482216152605),
  row('U5', 'force', '1 kgf', 'N', 9.80665),
  row('U6', 'torque', '1 lbf in', 'N·m', 0.1129848290276167),
  row('U7', 'torque', '1 lbf ft', 'N·m', 1.3558179483314004),
  row('U8', 'stress', '1 psi', 'Pa', 6894.757293168361, SIXTEEN),
  row('U9', 'stress', '1 ksi', 'Pa', 6.894757293168361e6, SIXTEEN),
  row('U10', 'stress', '1 Msi', 'Pa', 6.894757293168361e9, SIXTEEN),
  row('U11', 'density', '1 lb/in^3', 'kg/m³', 27679.90471020312, SIXTEEN),
  row('U12', 'linearMass', '1 lb/ft', 'kg/m', 1.4881639435695538, SIXTEEN),
  row('U13', 'linearMass', '1 lb/in', 'kg/m', 17.857967322834646, SIXTEEN),
  row('U14', 'secondMoment', '1 in^4', 'm⁴', 4.162314256e-7),
  row('U15', 'angle', '1 deg', 'rad', Math.PI / 180, SIXTEEN),
  row('U16', 'twistRate', '1 deg/ft', 'rad/m', (3.280839895 * Math.PI) / 180, 0.5e-9 / 3.28),
  row('U17', 'rotationalSpeed', '60 rpm', 'rad/s', 2 * Math.PI, SIXTEEN),
];

function row(id: string, quantity: QuantityName, text: string, si: string, expected: number, tolerance = 0): UnitRow {
  return { id, source: SOURCE, quantity, text, si, expected, tolerance };
}
