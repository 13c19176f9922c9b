import { fixed } from '../../src/figure/decimals.js';
import { inUnit } from '../../src/quantity/format.js';
import { shownUnit, type QuantityName, type UnitSystem } from '../../src/quantity/register.js';

/** The quantity that a limit's SI unit stands for; a limit without unit is a plain number. */
const QUANTITIES: Readonly<Record<string, QuantityName>> = {
  Pa: 'stress',
  rad: 'angle',
  'rad/s': 'rotationalSpeed',
  m: 'length',
  'N·m': 'torque',
  N: 'force',
};

/** Significant figures that the lesser of two numbers is given, and that the greater is not to exceed. */
const LESSER_FIGURES = 3;
const GREATER_FIGURES = 4;
const MOST_DECIMALS = 8;

/** Two values side by side, in one unit, decimals shared; the unit is '' for a plain number. */
export interface ShownPair {
  readonly first: string;
  readonly second: string;
  readonly unit: string;
}

/** A value in the unit of a limit, as the number and the unit that a view shows. */
export function shownNumber(
  value: number,
  unit: string,
  system: UnitSystem,
): { readonly number: number; readonly unit: string } {
  const quantity = QUANTITIES[unit];
  if (quantity === undefined) return { number: value, unit: '' };
  const shown = shownUnit(quantity, system);
  return { number: inUnit(value, quantity, shown), unit: shown };
}

/** Decimals that give a number so many significant figures, rounding into the next decade counted; 0 has none. */
function decimalsFor(number: number, significant: number): number {
  if (number === 0 || !Number.isFinite(number)) return 0;
  return significant - 1 - Math.floor(Math.log10(Math.abs(Number(number.toPrecision(significant)))));
}

function within(decimals: number): number {
  return Math.min(Math.max(decimals, 0), MOST_DECIMALS);
}

/** "900 / 1345 N·m" in its parts: three figures for the lesser, no more than four for the greater. */
export function pairText(first: number, second: number, unit: string, system: UnitSystem): ShownPair {
  const [a, b] = [shownNumber(first, unit, system), shownNumber(second, unit, system)];
  const sizes = [a.number, b.number].map(Math.abs).filter((size) => size > 0);
  const lesser = decimalsFor(Math.min(...sizes), LESSER_FIGURES);
  const greater = decimalsFor(Math.max(...sizes), GREATER_FIGURES);
  const decimals = within(Math.min(lesser, greater));
  return { first: fixed(a.number, decimals), second: fixed(b.number, decimals), unit: a.unit };
}

/** "3.00 to 3.03 deg" in its parts: as many decimals as a change of 1 % needs to be seen. */
export function changeText(from: number, to: number, unit: string, system: UnitSystem): ShownPair {
  const [a, b] = [shownNumber(from, unit, system), shownNumber(to, unit, system)];
  const decimals = within(decimalsFor(b.number - a.number, 1));
  return { first: fixed(a.number, decimals), second: fixed(b.number, decimals), unit: a.unit };
}

/** A number with so many significant figures, its zeros kept, and no exponent. */
export function figuresText(number: number, significant: number): string {
  return fixed(number, within(decimalsFor(number, significant)));
}

const SIGNS: Readonly<Record<string, string>> = { EUR: '€', USD: '$', GBP: '£' };

/** How a column of prices names its currency: the sign where there is a common one. */
export function currencySign(currency: string | null): string {
  return currency === null ? '' : (SIGNS[currency] ?? currency);
}

/** "€ 15.56"; the number alone where the job names no currency. */
export function moneyText(amount: number, currency: string | null): string {
  return `${currencySign(currency)} ${fixed(amount, 2)}`.trim();
}
