import { inUnit } from '../quantity/format.js';
import { parseQuantity } from '../quantity/parse.js';
import { quantities, type QuantityName } from '../quantity/register.js';

/** Figures tried: 12 make short texts of what was entered, and 17 tell any two doubles apart. */
const FIGURES = [12, 13, 14, 15, 16, 17] as const;

/**
 * The shortest text "number unit" that `read` takes back to exactly `value`; null where rounding in the conversion lets
 * none of them do so.
 * @param number the value in the unit
 */
function exactText(value: number, number: number, unit: string, read: (text: string) => number): string | null {
  const texts = FIGURES.map((figures) => `${Number(number.toPrecision(figures))} ${unit}`);
  return texts.find((text) => read(text) === value) ?? null;
}

function readBack(text: string, quantity: QuantityName): number {
  const parsed = parseQuantity(text, quantity);
  return parsed.ok ? parsed.value : NaN;
}

/**
 * A value as a job file holds it: in `unit` where a text in it reads back to the same double, else in the SI unit, where
 * one always does.
 * @param value SI
 */
export function writeQuantity(value: number, quantity: QuantityName, unit: string): string {
  const read = (text: string): number => readBack(text, quantity);
  const { si } = quantities[quantity];
  return exactText(value, inUnit(value, quantity, unit), unit, read) ?? `${value} ${si}`;
}

/**
 * As `writeQuantity`, for a twist that may have been entered per length.
 * @param twist end to end, rad
 * @param unit of an angle or a twist per length
 * @param length by which the reader multiplies a twist per length, m
 */
export function writeTwist(twist: number, unit: string, length: number): string {
  const [angle = 'deg', ...per] = unit.split('/');
  const read = (text: string): number => readBack(text, 'twistRate') * length;
  const perLength = per.length === 0 ? null : exactText(twist, inUnit(twist / length, 'twistRate', unit), unit, read);
  return perLength ?? writeQuantity(twist, 'angle', angle);
}
