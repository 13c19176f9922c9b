import { listField, quantityField, textField } from '../material/field.js';
import { joinPath } from '../material/problem.js';
import { hasField, refuse, type Fields } from '../material/reading.js';
import { nearest } from '../quantity/nearest.js';
import type { HeldDesign } from './job.js';
import { openObject, type ObjectRule } from './openObject.js';
import { JOB_RANGES } from './ranges.js';
import { refuseRepeats } from './unique.js';

const HELD: ObjectRule = {
  what: 'a design in hand',
  example: '{ "name": "on the shelf", "material": "…", "outerDiameter": "63.5 mm", "wall": "1.65 mm" }',
  keys: ['name', 'material', 'outerDiameter', 'wall'],
};

/** Sees that a text names one of a few things of the job, and offers the nearest of them. */
export function checkNamed(fields: Fields, key: string, names: readonly string[], what: string): void {
  const value = fields.own.get(key);
  if (typeof value !== 'string' || value.trim() === '' || names.includes(value)) return;
  const near = nearest(value.slice(0, 80), names);
  refuse(fields, key, `is not ${what} of this job`, near ? `"${near}"` : `${what} of this job`);
}

function heldOf(fields: Fields, ids: readonly string[]): HeldDesign {
  checkNamed(fields, 'material', ids, 'a material');
  const outerDiameter = quantityField(fields, 'outerDiameter', JOB_RANGES.outerDiameter);
  const wall = quantityField(fields, 'wall', JOB_RANGES.wall);
  if (wall >= outerDiameter / 2) refuse(fields, 'wall', 'leaves no bore', 'a wall under half of outerDiameter');
  return {
    name: textField(fields, 'name', { longest: JOB_RANGES.name }),
    material: textField(fields, 'material', { longest: 80 }),
    outerDiameter,
    wall,
  };
}

/** Reads `hold`, empty where it is left out. Meaningless where problems were noted. */
export function collectHold(job: Fields, ids: readonly string[]): readonly HeldDesign[] {
  if (!hasField(job, 'hold')) return [];
  const raw = listField(job, 'hold', 'designs in hand', 0, JOB_RANGES.held);
  const held = raw.map((entry, index) => {
    const fields = openObject(entry, joinPath('hold', index), HELD, job.reading);
    return fields === null ? null : heldOf(fields, ids);
  });
  refuseRepeats(
    held.map((design) => design?.name ?? ''),
    'hold',
    'name',
    job.reading,
  );
  return held.filter((design) => design !== null);
}
