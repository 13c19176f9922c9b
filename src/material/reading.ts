import { nearest } from '../quantity/nearest.js';
import { clip, joinPath, missingValue, wrongValue, type Problem } from './problem.js';

/**
 * What readers gather on their way: every problem met, and by key path the unit in which each value was entered.
 * A field that fails reads as a value of its type that means nothing (NaN, '', an empty list), so that comparisons with
 * it stay quiet; whoever holds the reading must drop the result where `problems` is not empty.
 */
export interface Reading {
  readonly problems: Problem[];
  readonly units: Record<string, string>;
}

/** The own keys of one object of the document, ready for the field readers. */
export interface Fields {
  readonly path: string;
  readonly own: ReadonlyMap<string, unknown>;
  readonly reading: Reading;
}

const MOST_UNKNOWN = 20;

/** A reading with nothing in it yet. */
export function newReading(): Reading {
  return { problems: [], units: {} };
}

function unknownKey(path: string, key: string, what: string, known: readonly string[]): Problem {
  const near = nearest(clip(key), known);
  const expected = near ? `"${near}"` : `one of ${known.join(', ')}`;
  return wrongValue(joinPath(path, key), key, `is not a key of ${what}`, expected);
}

/** Notes that a value is missing, or wrong as `wrong` says ("is not a number"). */
export function refuseValue(reading: Reading, path: string, value: unknown, wrong: string, expected: string): void {
  reading.problems.push(value === undefined ? missingValue(path, expected) : wrongValue(path, value, wrong, expected));
}

/**
 * Opens an object and refuses unknown keys with the nearest known one. Only own keys count, so "__proto__" and
 * "constructor" are unknown like any other. Returns null, with a problem noted, where the value is no object.
 * @param what the object in words, such as "a metal record"
 */
export function openFields(
  value: unknown,
  path: string,
  what: string,
  known: readonly string[],
  reading: Reading,
): Fields | null {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    refuseValue(reading, path, value, 'is not an object', what);
    return null;
  }
  const own = new Map<string, unknown>(Object.entries(value));
  refuseUnknownKeys({ path, own, reading }, what, known);
  return { path, own, reading };
}

/** The first twenty unknown keys one by one, since a broken file may hold thousands; then how many more there are. */
function refuseUnknownKeys(fields: Fields, what: string, known: readonly string[]): void {
  const unknown = Array.from(fields.own.keys()).filter((key) => !known.includes(key));
  const { path, reading } = fields;
  for (const key of unknown.slice(0, MOST_UNKNOWN)) reading.problems.push(unknownKey(path, key, what, known));
  const rest = unknown.length - MOST_UNKNOWN;
  if (rest > 0) refuseValue(reading, path, {}, `has ${rest} more unknown keys`, what);
}

/** Whether the key is there at all. */
export function hasField(fields: Fields, key: string): boolean {
  return fields.own.has(key);
}

/** Notes a problem with the value under a key. */
export function refuse(fields: Fields, key: string, wrong: string, expected: string): void {
  refuseValue(fields.reading, joinPath(fields.path, key), fields.own.get(key), wrong, expected);
}
