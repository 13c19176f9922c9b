/** Characters of a value that a message repeats. */
export const SHOWN_MAX = 60;

/** Control, format, private, unassigned and line-breaking characters, and lone surrogates. */
const HIDDEN = /[\p{C}\p{Zl}\p{Zp}]/u;

function escaped(character: string): string {
  return HIDDEN.test(character) ? `\\u{${(character.codePointAt(0) ?? 0).toString(16)}}` : character;
}

/** A text as a message repeats it: hidden characters escaped, at most SHOWN_MAX characters, then an ellipsis. */
export function clipped(text: string): string {
  let shown = '';
  for (const character of text.slice(0, SHOWN_MAX + 1)) {
    const next = escaped(character);
    if (shown.length + next.length > SHOWN_MAX) return `${shown.slice(0, SHOWN_MAX - 1)}…`;
    shown += next;
  }
  return shown;
}

/** Any value as a message repeats it: a text in quotation marks, a number bare, the rest by its kind. */
export function shownValue(value: unknown): string {
  if (typeof value === 'string') return `"${clipped(value)}"`;
  if (typeof value === 'number' || typeof value === 'boolean') return String(value);
  if (value === null) return 'null';
  if (value === undefined) return 'nothing';
  return Array.isArray(value) ? 'a list' : 'an object';
}
