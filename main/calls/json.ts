import { utf8Length } from '../../src/job/jsonLimits.js';
import { Refused } from './refused.js';

/** What a call's arguments may hold at most: bytes of their JSON text in UTF-8, and levels of nesting. */
export const CALL_LIMITS = Object.freeze({ bytes: 4_000_000, levels: 64 });

function isPlain(value: object): boolean {
  const prototype: unknown = Object.getPrototypeOf(value);
  return prototype === Object.prototype || prototype === null;
}

/** Whether a value is one that JSON text can hold and give back the same, and no deeper than `levels`. */
export function isJson(value: unknown, levels: number = CALL_LIMITS.levels): boolean {
  if (value === null || typeof value === 'string' || typeof value === 'boolean') return true;
  if (typeof value === 'number') return Number.isFinite(value);
  if (typeof value !== 'object' || levels === 0) return false;
  if (!Array.isArray(value) && !isPlain(value)) return false;
  return Object.values(value).every((own) => isJson(own, levels - 1));
}

/**
 * The JSON text of a value from outside.
 * @param what the value in words, such as "the state"
 * @throws Refused where it is no JSON value, or its text is too large
 */
export function jsonText(value: unknown, what: string): string {
  if (!isJson(value)) {
    const sentence = `${what} is not a JSON value of at most ${CALL_LIMITS.levels} levels.`;
    throw new Refused({ code: 'bad-arguments', sentence });
  }
  const text = JSON.stringify(value);
  if (utf8Length(text) <= CALL_LIMITS.bytes) return text;
  throw new Refused({ code: 'too-large', sentence: `${what} is larger than ${CALL_LIMITS.bytes / 1e6} MB.` });
}
