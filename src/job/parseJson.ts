import { clip, joinPath, type Problem } from '../material/problem.js';
import { JSON_LIMITS, utf8Length } from './jsonLimits.js';
import { JSON_NUMBER, JSON_SPACE, JSON_STRING, JSON_WORD } from './jsonTokens.js';
import { lineAndColumn, whatIsThere } from './jsonPlace.js';

export type ParsedJson =
  { readonly ok: true; readonly value: unknown } | { readonly ok: false; readonly problems: readonly Problem[] };

/** Thrown inside this file alone, where the text cannot be read on. */
class Unreadable extends Error {
  constructor(
    readonly at: number,
    readonly wrong: string,
    readonly expected: string,
  ) {
    super(wrong);
  }
}

/** What the walk through one text shares: where it is, and the keys that came twice. */
interface Walk {
  readonly text: string;
  at: number;
  readonly problems: Problem[];
}

const WORDS: ReadonlyMap<string, unknown> = new Map<string, unknown>([
  ['true', true],
  ['false', false],
  ['null', null],
]);

/** The text that a sticky pattern finds here, and the walk moved past it; null where it finds none. */
function take(walk: Walk, pattern: RegExp): string | null {
  pattern.lastIndex = walk.at;
  const found = pattern.exec(walk.text)?.[0] ?? null;
  walk.at += found?.length ?? 0;
  return found;
}

function skipSpace(walk: Walk): void {
  take(walk, JSON_SPACE);
}

/** Moves past one character, if it stands here. */
function takeIf(walk: Walk, character: string): boolean {
  skipSpace(walk);
  if (walk.text[walk.at] !== character) return false;
  walk.at += 1;
  return true;
}

function refuse(walk: Walk, expected: string): never {
  throw new Unreadable(walk.at, whatIsThere(walk.text, walk.at), expected);
}

function readString(walk: Walk, expected: string): string {
  const literal = take(walk, JSON_STRING) ?? refuse(walk, expected);
  return JSON.parse(literal) as string;
}

function readNumber(walk: Walk, literal: string, start: number): number {
  const value = Number(literal);
  if (Number.isFinite(value)) return value;
  throw new Unreadable(start, `the number ${clip(literal)} is too large`, 'a number below 1.8e308');
}

function readScalar(walk: Walk): unknown {
  const start = walk.at;
  const word = take(walk, JSON_WORD);
  if (word !== null) return WORDS.get(word);
  const literal = take(walk, JSON_NUMBER);
  return literal === null ? readString(walk, 'a value') : readNumber(walk, literal, start);
}

function readList(walk: Walk, path: string, level: number): unknown[] {
  const values: unknown[] = [];
  if (takeIf(walk, ']')) return values;
  do values.push(readValue(walk, joinPath(path, values.length), level));
  while (takeIf(walk, ','));
  return takeIf(walk, ']') ? values : refuse(walk, '"," or "]"');
}

function duplicateKey(walk: Walk, path: string, at: number): Problem {
  const expected = 'every key once';
  const message = `${path}: this key stands twice in the same object (again at ${lineAndColumn(walk.text, at)}); expected ${expected}`;
  return { path, value: '', expected, message };
}

function readMember(walk: Walk, path: string, level: number, members: Map<string, unknown>): void {
  skipSpace(walk);
  const start = walk.at;
  const key = readString(walk, 'a key in double quotes');
  const own = joinPath(path, key);
  if (!takeIf(walk, ':')) refuse(walk, `":" after the key "${clip(key)}"`);
  if (members.has(key)) walk.problems.push(duplicateKey(walk, own, start));
  members.set(key, readValue(walk, own, level));
}

function readObject(walk: Walk, path: string, level: number): unknown {
  const members = new Map<string, unknown>();
  if (takeIf(walk, '}')) return {};
  do readMember(walk, path, level, members);
  while (takeIf(walk, ','));
  if (!takeIf(walk, '}')) refuse(walk, '"," or "}"');
  // fromEntries defines own properties, so that a key "__proto__" is a key like any other.
  return Object.fromEntries(members);
}

function readValue(walk: Walk, path: string, level: number): unknown {
  skipSpace(walk);
  const opening = walk.text[walk.at];
  if (opening !== '{' && opening !== '[') return readScalar(walk);
  const wrong = `the values are nested deeper than ${JSON_LIMITS.levels} levels`;
  if (level >= JSON_LIMITS.levels) throw new Unreadable(walk.at, wrong, `at most ${JSON_LIMITS.levels} levels`);
  walk.at += 1;
  return opening === '{' ? readObject(walk, path, level + 1) : readList(walk, path, level + 1);
}

function readDocument(walk: Walk): unknown {
  const value = readValue(walk, '', 0);
  skipSpace(walk);
  if (walk.at < walk.text.length) refuse(walk, 'nothing after the end of the document');
  return value;
}

function wholeFile(wrong: string, expected: string): ParsedJson {
  return { ok: false, problems: [{ path: '', value: '', expected, message: `${wrong}; expected ${expected}` }] };
}

function unreadable(walk: Walk, error: unknown): ParsedJson {
  if (!(error instanceof Unreadable)) throw error;
  const message = `${lineAndColumn(walk.text, error.at)}: ${error.wrong}; expected ${error.expected}`;
  const problem: Problem = { path: '', value: '', expected: error.expected, message };
  return { ok: false, problems: [...walk.problems, problem] };
}

/**
 * Reads JSON text (RFC 8259) strictly: no comments, no NaN, no key twice, numbers that a double holds, at most
 * `JSON_LIMITS.bytes` and `JSON_LIMITS.levels`. A byte order mark is passed over. Depth is bounded, so that no text
 * can exhaust the stack.
 * @returns the value, or one sentence a mistake with line and column; reading stops at the first that is not a
 * repeated key
 */
export function parseJson(text: string): ParsedJson {
  const walk: Walk = { text, at: text.startsWith('\uFEFF') ? 1 : 0, problems: [] };
  if (text.slice(walk.at).trim() === '') return wholeFile('the file is empty', 'a JSON document');
  if (text.includes('\u0000')) return wholeFile('this is a binary file', 'JSON text in UTF-8');
  if (utf8Length(text) > JSON_LIMITS.bytes) return wholeFile('the text is longer than 2 MB', 'at most 2 MB');
  try {
    const value = readDocument(walk);
    return walk.problems.length > 0 ? { ok: false, problems: walk.problems } : { ok: true, value };
  } catch (error) {
    return unreadable(walk, error);
  }
}
