import { parseQuantity } from '../quantity/parse.js';
import type { QuantityName } from '../quantity/register.js';
import { joinPath, saidProblem } from './problem.js';
import { isInside, rangeText, type Range } from './range.js';
import { hasField, refuse, type Fields } from './reading.js';

/** A physical value: its quantity, what it is in words ("a length"), an example, and its range as texts ("1 MPa"). */
export interface QuantityRule extends Range<string> {
  readonly quantity: QuantityName;
  readonly what: string;
  readonly example: string;
}

/** A rule made ready by `quantitySpec`: its range in SI units and its expectation in words. */
export interface QuantitySpec {
  readonly quantity: QuantityName;
  readonly range: Range<number>;
  readonly expected: string;
}

/** Text: what to expect in words, how long it may be (default 2,000 characters), whether it may hold line breaks. */
export interface TextSpec {
  readonly expected?: string;
  readonly longest?: number;
  readonly lines?: boolean;
}

const LONGEST_TEXT = 2000;
// lone surrogates too: canonical JSON has no form for them
const UNPRINTABLE = /[\p{Cc}\p{Cs}\p{Zl}\p{Zp}]/u;

/** Reads a value under a key that must be there, or notes the problem and gives `failed`. */
function required<T>(fields: Fields, key: string, expected: string, failed: T, read: (value: unknown) => T): T {
  const value = fields.own.get(key);
  if (value !== undefined) return read(value);
  refuse(fields, key, 'is missing', expected);
  return failed;
}

function textFault(text: string, spec: TextSpec): string | null {
  if (text.trim() === '') return 'is empty';
  if (text.length > (spec.longest ?? LONGEST_TEXT)) return 'is too long';
  const inner = spec.lines ? text.replace(/[\n\r\t]/g, ' ') : text;
  return UNPRINTABLE.test(inner) ? 'holds characters that cannot be printed' : null;
}

/** A text that must be there, as it stands; '' where it fails. */
export function textField(fields: Fields, key: string, spec: TextSpec = {}): string {
  const expected = `${spec.expected ?? 'text'} of 1 to ${spec.longest ?? LONGEST_TEXT} characters`;
  return required(fields, key, expected, '', (value) => {
    const fault = typeof value === 'string' ? textFault(value, spec) : 'is not text';
    if (fault !== null) refuse(fields, key, fault, expected);
    return fault === null ? String(value) : '';
  });
}

/** A text that may be left out (null). */
export function optionalText(fields: Fields, key: string, spec: TextSpec = {}): string | null {
  return hasField(fields, key) ? textField(fields, key, spec) : null;
}

/** A bare number inside a range that must be there; NaN where it fails. */
export function numberField(fields: Fields, key: string, range: Range<number>): number {
  const expected = `a number ${rangeText(range)}`.trimEnd();
  return required(fields, key, expected, NaN, (value) => {
    if (typeof value !== 'number') refuse(fields, key, 'is not a number', expected);
    else if (!isInside(value, range)) refuse(fields, key, 'is out of range', expected);
    else return value;
    return NaN;
  });
}

/** A bare number that may be left out (null). */
export function optionalNumber(fields: Fields, key: string, range: Range<number>): number | null {
  return hasField(fields, key) ? numberField(fields, key, range) : null;
}

/** true or false, or left out (null). */
export function optionalBoolean(fields: Fields, key: string): boolean | null {
  const value = fields.own.get(key);
  if (value === undefined || typeof value === 'boolean') return value ?? null;
  refuse(fields, key, 'is not true or false', 'true or false');
  return null;
}

/** One of a few words that must be there; the first of them where it fails. The nearest word is offered. */
export function choiceField<T extends string>(fields: Fields, key: string, words: readonly [T, ...T[]]): T {
  const expected = words.map((word) => `"${word}"`).join(' or ');
  return required(fields, key, expected, words[0], (value) => {
    const found = words.find((word) => word === value);
    if (found === undefined) refuse(fields, key, 'is not known', expected);
    return found ?? words[0];
  });
}

/** A list with between `atLeast` and `atMost` entries that must be there; empty where it fails. */
export function listField(
  fields: Fields,
  key: string,
  what: string,
  atLeast: number,
  atMost: number,
): readonly unknown[] {
  return required<readonly unknown[]>(fields, key, `a list of ${what}`, [], (value) => {
    const list: readonly unknown[] = Array.isArray(value) ? value : [];
    if (!Array.isArray(value)) refuse(fields, key, 'is not a list', `a list of ${what}`);
    else if (list.length < atLeast || list.length > atMost)
      refuse(fields, key, `of ${list.length} is out of range`, `${atLeast} to ${atMost} ${what}`);
    else return list;
    return [];
  });
}

function inSi(text: string, quantity: QuantityName): number {
  const parsed = parseQuantity(text, quantity);
  if (!parsed.ok) throw new TypeError(`a range ends wrongly: ${parsed.message}`);
  return parsed.value;
}

/** Makes a rule ready. Throws a TypeError where an end of its range is no value of its quantity (a mistake in the code). */
export function quantitySpec(rule: QuantityRule): QuantitySpec {
  const { quantity, what, example, ...ends } = rule;
  const range = Object.fromEntries(Object.entries(ends).map(([end, text]) => [end, inSi(text, quantity)]));
  const words = rangeText(ends);
  return { quantity, range, expected: `${what}${words === '' ? '' : ` ${words}`}, such as "${example}"` };
}

/** A physical value that must be there, in SI units; its unit as entered is kept in the reading. NaN where it fails. */
export function quantityField(fields: Fields, key: string, spec: QuantitySpec): number {
  const { quantity, range, expected } = spec;
  return required(fields, key, expected, NaN, (value) => {
    const parsed = parseQuantity(value, quantity);
    if (!parsed.ok)
      fields.reading.problems.push(saidProblem(joinPath(fields.path, key), value, parsed.message, expected));
    else if (!isInside(parsed.value, range)) refuse(fields, key, 'is out of range', expected);
    else {
      fields.reading.units[joinPath(fields.path, key)] = parsed.unit;
      return parsed.value;
    }
    return NaN;
  });
}

/** A physical value that may be left out (null). */
export function optionalQuantity(fields: Fields, key: string, spec: QuantitySpec): number | null {
  return hasField(fields, key) ? quantityField(fields, key, spec) : null;
}
