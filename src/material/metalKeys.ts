import { quantitySpec, type QuantitySpec } from './field.js';
import type { Range } from './range.js';

/** Every key of a metal record, in the order in which it is written. */
export const METAL_KEYS = [
  'id',
  'kind',
  'name',
  'family',
  'density',
  'youngsModulus',
  'shearModulus',
  'poissonRatio',
  'tensileYield',
  'tensileUltimate',
  'shearYield',
  'shearUltimate',
  'compressiveYield',
  'wallMin',
  'wallMax',
  'wallTolerance',
  'jointFactor',
  'pricePerKilogram',
  'sizes',
  'source',
] as const;

/** Range of an elastic modulus, E or G. */
export const MODULUS: QuantitySpec = quantitySpec({
  quantity: 'stress',
  what: 'a modulus',
  atLeast: '0.1 GPa',
  atMost: '2000 GPa',
  example: '68.3 GPa',
});

/** Range of any strength. */
export const STRENGTH: QuantitySpec = quantitySpec({
  quantity: 'stress',
  what: 'a strength',
  atLeast: '1 MPa',
  atMost: '10 GPa',
  example: '241 MPa',
});

/** Range of the density. */
export const DENSITY: QuantitySpec = quantitySpec({
  quantity: 'density',
  what: 'a density',
  atLeast: '100 kg/m³',
  atMost: '30000 kg/m³',
  example: '2710 kg/m³',
});

/** Range of the minimum gauge of a process. */
export const GAUGE: QuantitySpec = quantitySpec({
  quantity: 'length',
  what: 'a wall',
  atLeast: '0.001 mm',
  atMost: '1 m',
  example: '0.7 mm',
});

/** ν of an isotropic metal: between no lateral contraction and incompressible. */
export const POISSON_RATIO: Range<number> = { above: 0, below: 0.5 };

/** δ: a wall that may be more than half missing is no tube wall. */
export const WALL_TOLERANCE: Range<number> = { atLeast: 0, atMost: 0.5 };

/** j: some strength is left at a joint, never more than elsewhere. */
export const JOINT_FACTOR: Range<number> = { above: 0, atMost: 1 };

/** A price, in the job's currency, per kilogram or metre. */
export const PRICE: Range<number> = { atLeast: 0, atMost: 1e9 };

/** How far G may be off E/(2(1 + ν)), as a fraction: texture explains some, a typing error more. */
export const SHEAR_MODULUS_TEXTURE = 0.25;
