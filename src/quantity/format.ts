import { fromSI, toSI } from './convert.js';
import { QuantityError } from './error.js';
import { findUnit } from './lookup.js';
import { quantities, type Quantity, type QuantityName } from './register.js';
import type { Unit } from './units.js';

/**
 * How many figures are printed: at most so many significant ones, trailing zeros dropped; or so many decimals, zeros
 * kept; or, with neither, as few as read back to the same SI value (17 where none does, then within its last place or two).
 */
export type Figures =
  | { readonly significant: number; readonly decimals?: never }
  | { readonly decimals: number; readonly significant?: never }
  | { readonly significant?: never; readonly decimals?: never };

/** A value rounded to a stated side, and the text that reads back to it. */
export interface Rounded<Q extends QuantityName> {
  /** SI */
  readonly value: Quantity<Q>;
  readonly text: string;
}

/** '900 N·m': true minus sign, a space before the unit. The unit may be spelt in any way that parse reads. */
export function formatQuantity<Q extends QuantityName>(
  valueSI: Quantity<Q>,
  quantity: Q,
  unit: string,
  figures: Figures = {},
): string {
  const found = unitOf(quantity, unit);
  return withUnit(figuresOf(valueSI, fromFinite(valueSI, found), found, figures), found);
}

/** Number of the named units in an SI value. */
export function inUnit<Q extends QuantityName>(valueSI: Quantity<Q>, quantity: Q, unit: string): number {
  return fromSI(valueSI, unitOf(quantity, unit));
}

/** Least value of so many significant figures (1 to 15) in the unit that is not below valueSI. */
export function roundedUp<Q extends QuantityName>(
  valueSI: Quantity<Q>,
  quantity: Q,
  unit: string,
  significant: number,
): Rounded<Q> {
  return rounded(valueSI, unitOf(quantity, unit), significant, 1);
}

/** Greatest value of so many significant figures (1 to 15) in the unit that is not above valueSI. */
export function roundedDown<Q extends QuantityName>(
  valueSI: Quantity<Q>,
  quantity: Q,
  unit: string,
  significant: number,
): Rounded<Q> {
  return rounded(valueSI, unitOf(quantity, unit), significant, -1);
}

function unitOf(quantity: QuantityName, symbol: string): Unit {
  const unit = findUnit(symbol, quantity);
  if (unit === null) throw new QuantityError('unknown-unit', `"${symbol}" is no unit of ${quantities[quantity].noun}.`);
  return unit;
}

function fromFinite(valueSI: number, unit: Unit): number {
  const number = fromSI(valueSI, unit);
  if (!Number.isFinite(number)) throw new QuantityError('not-finite', `${valueSI} cannot be shown in ${unit.symbol}.`);
  return number;
}

function withUnit(figures: string, unit: Unit): string {
  return `${figures.replaceAll('-', '−')} ${unit.symbol}`;
}

function figuresOf(valueSI: number, number: number, unit: Unit, figures: Figures): string {
  if (figures.decimals !== undefined) return fixed(number, checked(figures.decimals, 0, 20));
  if (figures.significant !== undefined) return String(atMost(number, checked(figures.significant, 1, 17)));
  const exact = [15, 16].find((count) => toSI(atMost(number, count), unit) === valueSI);
  return String(exact === undefined ? number : atMost(number, exact));
}

function checked(count: number, least: number, most: number): number {
  if (Number.isInteger(count) && count >= least && count <= most) return count;
  throw new QuantityError('bad-digits', `${count} figures were asked for; ${least} to ${most} can be given.`);
}

function atMost(number: number, significant: number): number {
  return Number(number.toPrecision(significant)) + 0;
}

/** No sign on what has rounded to 0. */
function fixed(number: number, decimals: number): string {
  const text = number.toFixed(decimals);
  return Number(text) === 0 ? text.replace('-', '') : text;
}

/**
 * Cuts the figures off and tries the neighbours, from the wrong side on, until one lies on the stated side as it will
 * be read: conversion rounds too, so the comparison must be made on what the text gives back.
 */
function rounded(valueSI: number, unit: Unit, significant: number, side: 1 | -1): { value: number; text: string } {
  const number = fromFinite(valueSI, unit);
  const [head = '0', tail = '0'] = Math.abs(number).toExponential(16).split('e');
  const whole = Math.sign(number) * Number(head.replace('.', '').slice(0, checked(significant, 1, 15)));
  const exponent = Number(tail) - significant + 1;
  for (let step = -1; step <= 4; step += 1) {
    const candidate = Number(`${whole + side * step}e${exponent}`) + 0;
    const value = toSI(candidate, unit);
    const readable = Number.isFinite(value) && (value !== 0 || candidate === 0);
    if (readable && side * (value - valueSI) >= 0) return { value, text: withUnit(String(candidate), unit) };
  }
  throw new QuantityError('not-finite', `${valueSI} has no neighbour to be shown in ${unit.symbol}.`);
}
