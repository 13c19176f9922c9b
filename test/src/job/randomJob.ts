import fc from 'fast-check';
import { quantities, type QuantityName } from '../../../src/quantity/register.js';
import { inUnit } from '../../../src/quantity/format.js';
import { sampleRecord, type Doc } from './sample.js';

/** A value between two SI numbers, written in any unit of its quantity with any number of figures. */
function quantityText(quantity: QuantityName, least: number, most: number): fc.Arbitrary<string> {
  const units = quantities[quantity].units.map((unit) => unit.symbol);
  const parts = fc.tuple(
    fc.double({ min: 0, max: 1, noNaN: true }),
    fc.constantFrom(...units),
    fc.integer({ min: 3, max: 17 }),
  );
  return parts.map(([share, unit, figures]) => {
    const number = inUnit(least + share * (most - least), quantity, unit);
    return `${Number(number.toPrecision(figures))} ${unit}`;
  });
}

function optional<T>(arbitrary: fc.Arbitrary<T>): fc.Arbitrary<T | undefined> {
  return fc.option(arbitrary, { nil: undefined });
}

/** Keys with the value undefined are left out of the document. */
function object(model: Record<string, fc.Arbitrary<unknown>>): fc.Arbitrary<Doc> {
  return fc
    .record(model)
    .map((record) => Object.fromEntries(Object.entries(record).filter(([, value]) => value !== undefined)));
}

const factor = fc.double({ min: 0.5, max: 3, noNaN: true });
const words = fc.string({
  unit: fc.constantFrom('a', 'b', '"', '\\', 'é', '😀', '/', ' '),
  minLength: 1,
  maxLength: 12,
});
const title = words.map((text) => `t${text}`);
const twist = fc.oneof(quantityText('angle', 0.01, 0.2), quantityText('twistRate', 0.01, 0.2));

function load(name: string): fc.Arbitrary<Doc> {
  return object({
    name: fc.constant(name),
    torque: quantityText('torque', -5000, -1),
    bending: optional(quantityText('torque', 1, 500)),
    axial: optional(quantityText('force', -5000, 5000)),
    reversing: optional(fc.boolean()),
    twistMax: optional(twist),
    shearStressMax: optional(quantityText('stress', 1e7, 1e8)),
    yieldFactor: optional(factor),
    ultimateFactor: optional(factor),
    bucklingFactor: optional(factor),
  });
}

const stockRow = object({
  outerDiameter: quantityText('length', 0.02, 0.08),
  wall: quantityText('length', 0.0005, 0.005),
  pricePerMetre: optional(fc.double({ min: 0, max: 100, noNaN: true })),
});
const sizes = fc.oneof(
  fc.constant('any'),
  fc.array(stockRow, { minLength: 1, maxLength: 5 }).map((stock) => ({ stock })),
);

function material(id: string): fc.Arbitrary<unknown> {
  const record = object({
    density: quantityText('density', 1500, 9000),
    tensileYield: quantityText('stress', 1e8, 3e8),
    shearYield: optional(quantityText('stress', 5e7, 1.9e8)),
    wallMin: quantityText('length', 0.0004, 0.002),
    pricePerKilogram: optional(factor),
    sizes: optional(sizes),
  }).map((changes) => ({ ...sampleRecord(id), ...changes }));
  return fc.oneof(fc.constant(id), record);
}

/** A sound job document, any optional key there or not, in mixed units; materials "alloy-1" and "alloy-2". */
export const randomJob: fc.Arbitrary<Doc> = object({
  format: fc.constant('wringwall-job'),
  version: fc.constant(1),
  title,
  note: optional(title.map((text) => `${text}\n${text}`)),
  number: optional(title),
  tube: object({
    length: quantityText('length', 0.3, 3),
    supportSpacing: optional(quantityText('length', 0.3, 2)),
    outerDiameterMax: optional(quantityText('length', 0.07, 0.2)),
    outerDiameterMin: optional(quantityText('length', 0.01, 0.06)),
    boreMin: optional(quantityText('length', 0.01, 0.05)),
    wallMin: optional(quantityText('length', 0.0004, 0.002)),
    diameterToWallMin: optional(fc.double({ min: 3, max: 10, noNaN: true })),
    diameterToWallMax: optional(fc.double({ min: 100, max: 900, noNaN: true })),
  }),
  loads: fc.tuple(load('first'), optional(load('second'))).map((loads) => loads.filter((entry) => entry !== undefined)),
  speed: optional(
    object({ max: quantityText('rotationalSpeed', 10, 900), margin: optional(fc.constantFrom(1, 1.3, 2)) }),
  ),
  buckling: optional(object({ torsionKnockdown: optional(fc.double({ min: 0.1, max: 1, noNaN: true })) })),
  materials: fc.tuple(material('alloy-1'), material('alloy-2')),
  sizes: optional(sizes),
  hold: optional(
    object({
      name: title,
      material: fc.constantFrom('alloy-1', 'alloy-2'),
      outerDiameter: quantityText('length', 0.02, 0.08),
      wall: quantityText('length', 0.0005, 0.005),
    }).map((held) => [held]),
  ),
  pick: optional(fc.constant({ material: 'alloy-2' })),
  currency: optional(fc.constant('EUR')),
  front: optional(fc.constant({ against: 'outerDiameter' })),
});
