import { textField } from '../material/field.js';
import { hasField, refuseValue, type Fields } from '../material/reading.js';
import type { Pick } from './job.js';
import { openObject, type ObjectRule } from './openObject.js';
import { checkNamed } from './readHold.js';

const PICK: ObjectRule = {
  what: 'a choice',
  example: '{ "material": "…" } or { "held": "…" }',
  keys: ['material', 'held'],
};

/** Reads `pick`, null where it is left out. Meaningless where problems were noted. */
export function collectPick(job: Fields, ids: readonly string[], held: readonly string[]): Pick | null {
  const value = job.own.get('pick');
  if (value === undefined) return null;
  const fields = openObject(value, 'pick', PICK, job.reading);
  if (fields === null) return null;
  const byHeld = hasField(fields, 'held');
  if (byHeld === hasField(fields, 'material')) {
    // an unknown key in their place has been refused already
    if (byHeld || fields.own.size === 0)
      refuseValue(job.reading, 'pick', value, 'does not name one choice', 'either material or held');
    return null;
  }
  if (byHeld) checkNamed(fields, 'held', held, 'a design in hand');
  else checkNamed(fields, 'material', ids, 'a material');
  return byHeld ? { held: textField(fields, 'held') } : { material: textField(fields, 'material') };
}
