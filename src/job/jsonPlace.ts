import { clip } from '../material/problem.js';
import { JSON_NUMBER, JSON_STRING, JSON_WORD } from './jsonTokens.js';

/** The place of an index in a text, counted from 1: "line 3, column 14". */
export function lineAndColumn(text: string, index: number): string {
  const before = text.slice(0, index).split(/\r\n|\r|\n/);
  const last = before[before.length - 1] ?? '';
  const mark = before.length === 1 && last.startsWith('\uFEFF') ? 1 : 0;
  return `line ${before.length}, column ${last.length - mark + 1}`;
}

/** Slips that are common in JSON written by hand, and the sentence for each; the first that fits is told. */
const SLIPS: readonly (readonly [RegExp, string])[] = [
  [JSON_STRING, '$ is not due here'],
  [JSON_NUMBER, '$ is not due here'],
  [JSON_WORD, '$ is not due here'],
  [/\/[/*]|#/y, 'comments are not allowed'],
  [/[+-]?(?:NaN|Infinity|inf|nan)\b/y, '$ is not a number that JSON can hold'],
  [/'/y, 'text stands in single quotes, and JSON takes double quotes'],
  [/"(?:[^"\\\r\n]|\\[^\r\n])*(?=[\r\n]|$)/y, 'a text that starts here is not closed on its line'],
  [/"/y, 'a text that starts here holds a control character or an escape that JSON does not know'],
  [/[+-]?[\d.][\w.+-]*/y, '$ is not a number as JSON writes it'],
  [/[A-Za-z_]\w*/y, '$ stands without quotes'],
  [/[}\],:]/y, '"$" is not due here'],
];

function slipAt(text: string, index: number, [pattern, sentence]: readonly [RegExp, string]): string | null {
  pattern.lastIndex = index;
  const found = pattern.exec(text)?.[0];
  return found === undefined ? null : sentence.replace('$', () => clip(found));
}

/** What stands at an index where something else was due, in words. */
export function whatIsThere(text: string, index: number): string {
  if (index >= text.length) return 'the text ends too early';
  const slip = SLIPS.map((entry) => slipAt(text, index, entry)).find((sentence) => sentence !== null);
  return slip ?? `"${clip(String.fromCodePoint(text.codePointAt(index) ?? 0))}" is not due here`;
}
