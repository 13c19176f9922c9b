import { choiceField } from '../material/field.js';
import { hasField, refuse, type Fields } from '../material/reading.js';
import { JOB_DEFAULTS } from './defaults.js';
import type { Job } from './job.js';
import { openObject, type ObjectRule } from './openObject.js';
import { JOB_RANGES } from './ranges.js';
import { numberOr } from './readTube.js';

const BUCKLING: ObjectRule = {
  what: 'a buckling rule',
  example: '{ "torsionKnockdown": 0.67 }',
  keys: ['torsionKnockdown', 'method'],
};

function checkMethod(fields: Fields): void {
  if (!hasField(fields, 'method')) return;
  if (fields.own.get('method') === 'shell')
    refuse(fields, 'method', 'needs the shell solver, which this version does not have', '"formula"');
  else choiceField(fields, 'method', ['formula']);
}

/** Reads `buckling`, with its defaults where it is left out. Meaningless where problems were noted. */
export function collectBuckling(job: Fields): Job['buckling'] {
  const { torsionKnockdown, bucklingMethod: method } = JOB_DEFAULTS;
  const value = job.own.get('buckling');
  const fields = value === undefined ? null : openObject(value, 'buckling', BUCKLING, job.reading);
  if (fields === null) return { torsionKnockdown, method };
  checkMethod(fields);
  return {
    torsionKnockdown: numberOr(fields, 'torsionKnockdown', JOB_RANGES.torsionKnockdown, torsionKnockdown),
    method,
  };
}
