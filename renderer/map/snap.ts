import type { Axis } from '../../src/figure/axis.js';
import type { MapAxes } from '../../src/figure/mapAxes.js';
import type { MapPoint } from '../../src/sizing/mapScale.js';

/** Steps in the distance between two marks of an axis. */
const STEPS = 100;

/** Least D/t of a tube on trial: there must be a bore. */
const SLIMMEST = 2.05;

/** A size in whole hundredths of the axis's step, never none. */
function rounded(size: number, { step, unit }: Axis, by = 0): number {
  const fine = step / unit / STEPS;
  const count = Math.max(Math.round(size / unit / fine) + by, 1);
  return Number((count * fine * unit).toPrecision(12));
}

/** The tube nearest to a place that can be tried: a listed one, or one of round sizes; null where it is no tube. */
export function snapped(place: MapPoint, axes: MapAxes, stock: readonly MapPoint[] | null): MapPoint | null {
  if (stock !== null) return nearest(place, axes, stock);
  const tube = { outerDiameter: rounded(place.outerDiameter, axes.outer), wall: rounded(place.wall, axes.wall) };
  return tube.outerDiameter > SLIMMEST * tube.wall ? tube : null;
}

/** The next tube a step away, or, of a list, the next listed one that way; the same tube where there is none. */
export function stepped(
  from: MapPoint,
  [outer, wall]: readonly [number, number],
  axes: MapAxes,
  stock: readonly MapPoint[] | null,
): MapPoint {
  if (stock !== null) return nextListed(from, outer, wall, stock);
  const tube = {
    outerDiameter: outer === 0 ? from.outerDiameter : rounded(from.outerDiameter, axes.outer, outer),
    wall: wall === 0 ? from.wall : rounded(from.wall, axes.wall, wall),
  };
  return tube.outerDiameter > SLIMMEST * tube.wall ? tube : from;
}

function nearest({ outerDiameter, wall }: MapPoint, axes: MapAxes, stock: readonly MapPoint[]): MapPoint | null {
  const away = (size: MapPoint): number =>
    Math.hypot(
      (size.outerDiameter - outerDiameter) / (axes.outer.hi - axes.outer.lo),
      (size.wall - wall) / (axes.wall.hi - axes.wall.lo),
    );
  return sizeOf(
    stock.reduce<MapPoint | null>((best, size) => (best !== null && away(best) <= away(size) ? best : size), null),
  );
}

/** Of the listed sizes that way, the nearest in that size, then in the other. */
function nextListed(from: MapPoint, outer: number, wall: number, stock: readonly MapPoint[]): MapPoint {
  const onwards = (size: MapPoint): number =>
    outer !== 0
      ? Math.sign(outer) * (size.outerDiameter / from.outerDiameter - 1)
      : Math.sign(wall) * (size.wall / from.wall - 1);
  const aside = (size: MapPoint): number =>
    Math.abs(outer !== 0 ? size.wall / from.wall - 1 : size.outerDiameter / from.outerDiameter - 1);
  const that = stock.filter((size) => onwards(size) > 1e-9);
  const cost = (size: MapPoint): number => onwards(size) + 4 * aside(size);
  return (
    sizeOf(
      that.reduce<MapPoint | null>((best, size) => (best !== null && cost(best) <= cost(size) ? best : size), null),
    ) ?? from
  );
}

/** The bare size of a listed tube. */
function sizeOf(size: MapPoint | null): MapPoint | null {
  return size === null ? null : { outerDiameter: size.outerDiameter, wall: size.wall };
}
