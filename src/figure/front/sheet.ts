import type { FrontAxis } from '../../job/job.js';
import type { FrontPoint } from '../../report/report.js';
import { inUnit } from '../../quantity/format.js';
import { shownUnit, type UnitSystem } from '../../quantity/register.js';
import { type Axis, type AxisKind, linearAxis, logAxis, partOf } from './axis.js';
import type { Box } from './box.js';

/** What mass is traded against and the mass, in the units that the view shows. */
export interface Shown {
  readonly value: number;
  readonly mass: number;
}

/** The two axes of a front and where they stand. */
export interface Sheet {
  readonly plot: Box;
  readonly x: Axis;
  readonly y: Axis;
}

/** The axis of mass reaches so many times higher than the heaviest that it must hold. */
const HEADROOM = 1.4;

/** The value of what is traded, in shown units. */
export function shownValue(value: number, against: FrontAxis, system: UnitSystem): number {
  if (against === 'cost') return value;
  const quantity = against === 'twist' ? 'angle' : 'length';
  return inUnit(value, quantity, shownUnit(quantity, system));
}

/** A point in shown units; null where it has no price to be drawn at. */
export function shownPoint(
  point: Pick<FrontPoint, 'mass' | 'twist' | 'outerDiameter' | 'cost'>,
  against: FrontAxis,
  system: UnitSystem,
): Shown | null {
  const value = { twist: point.twist, outerDiameter: point.outerDiameter, cost: point.cost }[against];
  if (value === null) return null;
  return { value: shownValue(value, against, system), mass: inUnit(point.mass, 'mass', shownUnit('mass', system)) };
}

/** What the axes must hold. */
export interface Held {
  /** each material's points, from tight to loose */
  readonly lines: readonly (readonly Shown[])[];
  readonly pick: Shown | null;
  /** value of the job's own limit */
  readonly limit: number | null;
}

/**
 * Axes from round to round that hold the pick, the job's limit and the loose end of every line. A line climbs without
 * end towards the tightest tube, so that the axis of mass ends above what it must hold, and the other where the lines
 * leave it.
 * @param massSteps about how many steps the axis of mass has
 */
export function axesFor({ lines, pick, limit }: Held, kind: AxisKind, massSteps: number): Pick<Sheet, 'x' | 'y'> {
  const ends = lines.flatMap((line) => line.at(-1) ?? []);
  const must = [...ends, ...(pick === null ? [] : [pick])];
  const masses = must.map(({ mass }) => mass);
  const all = lines.flat().map(({ mass }) => mass);
  const heaviest = Math.max(...masses, 0);
  const lightest = Math.min(...masses, ...all, heaviest);
  const y = linearAxis(
    lowerMass(lightest, heaviest),
    Math.min(HEADROOM * heaviest, Math.max(...all, heaviest) * 1.05),
    Math.max(massSteps, 2),
    0.5,
  );
  const inside = lines.flat().filter(({ mass }) => mass <= y.to);
  const values = [...must, ...inside].map(({ value }) => value).concat(limit === null ? [] : [limit]);
  const [low, high] = values.length === 0 ? [1, 10] : [Math.min(...values), Math.max(...values)];
  return { x: kind === 'log' && low > 0 ? logAxis(low, high) : linearAxis(low, high, 8), y };
}

/** A little under the lightest, and 0 where that is not far. */
function lowerMass(lightest: number, heaviest: number): number {
  const lower = lightest - 0.12 * (HEADROOM * heaviest - lightest);
  return lower < 0.15 * heaviest ? 0 : lower;
}

/** px of a value of what is traded. */
export function xOf({ plot, x }: Sheet, value: number): number {
  return plot.left + partOf(x, value) * (plot.right - plot.left);
}

/** px of a mass in shown units. */
export function yOf({ plot, y }: Sheet, mass: number): number {
  return plot.bottom - partOf(y, mass) * (plot.bottom - plot.top);
}
