import { clipped as clip, shownValue as showValue } from '../quantity/shown.js';

export { clip, showValue };

/** One mistake found in what a user handed in, as plain data. All of them are reported together. */
export interface Problem {
  /** key path such as "materials.1.density"; empty for the whole document */
  readonly path: string;
  /** what was found, clipped and with control characters escaped; empty where the key is missing */
  readonly value: string;
  /** what would have been right, such as "a density such as \"2700 kg/m³\"" */
  readonly expected: string;
  /** path, value and expectation in one sentence, without a full stop */
  readonly message: string;
}

/** The path of a key inside `path`; the key is clipped, since it may be the user's own. */
export function joinPath(path: string, key: string | number): string {
  const own = clip(String(key));
  return path === '' ? own : `${path}.${own}`;
}

/**
 * A mistake told in a clause of its own, such as a quantity's refusal: `<path>: <clause>`, or the clause alone for the
 * whole document.
 */
export function saidProblem(path: string, value: unknown, clause: string, expected: string): Problem {
  const shown = typeof value === 'string' ? clip(value) : value === undefined ? '' : showValue(value);
  return { path, value: shown, expected, message: path === '' ? clause : `${path}: ${clause}` };
}

/**
 * A value that is wrong: `<path>: "<found>" <wrong>; expected <expected>`.
 * @param wrong the rest of the clause after the value, such as "is not a number"
 */
export function wrongValue(path: string, value: unknown, wrong: string, expected: string): Problem {
  return saidProblem(path, value, `${showValue(value)} ${wrong}; expected ${expected}`, expected);
}

/** A required value that is not there: `<path>: is missing; expected <expected>`. */
export function missingValue(path: string, expected: string): Problem {
  return saidProblem(path, undefined, `is missing; expected ${expected}`, expected);
}
