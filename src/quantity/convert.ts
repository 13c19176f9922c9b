import type { Ratio } from './ratio.js';

/** SI value of a number of units; never −0. */
export function toSI(number: number, unit: Ratio): number {
  return (number * unit.times) / unit.over + 0;
}

/** Number of units of an SI value; never −0. */
export function fromSI(valueSI: number, unit: Ratio): number {
  return (valueSI * unit.over) / unit.times + 0;
}
