import { inUnit } from '../quantity/format.js';
import { shownUnit, type UnitSystem } from '../quantity/register.js';

/** Fewest and most decimals of a size in the unit that shows it: a drawing's zeros are kept, a free size is not cut short. */
const RANGES = {
  outerDiameter: { SI: { least: 1, most: 2 }, US: { least: 3, most: 4 } },
  wall: { SI: { least: 2, most: 3 }, US: { least: 3, most: 4 } },
} as const;

/** A size counts as shown whole where what is left out is below this fraction of it. */
const LEFT_OUT = 1e-6;

/** Text of a number with so many decimals, with a true minus and without the sign of what has rounded to 0. */
export function fixed(number: number, decimals: number): string {
  const text = number.toFixed(decimals);
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '−');
}

/** The decimals that all of these numbers share: the fewest in the range that show each of them whole, or the most. */
export function sharedDecimals(numbers: readonly number[], least: number, most: number): number {
  const whole = (decimals: number) => (number: number) =>
    Math.abs(Number(number.toFixed(decimals)) - number) <= LEFT_OUT * Math.abs(number);
  for (let decimals = least; decimals < most; decimals += 1) if (numbers.every(whole(decimals))) return decimals;
  return most;
}

/** Lengths, m, of one kind as a drawing or a column shows them: in the shown unit, without it, decimals shared. */
export function sizeTexts(
  lengths: readonly number[],
  kind: keyof typeof RANGES,
  system: UnitSystem,
): readonly string[] {
  const numbers = lengths.map((length) => inUnit(length, 'length', shownUnit('length', system)));
  const { least, most } = RANGES[kind][system];
  const decimals = sharedDecimals(numbers, least, most);
  return numbers.map((number) => fixed(number, decimals));
}
