import { inUnit } from '../quantity/format.js';
import { shownUnit, type UnitSystem } from '../quantity/register.js';
import type { TubeSpec } from '../job/job.js';
import type { MapPoints } from '../sizing/mapPoints.js';
import type { MapPoint, MapWindow } from '../sizing/mapScale.js';
import { type Axis, linearAxis, logAxis } from './axis.js';

/** The axes of a wall map. */
export interface MapAxes {
  readonly outer: Axis;
  readonly wall: Axis;
  readonly window: MapWindow;
}

/** How far the axes reach past the sizes that a map is drawn about, as factors. */
const AROUND = { outerLess: 0.45, outerMore: 1.16, wallMore: 2.15, others: 1.12 } as const;
/** The same on logarithmic axes. */
const AROUND_LOG = { outerLess: 0.5, outerMore: 1.3, wallLess: 0.25, wallMore: 4, others: 1.12 } as const;
/** A size further from the optimum than this factor is left off the map. */
const FAR = 1.7;
const MOST_STEPS = 9;

/**
 * Axes that hold the optimum, or what stands in for it, with room about it, and whatever else belongs there: the optimum
 * without the envelope, the envelope, designs in hand (no more than hold them: to hold one that is seen moves nothing). They change with the job alone.
 */
export function mapAxes(
  { optimum, without, instead }: MapPoints,
  tube: TubeSpec,
  held: readonly MapPoint[],
  system: UnitSystem,
  log: boolean,
): MapAxes {
  const middle = optimum === null ? (instead.length > 0 ? instead : [fallback(tube)]) : [optimum];
  const [least, most] = [Math.min(...middle.map(outerOf)), Math.max(...middle.map(outerOf))];
  const near = (without === null ? [] : [without.size]).filter((size) => isNear(size, middle));
  const inHand = held.filter((size) => isNear(size, middle));
  const envelope = [tube.outerDiameterMax, tube.outerDiameterMin].filter((size) => size !== null);
  const shown = optimum === null ? envelope : envelope.filter((size) => size < FAR * most && size > least / FAR);
  const { outerLess, outerMore, wallMore, others } = log ? AROUND_LOG : AROUND;
  const besides = [...near.map(outerOf), ...shown];
  const outerLo = Math.min(least * outerLess, ...besides.map((size) => size / others), ...inHand.map(outerOf));
  const outerHi = Math.max(most * outerMore, ...besides.map((size) => size * others), ...inHand.map(outerOf));
  const wallHi = Math.max(
    ...middle.map(({ wall }) => wall * wallMore),
    ...near.map(({ wall }) => wall * others),
    ...inHand.map(({ wall }) => wall),
  );
  const unit = 1 / inUnit(1, 'length', shownUnit('length', system));
  const wallLo = Math.min(...[...middle, ...near, ...inHand].map(({ wall }) => wall)) * AROUND_LOG.wallLess;
  const outer = log ? logAxis(outerLo, outerHi, unit) : linearAxis(outerLo, outerHi, unit, MOST_STEPS);
  const wall = log ? logAxis(wallLo, wallHi, unit) : linearAxis(0, wallHi, unit, MOST_STEPS);
  return { outer, wall, window: { outerLo: outer.lo, outerHi: outer.hi, wallLo: wall.lo, wallHi: wall.hi, log } };
}

function outerOf({ outerDiameter }: MapPoint): number {
  return outerDiameter;
}

function isNear({ outerDiameter, wall }: MapPoint, middle: readonly MapPoint[]): boolean {
  return middle.some(
    (one) =>
      outerDiameter < FAR * one.outerDiameter &&
      outerDiameter > one.outerDiameter / (2 * FAR) &&
      wall < 2 * FAR * one.wall,
  );
}

/** Where the job gives nothing to go by. */
function fallback({ outerDiameterMax }: TubeSpec): MapPoint {
  const outerDiameter = outerDiameterMax ?? 0.1;
  return { outerDiameter, wall: outerDiameter / 20 };
}
