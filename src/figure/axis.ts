import { fixed } from './decimals.js';

/** A mark on an axis, SI, with its figure. */
export interface Tick {
  readonly value: number;
  readonly text: string;
}

/** An axis between round values; SI. */
export interface Axis {
  readonly lo: number;
  readonly hi: number;
  readonly log: boolean;
  /** what the figures count in, SI */
  readonly unit: number;
  /** from one mark to the next, SI; on a logarithmic axis the least such step */
  readonly step: number;
  readonly ticks: readonly Tick[];
}

const ROUND = [1, 2, 5, 10] as const;
/** Marks in a decade, the first set that gives enough of them. */
const DECADES = [
  [1, 2, 5],
  [1, 1.5, 2, 3, 4, 5, 6, 8],
  [1, 1.2, 1.4, 1.6, 1.8, 2, 2.5, 3, 3.5, 4, 4.5, 5, 5.5, 6, 6.5, 7, 7.5, 8, 8.5, 9, 9.5],
] as const;
const ENOUGH = 5;

/** The round number (1, 2 or 5 times a power of ten) that is at least this. */
export function roundStep(least: number): number {
  const decade = 10 ** Math.floor(Math.log10(least) + 1e-9);
  const times = ROUND.find((one) => one * decade >= least * (1 - 1e-9)) ?? 10;
  return clean(times * decade);
}

/** Decimals that a round step needs. */
export function stepDecimals(step: number): number {
  return Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
}

/**
 * A linear axis over [lo, hi] whose ends are half steps.
 * @param unit what the figures count in, SI
 * @param most steps at most
 */
export function linearAxis(lo: number, hi: number, unit: number, most: number): Axis {
  const step = roundStep((hi - lo) / unit / most);
  const half = step / 2;
  const from = Math.max(0, Math.floor(lo / unit / half + 1e-9)) * half;
  const to = Math.ceil(hi / unit / half - 1e-9) * half;
  const first = Math.ceil(from / step - 1e-9);
  const count = Math.floor(to / step + 1e-9) - first + 1;
  const decimals = stepDecimals(step);
  const numbers = Array.from({ length: count }, (_, i) => clean((first + i) * step));
  const ticks = numbers
    .filter((number) => number > 0)
    .map((number) => ({ value: number * unit, text: fixed(number, decimals) }));
  return { lo: clean(from) * unit, hi: clean(to) * unit, log: false, unit, step: step * unit, ticks };
}

/** A logarithmic axis over [lo, hi], 0 < lo < hi, whose ends are marks. */
export function logAxis(lo: number, hi: number, unit: number): Axis {
  const sets = DECADES.map((set) => logNumbers(lo / unit, hi / unit, set));
  const numbers = sets.find((set) => set.length > ENOUGH) ?? sets[sets.length - 1] ?? [];
  const ticks = numbers.map((number) => ({ value: number * unit, text: String(number) }));
  const [from = lo / unit, to = hi / unit] = [numbers[0], numbers[numbers.length - 1]];
  return { lo: from * unit, hi: to * unit, log: true, unit, step: roundStep(from / 10) * unit, ticks };
}

/** The marks from the last that is not over lo to the first that is not under hi. */
function logNumbers(lo: number, hi: number, set: readonly number[]): number[] {
  const [first, last] = [Math.floor(Math.log10(lo)) - 1, Math.ceil(Math.log10(hi)) + 1];
  const decades = Array.from({ length: last - first + 1 }, (_, i) => first + i);
  const all = decades.flatMap((power) => set.map((times) => clean(times * 10 ** power)));
  const from = all.findLastIndex((number) => number <= lo * (1 + 1e-9));
  return all.slice(from, all.findIndex((number) => number >= hi * (1 - 1e-9)) + 1);
}

/** Without the dust of binary fractions. */
function clean(number: number): number {
  return Number(number.toPrecision(12));
}
