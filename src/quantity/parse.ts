import { toSI } from './convert.js';
import { findUnit, nearestUnit, quantityOfUnit } from './lookup.js';
import { readNumber, TOO_LARGE, TOO_SMALL } from './number-text.js';
import { quantities, type Quantity, type QuantityName } from './register.js';
import { shownValue } from './shown.js';

/** Longer texts are refused unread. */
export const TEXT_MAX = 100;

export interface Refusal {
  readonly ok: false;
  /** a sentence to set after 'file: key.path: ', without a full stop */
  readonly message: string;
}

export interface Reading<Q extends QuantityName> {
  readonly ok: true;
  /** SI */
  readonly value: Quantity<Q>;
  /** symbol of the unit it was written in, as in the register */
  readonly unit: string;
}

export type Parsed<Q extends QuantityName> = Reading<Q> | Refusal;

export type ParsedOneOf<Q extends QuantityName> = (Reading<Q> & { readonly quantity: Q }) | Refusal;

/** What is wanted, for messages: 'a torque such as "900 N·m"', several joined by 'or'. */
export function expected(names: readonly QuantityName[]): string {
  return names.map((name) => `${quantities[name].noun} such as "${quantities[name].example}"`).join(' or ');
}

/**
 * Reads 'number unit' from a value of unknown origin. Never throws; a refusal says what was found and what was expected:
 * '"900 mm" is a length; expected a torque such as "900 N·m"'.
 */
export function parseQuantity<Q extends QuantityName>(value: unknown, quantity: Q): Parsed<Q> {
  const parsed = parseOneOf(value, [quantity]);
  return parsed.ok ? { ok: true, value: parsed.value, unit: parsed.unit } : parsed;
}

/** As parseQuantity, where several quantities will do; the first that has the unit is taken. */
export function parseOneOf<Q extends QuantityName>(value: unknown, names: readonly Q[]): ParsedOneOf<Q> {
  const read = readValue(value, names);
  if (typeof read !== 'string') return read;
  return { ok: false, message: `${shownValue(value)} ${read}; expected ${expected(names)}` };
}

/** The reading, or the fault in words. */
function readValue<Q extends QuantityName>(value: unknown, names: readonly Q[]): ParsedOneOf<Q> | string {
  if (typeof value === 'number') return 'has no unit';
  if (typeof value !== 'string') return 'is not a number with a unit';
  if (value.length > TEXT_MAX) return `is longer than ${TEXT_MAX} characters`;
  const text = value.trim();
  if (text === '') return 'is empty';
  const head = readNumber(text);
  if (!head.ok) return head.fault;
  const unitText = head.rest.trim();
  return unitText === '' ? 'has no unit' : readUnit(head.number, unitText, names);
}

function readUnit<Q extends QuantityName>(number: number, text: string, names: readonly Q[]): ParsedOneOf<Q> | string {
  for (const quantity of names) {
    const unit = findUnit(text, quantity);
    if (unit === null) continue;
    const value = toSI(number, unit);
    if (!Number.isFinite(value)) return TOO_LARGE;
    return value === 0 && number !== 0 ? TOO_SMALL : { ok: true, quantity, value, unit: unit.symbol };
  }
  return unitFault(text, names);
}

function unitFault(text: string, names: readonly QuantityName[]): string {
  const other = quantityOfUnit(text);
  if (other !== null) return `is ${quantities[other].noun}`;
  const near = nearestUnit(text, names);
  return near === null ? 'has an unknown unit' : `has an unknown unit (did you mean "${near}"?)`;
}
