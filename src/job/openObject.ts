import { openFields, refuseValue, type Fields, type Reading } from '../material/reading.js';

/** An object of the job: what it is in words, how one looks, and the keys that it may have. */
export interface ObjectRule {
  readonly what: string;
  readonly example: string;
  readonly keys: readonly string[];
}

/**
 * Opens an object of the job, and refuses what is none with an example of one. Null where it fails, with the problem
 * noted.
 */
export function openObject(value: unknown, path: string, rule: ObjectRule, reading: Reading): Fields | null {
  if (typeof value === 'object' && value !== null && !Array.isArray(value))
    return openFields(value, path, rule.what, rule.keys, reading);
  refuseValue(reading, path, value, 'is not an object', `${rule.what} such as ${rule.example}`);
  return null;
}
