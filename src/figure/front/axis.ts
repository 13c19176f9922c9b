import { fixed } from '../decimals.js';

/** How an axis is divided. */
export type AxisKind = 'log' | 'linear';

/** A figure on an axis: the value in shown units and its text. */
export interface Tick {
  readonly value: number;
  readonly text: string;
}

/** An axis in shown units: where it begins and ends, and the round values that it may name, finest choice first. */
export interface Axis {
  readonly kind: AxisKind;
  readonly from: number;
  readonly to: number;
  /** sets of ticks from dense to sparse; the painter's room decides which is named */
  readonly choices: readonly (readonly Tick[])[];
}

/** Round leading figures at which a log axis may begin and end. */
const ROUND = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];

/** Leading figures that a log axis may name, from dense to sparse. */
const NAMED = [[1, 1.5, 2, 2.5, 3, 4, 5, 6, 8], [1, 2, 3, 5, 8], [1, 2, 5], [1, 3], [1]];

/** Round steps of a linear axis. */
const STEPS = [1, 2, 2.5, 5, 10];

/** Forgives what a quotient has lost when it is rounded to a whole number. */
const SLACK = 1e-9;

/** The round step that divides a range into about so many. */
export function roundStep(range: number, about: number): number {
  const raw = range / about;
  const decade = 10 ** Math.floor(Math.log10(raw));
  return decade * (STEPS.find((step) => step * decade >= raw * (1 - SLACK)) ?? 10);
}

/**
 * A linear axis that holds a range, from round to round.
 * @param about about how many steps it has
 * @param ends the part of a step at whose multiples it may begin and end: 1, or 1/2
 */
export function linearAxis(low: number, high: number, about: number, ends: 1 | 0.5 = 1): Axis {
  const [lo, hi] = opened(low, high);
  const step = roundStep(hi - lo, about);
  const from = Math.floor(lo / (step * ends) + SLACK) * step * ends;
  const to = Math.ceil(hi / (step * ends) - SLACK) * step * ends;
  return { kind: 'linear', from, to, choices: [1, 2, 5].map((times) => everyStep(from, to, step * times)) };
}

/** A log axis from round to round that holds a range of positive values. */
export function logAxis(low: number, high: number): Axis {
  const [lo, hi] = opened(low, high);
  const from = roundBelow(lo);
  const to = roundAbove(hi);
  const choices = NAMED.map((leading) => decadeTicks(from, to, leading)).filter((ticks) => ticks.length > 2);
  const even = everyStep(from, to, roundStep(to - from, 5)).filter(({ value }) => value > 0);
  return { kind: 'log', from, to, choices: choices.length > 0 ? choices : [even] };
}

/** A range with some breadth, where it has none of its own. */
function opened(low: number, high: number): readonly [number, number] {
  if (high > low * (1 + SLACK) && high > low) return [low, high];
  return low === 0 ? [0, 1] : [low * 0.9, high * 1.1];
}

function everyStep(from: number, to: number, step: number): readonly Tick[] {
  const first = Math.ceil(from / step - SLACK);
  const count = Math.floor(to / step + SLACK) - first + 1;
  const decimals = decimalsOf(step);
  return Array.from({ length: Math.max(count, 0) }, (_, i) => (first + i) * step).map((value) => ({
    value,
    text: fixed(value, decimals),
  }));
}

function decimalsOf(step: number): number {
  for (let decimals = 0; decimals < 12; decimals += 1)
    if (Math.abs(Number(step.toFixed(decimals)) - step) <= SLACK * step) return decimals;
  return 12;
}

function decadeTicks(from: number, to: number, leading: readonly number[]): readonly Tick[] {
  const ticks: Tick[] = [];
  for (let power = Math.floor(Math.log10(from)); 10 ** power <= to * (1 + SLACK); power += 1)
    for (const figure of leading) {
      const value = figure * 10 ** power;
      if (value >= from * (1 - SLACK) && value <= to * (1 + SLACK))
        ticks.push({ value, text: fixed(value, decimalsOf(value)) });
    }
  return ticks;
}

function roundBelow(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value));
  return decade * (ROUND.findLast((figure) => figure * decade <= value * (1 + SLACK)) ?? 1);
}

function roundAbove(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value));
  return decade * (ROUND.find((figure) => figure * decade >= value * (1 - SLACK)) ?? 10);
}

/** Where a value stands on an axis, as a part of its length. */
export function partOf({ kind, from, to }: Axis, value: number): number {
  if (kind === 'linear') return (value - from) / (to - from);
  return Math.log(value / from) / Math.log(to / from);
}
