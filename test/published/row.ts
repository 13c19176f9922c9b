import { parseOneOf } from '../../src/quantity/parse.js';
import { quantityNames } from '../../src/quantity/register.js';
import type { Engine } from './engine.js';

/** "75 MPa", or a bare number for what has no dimension. */
export type Input = string | number;

type Values<I extends Record<string, Input>> = { readonly [K in keyof I]: number };

/** One published value as it stands in its source. */
interface Published<I extends Record<string, Input>> {
  readonly id: string;
  /** the document with its table or equation, or 'common practice, no source'; and 'from memory' where it is */
  readonly source: string;
  readonly inputs: I;
  /** as printed; its tolerance is half a unit in the last digit printed */
  readonly expected: string;
  /**
   * Where the source's formula is another than the engine's: what the engine's value is known to be over the expected
   * one. Held from both sides, to half a unit in its last digit.
   */
  readonly offset?: string;
  /** the expected value by hand from the inputs, SI: checks the table */
  readonly hand: (x: Values<I>) => number;
  /** the same value by the engine, SI */
  readonly code: (x: Values<I>, engine: Engine) => number;
}

/** A value with the most that it may be out, both SI. */
export interface Printed {
  readonly value: number;
  readonly tolerance: number;
}

export interface Row {
  readonly id: string;
  readonly source: string;
  readonly expected: Printed;
  readonly offset: Printed | null;
  hand(): number;
  code(engine: Engine): number;
}

/** SI value of a text with a unit. */
export function si(input: Input): number {
  if (typeof input === 'number') return input;
  const parsed = parseOneOf(input, quantityNames);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
}

/** "80.53 kN·m" → 80 530 ± 5 N·m: half a unit in the last digit printed. */
export function printed(text: string): Printed {
  const [number = '', ...unit] = text.split(' ');
  const [digits = '', exponent = '0'] = number.split('e');
  const decimals = digits.split('.')[1]?.length ?? 0;
  const scale = unit.length === 0 ? 1 : si(`1 ${unit.join(' ')}`);
  return { value: Number(number) * scale, tolerance: 0.5 * 10 ** (Number(exponent) - decimals) * scale };
}

export function row<const I extends Record<string, Input>>(published: Published<I>): Row {
  const { id, source, inputs, expected, offset, hand, code } = published;
  const values = Object.fromEntries(Object.entries(inputs).map(([key, input]) => [key, si(input)])) as Values<I>;
  return {
    id,
    source,
    expected: printed(expected),
    offset: offset === undefined ? null : printed(offset),
    hand: () => hand(values),
    code: (engine) => code(values, engine),
  };
}

/** The half unit itself is a rounding either way, and binary fractions may fall a hair beyond it. */
const HAIR = 1 + 1e-9;

/** How a value misses what is printed, in words; null where it agrees. */
function miss(value: number, { value: wanted, tolerance }: Printed): string | null {
  return Math.abs(value - wanted) <= tolerance * HAIR ? null : `${value}, not ${wanted} ± ${tolerance}`;
}

/** How the table disagrees with itself. */
export function tableMiss(row: Row): string | null {
  return miss(row.hand(), row.expected);
}

/** How the engine disagrees with the table. */
export function codeMiss(row: Row, engine: Engine): string | null {
  const value = row.code(engine);
  return row.offset === null ? miss(value, row.expected) : miss(value / row.expected.value, row.offset);
}
