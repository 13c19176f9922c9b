import { quantityField } from '../material/field.js';
import type { Fields } from '../material/reading.js';
import { JOB_DEFAULTS } from './defaults.js';
import type { Speed } from './job.js';
import { openObject, type ObjectRule } from './openObject.js';
import { JOB_RANGES } from './ranges.js';
import { numberOr } from './readTube.js';

const SPEED: ObjectRule = { what: 'a speed', example: '{ "max": "3000 rpm" }', keys: ['max', 'margin'] };

/** Reads `speed`; null where it is left out. Meaningless where problems were noted. */
export function collectSpeed(job: Fields): Speed | null {
  const value = job.own.get('speed');
  if (value === undefined) return null;
  const fields = openObject(value, 'speed', SPEED, job.reading);
  if (fields === null) return null;
  return {
    max: quantityField(fields, 'max', JOB_RANGES.speed),
    margin: numberOr(fields, 'margin', JOB_RANGES.speedMargin, JOB_DEFAULTS.speedMargin),
  };
}
