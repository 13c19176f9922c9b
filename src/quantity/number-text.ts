/** A number read from the head of a text, or what is wrong with it, as a message goes on after the value. */
export type NumberText =
  | { readonly ok: true; readonly number: number; readonly rest: string }
  | { readonly ok: false; readonly fault: string };

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/;
const OTHER_BASE = /^[+-]?0(?:[xX][\dA-Fa-f]|[bB][01]|[oO][0-7])/;
const THOUSANDS = /^(?:[\s'’_]\d{3})+(?!\d)/;
/** More figures straight after the number; '1/min' is a unit and is spared. */
const MORE_FIGURES = /^(?:[.'’_/]\d|\s+(?!1\s*\/\s*[a-z])[+-]?\.?\d)/;

function fault(text: string): NumberText {
  return { ok: false, fault: text };
}

function faultAfter(rest: string): string | null {
  if (/^,\d{3}(?!\d)/.test(rest))
    return 'has a comma in its number: use a point for decimals and no thousands separators';
  if (/^,\d/.test(rest)) return 'has a decimal comma: use a point';
  if (rest.startsWith(',')) return 'has a comma after its number';
  if (THOUSANDS.test(rest)) return 'has a thousands separator: write the figures together';
  return MORE_FIGURES.test(rest) ? 'is not one decimal number with one unit' : null;
}

/** Some figure of the number itself, exponent apart, is not 0. */
function isNonzero(figures: string): boolean {
  return /[1-9]/.test(figures.split(/[eE]/)[0] ?? '');
}

/**
 * Reads decimal or exponent notation with a point; the true minus sign is read as well as the hyphen. A number that
 * doubles cannot hold is a fault, not infinity or 0.
 */
export function readNumber(text: string): NumberText {
  const signs = text.replace(/^\u2212/, '-').replace(/^([^a-zA-Z]*[eE])\u2212/, '$1-');
  if (OTHER_BASE.test(signs)) return fault('is not in decimal notation');
  const figures = NUMBER.exec(signs)?.[0];
  if (figures === undefined) return fault('does not begin with a number');
  const rest = signs.slice(figures.length);
  const after = faultAfter(rest);
  if (after !== null) return fault(after);
  const number = Number(figures);
  if (!Number.isFinite(number)) return fault(TOO_LARGE);
  return number === 0 && isNonzero(figures) ? fault(TOO_SMALL) : { ok: true, number, rest };
}

export const TOO_LARGE = 'is too large a number';
export const TOO_SMALL = 'is too small a number to be told from 0';
