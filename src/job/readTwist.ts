import { joinPath, saidProblem } from '../material/problem.js';
import { isInside } from '../material/range.js';
import { hasField, refuse, type Fields } from '../material/reading.js';
import { parseOneOf } from '../quantity/parse.js';
import { JOB_RANGES } from './ranges.js';

const { range, expected } = JOB_RANGES.twist;

/** The twist end to end, rad. Nothing can be said of it where the length has failed (NaN). */
function endToEnd(fields: Fields, twist: number): number {
  if (!Number.isNaN(twist) && !isInside(twist, range)) refuse(fields, 'twistMax', 'is out of range', expected);
  return twist;
}

/**
 * Reads `twistMax` of a load case, end to end ("3 deg") or per length ("2 deg/m", multiplied by `length`, m): rad end to
 * end, null where it is left out. The range is that of the twist end to end.
 */
export function twistMaxOf(fields: Fields, length: number): number | null {
  if (!hasField(fields, 'twistMax')) return null;
  const value = fields.own.get('twistMax');
  const path = joinPath(fields.path, 'twistMax');
  const parsed = parseOneOf(value, ['angle', 'twistRate']);
  if (!parsed.ok) {
    fields.reading.problems.push(saidProblem(path, value, parsed.message, expected));
    return NaN;
  }
  fields.reading.units[path] = parsed.unit;
  return endToEnd(fields, parsed.quantity === 'angle' ? parsed.value : parsed.value * length);
}
