import { MATERIAL_DEFAULTS } from './defaults.js';
import { hasField, newReading, openFields, refuse, refuseValue, type Fields, type Reading } from './reading.js';
import { numberField, optionalNumber, optionalQuantity, quantityField, textField } from './field.js';
import type { Metal } from './material.js';
import * as rule from './metalKeys.js';
import { joinPath, type Problem } from './problem.js';
import { NO_STOCK, optionalSizes, type StockLists } from './sizes.js';

/** A metal record as read, with the unit in which each value was entered by key path; or every mistake in it. */
export type MetalResult =
  | { readonly ok: true; readonly metal: Metal; readonly units: Readonly<Record<string, string>> }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/**
 * Reads a metal record of the job format (values as texts with units) into SI units with every default written out.
 * @param path key path of the record for messages and units, such as "materials.1"; empty for a record on its own
 * @param stock the shipped stock lists by id, for a record whose `sizes` names one
 */
export function readMetal(record: unknown, path: string, stock: StockLists = NO_STOCK): MetalResult {
  const reading = newReading();
  const metal = collectMetal(record, path, reading, stock);
  const { problems, units } = reading;
  return metal !== null && problems.length === 0 ? { ok: true, metal, units } : { ok: false, problems };
}

/** As `readMetal`, into a reading shared with others; null or a meaningless record where problems were noted. */
export function collectMetal(record: unknown, path: string, reading: Reading, stock: StockLists): Metal | null {
  if (isLaminate(record)) {
    const wrong = 'is a kind of material that this version cannot size';
    refuseValue(reading, joinPath(path, 'kind'), record.kind, wrong, '"metal"');
    return null;
  }
  const fields = openFields(record, path, 'a metal record', rule.METAL_KEYS, reading);
  if (fields === null) return null;
  checkKind(fields);
  const metal = metalOf(fields, stock);
  checkStrengths(fields, metal);
  checkShearModulus(fields, metal);
  return metal;
}

function isLaminate(record: unknown): record is { readonly kind: 'laminate' } {
  return typeof record === 'object' && record !== null && 'kind' in record && record.kind === 'laminate';
}

function checkKind(fields: Fields): void {
  if (fields.own.get('kind') !== 'metal') refuse(fields, 'kind', 'is not a kind of material', '"metal"');
}

function metalOf(fields: Fields, stock: StockLists): Metal {
  const tensileYield = quantityField(fields, 'tensileYield', rule.STRENGTH);
  const { jointFactor, shearYieldOverTensileYield, compressiveOverTensileYield } = MATERIAL_DEFAULTS;
  return {
    id: textField(fields, 'id', { longest: 80 }),
    kind: 'metal',
    name: textField(fields, 'name', { longest: 200 }),
    family: textField(fields, 'family', { longest: 80 }),
    density: quantityField(fields, 'density', rule.DENSITY),
    youngsModulus: quantityField(fields, 'youngsModulus', rule.MODULUS),
    shearModulus: quantityField(fields, 'shearModulus', rule.MODULUS),
    poissonRatio: numberField(fields, 'poissonRatio', rule.POISSON_RATIO),
    tensileYield,
    tensileUltimate: quantityField(fields, 'tensileUltimate', rule.STRENGTH),
    shearYield: optionalQuantity(fields, 'shearYield', rule.STRENGTH) ?? tensileYield * shearYieldOverTensileYield,
    shearUltimate: quantityField(fields, 'shearUltimate', rule.STRENGTH),
    compressiveYield:
      optionalQuantity(fields, 'compressiveYield', rule.STRENGTH) ?? tensileYield * compressiveOverTensileYield,
    wallMin: quantityField(fields, 'wallMin', rule.GAUGE),
    wallMax: optionalQuantity(fields, 'wallMax', rule.GAUGE),
    wallTolerance: numberField(fields, 'wallTolerance', rule.WALL_TOLERANCE),
    jointFactor: optionalNumber(fields, 'jointFactor', rule.JOINT_FACTOR) ?? jointFactor,
    pricePerKilogram: optionalNumber(fields, 'pricePerKilogram', rule.PRICE),
    source: textField(fields, 'source', { longest: 4000, lines: true }),
    sizes: optionalSizes(fields, 'sizes', stock),
  };
}

function checkStrengths(fields: Fields, metal: Metal): void {
  if (metal.tensileUltimate < metal.tensileYield)
    refuse(fields, 'tensileUltimate', 'is under the yield strength', 'an ultimate strength of at least tensileYield');
  if (hasField(fields, 'shearYield') && metal.shearYield > metal.shearUltimate)
    refuse(fields, 'shearYield', 'is over the ultimate shear strength', 'a shear yield of at most shearUltimate');
}

/** An isotropic metal has G = E/(2(1 + ν)); texture moves it a little, a slip of the pen a lot. */
function checkShearModulus(fields: Fields, metal: Metal): void {
  const isotropic = metal.youngsModulus / (2 * (1 + metal.poissonRatio));
  const off = Math.abs(metal.shearModulus / isotropic - 1);
  if (off > rule.SHEAR_MODULUS_TEXTURE)
    refuse(fields, 'shearModulus', 'does not go with E and ν', 'a modulus within 25 % of E/(2(1 + ν))');
}
