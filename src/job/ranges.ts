import { quantitySpec } from '../material/field.js';

/**
 * What each field of a job may hold. The ends are wide: they keep out slips of a power of ten and of the pen, and
 * numbers with which arithmetic would overflow, not unusual tubes. Factors, ratios and counts are bare numbers.
 */
export const JOB_RANGES = Object.freeze({
  length: quantitySpec({ quantity: 'length', what: 'a length', atLeast: '1 mm', atMost: '1 km', example: '1.4 m' }),
  outerDiameter: quantitySpec({
    quantity: 'length',
    what: 'a diameter',
    atLeast: '0.1 mm',
    atMost: '100 m',
    example: '70 mm',
  }),
  wall: quantitySpec({ quantity: 'length', what: 'a wall', atLeast: '0.001 mm', atMost: '1 m', example: '0.9 mm' }),
  torque: quantitySpec({
    quantity: 'torque',
    what: 'a torque',
    atLeast: '-1000 MN·m',
    atMost: '1000 MN·m',
    example: '900 N·m',
  }),
  bending: quantitySpec({
    quantity: 'torque',
    what: 'a bending moment',
    atLeast: '0 N·m',
    atMost: '1000 MN·m',
    example: '120 N·m',
  }),
  axial: quantitySpec({
    quantity: 'force',
    what: 'a force',
    atLeast: '-1000 MN',
    atMost: '1000 MN',
    example: '-8 kN',
  }),
  twist: quantitySpec({
    quantity: 'angle',
    what: 'a twist end to end',
    atLeast: '0.000001 deg',
    atMost: '3600 deg',
    example: '3 deg',
  }),
  shearStress: quantitySpec({
    quantity: 'stress',
    what: 'a shear stress',
    atLeast: '1 kPa',
    atMost: '10 GPa',
    example: '80 MPa',
  }),
  speed: quantitySpec({
    quantity: 'rotationalSpeed',
    what: 'a speed',
    atLeast: '0.001 rpm',
    atMost: '10000000 rpm',
    example: '3000 rpm',
  }),
  /** yield, ultimate and buckling factors */
  factor: { atLeast: 0.1, atMost: 100 },
  /** first whirl speed over greatest running speed */
  speedMargin: { atLeast: 1, atMost: 10 },
  torsionKnockdown: { above: 0, atMost: 1 },
  /** D/t of either bound; at 2 the bore is gone */
  diameterToWall: { atLeast: 2.2, atMost: 5000 },
  /** the least torque that counts as one, N·m */
  torqueLeast: 1e-9,
  /** the longest span between bearings, over the length */
  supportSpacingOverLength: 10,
  loads: 200,
  materials: 200,
  held: 200,
  /** characters */
  title: 500,
  name: 200,
  note: 4000,
  currency: 20,
} as const);
