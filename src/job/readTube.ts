import { numberField, optionalQuantity, quantityField } from '../material/field.js';
import { showValue } from '../material/problem.js';
import { hasField, refuse, type Fields, type Reading } from '../material/reading.js';
import { JOB_DEFAULTS } from './defaults.js';
import type { TubeSpec } from './job.js';
import { openObject, type ObjectRule } from './openObject.js';
import { JOB_RANGES } from './ranges.js';

const TUBE: ObjectRule = {
  what: 'a tube',
  example: '{ "length": "1.4 m" }',
  keys: [
    'length',
    'supportSpacing',
    'outerDiameterMax',
    'outerDiameterMin',
    'boreMin',
    'wallMin',
    'diameterToWallMin',
    'diameterToWallMax',
  ],
};

/** A bare number that has a default. */
export function numberOr(
  fields: Fields,
  key: string,
  range: Parameters<typeof numberField>[2],
  otherwise: number,
): number {
  return hasField(fields, key) ? numberField(fields, key, range) : otherwise;
}

function tubeOf(fields: Fields): TubeSpec {
  const length = quantityField(fields, 'length', JOB_RANGES.length);
  const { diameterToWallMin, diameterToWallMax } = JOB_DEFAULTS;
  return {
    length,
    supportSpacing: optionalQuantity(fields, 'supportSpacing', JOB_RANGES.length) ?? length,
    outerDiameterMax: optionalQuantity(fields, 'outerDiameterMax', JOB_RANGES.outerDiameter),
    outerDiameterMin: optionalQuantity(fields, 'outerDiameterMin', JOB_RANGES.outerDiameter),
    boreMin: optionalQuantity(fields, 'boreMin', JOB_RANGES.outerDiameter),
    wallMin: optionalQuantity(fields, 'wallMin', JOB_RANGES.wall),
    diameterToWallMin: numberOr(fields, 'diameterToWallMin', JOB_RANGES.diameterToWall, diameterToWallMin),
    diameterToWallMax: numberOr(fields, 'diameterToWallMax', JOB_RANGES.diameterToWall, diameterToWallMax),
  };
}

function checkSpan(fields: Fields, tube: TubeSpec): void {
  const most = JOB_RANGES.supportSpacingOverLength;
  if (tube.supportSpacing > most * tube.length)
    refuse(fields, 'supportSpacing', 'is far longer than the tube', `at most ${most} times tube.length`);
}

function checkEnvelope(fields: Fields, tube: TubeSpec): void {
  const max = tube.outerDiameterMax ?? Infinity;
  const shown = showValue(fields.own.get('outerDiameterMax'));
  if ((tube.outerDiameterMin ?? 0) > max)
    refuse(fields, 'outerDiameterMin', 'is over tube.outerDiameterMax', `at most ${shown}`);
  if ((tube.boreMin ?? 0) >= max)
    refuse(fields, 'boreMin', 'leaves no wall', `a bore under ${shown}, tube.outerDiameterMax`);
}

function checkDiameterToWall(fields: Fields, tube: TubeSpec): void {
  const { diameterToWallMin: min, diameterToWallMax: max } = tube;
  if (!(min >= max)) return;
  if (hasField(fields, 'diameterToWallMin'))
    refuse(fields, 'diameterToWallMin', 'leaves no tube', `a number under tube.diameterToWallMax, ${max}`);
  else refuse(fields, 'diameterToWallMax', 'leaves no tube', `a number over tube.diameterToWallMin, ${min}`);
}

/** Reads `tube`; null where it is no object. Meaningless where problems were noted. */
export function collectTube(value: unknown, reading: Reading): TubeSpec | null {
  const fields = openObject(value, 'tube', TUBE, reading);
  if (fields === null) return null;
  const tube = tubeOf(fields);
  checkSpan(fields, tube);
  checkEnvelope(fields, tube);
  checkDiameterToWall(fields, tube);
  return tube;
}
