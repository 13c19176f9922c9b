import { formatQuantity } from '../../src/quantity/format.js';
import { readNumber } from '../../src/quantity/number-text.js';
import { parseOneOf } from '../../src/quantity/parse.js';
import { shownUnit, type QuantityName, type UnitSystem } from '../../src/quantity/register.js';

/** What a field holds: a value of one of some quantities, a bare number, a price, or words. */
export type FieldKind = readonly QuantityName[] | 'number' | 'price' | 'text';

/** Units that belong to US practice alone; all others but those of angle and time are metric. */
const US_UNIT = /(?:^|[·/])(?:in|ft|thou|lbf?|kip|psi|ksi|Msi|oz)(?:$|[·/²³⁴])/;
/** Units that both systems use. */
const COMMON_UNIT = /^(?:rad|mrad|deg|arcmin|rev|rpm|rad\/s|Hz)$/;

/** Figures of a value that is shown in another unit than it was entered in. */
const CONVERTED_FIGURES = 5;

/** Whether a unit, by its symbol in the register, is at home in a system. */
export function isUnitOf(symbol: string, system: UnitSystem): boolean {
  return COMMON_UNIT.test(symbol) || US_UNIT.test(symbol) === (system === 'US');
}

function shownQuantity(text: string, names: readonly QuantityName[], system: UnitSystem): string {
  const parsed = parseOneOf(text, names);
  if (!parsed.ok || isUnitOf(parsed.unit, system)) return text;
  const unit = shownUnit(parsed.quantity, system);
  return formatQuantity(parsed.value, parsed.quantity, unit, { significant: CONVERTED_FIGURES });
}

function shownPrice(price: number): string {
  return Math.abs(price * 100 - Math.round(price * 100)) < 1e-6 ? price.toFixed(2) : String(price);
}

/**
 * The text in which a field shows what was entered: as it was typed where its unit is at home in the system, else
 * converted; what cannot be read stands as it is, with a true minus sign.
 */
export function shownText(entered: unknown, kind: FieldKind, system: UnitSystem): string {
  if (typeof entered === 'number') return kind === 'price' ? shownPrice(entered) : String(entered).replace('-', '−');
  if (typeof entered !== 'string') return '';
  if (typeof kind === 'string') return entered;
  return shownQuantity(entered, kind, system).replace(/^-/, '−');
}

/**
 * What the document holds for a field's text: a number for a bare number that can be read, else the text as typed, for
 * the engine to judge; undefined for an empty field.
 */
export function valueOf(text: string, kind: FieldKind): unknown {
  const own = text.trim();
  if (own === '') return undefined;
  if (kind !== 'number' && kind !== 'price') return own;
  const read = readNumber(own);
  return read.ok && read.rest.trim() === '' ? read.number : own;
}

const LEADING_NUMBER = /^([-+−]?)(\d*)(?:\.(\d*))?/;

/** The text with the last digit of its number moved by some steps; null where it does not begin with a number. */
export function stepped(text: string, steps: number): string | null {
  const found = LEADING_NUMBER.exec(text);
  const [head = '', sign = '', whole = '', decimals] = found ?? [];
  if (whole === '' && (decimals ?? '') === '') return null;
  const places = decimals?.length ?? 0;
  const number = Number(`${sign === '−' ? '-' : sign}${whole}.${decimals ?? ''}0`);
  const next = (number + steps / 10 ** places).toFixed(places);
  return (Number(next) === 0 ? next.replace('-', '') : next.replace('-', '−')) + text.slice(head.length);
}
