import type { Job } from '../job/job.js';
import type { Check } from '../limit/check.js';
import { prepareChecks } from '../limit/index.js';
import type { Metal } from '../material/material.js';
import type { LimitId } from '../report/report.js';
import { Section } from '../tube/section.js';
import { rims } from './mapRim.js';
import type { Polyline } from './chain.js';
import { Level } from './level.js';
import { type MapPoint, MapScale, type MapWindow } from './mapScale.js';
import { Problem } from './problem.js';
import { sizesOf, tubesOf } from './solve.js';
import { Tracer } from './trace.js';

/** One piece of a boundary; what is forbidden lies to its left as the diameter goes right and the wall goes up. */
export interface Branch {
  readonly points: readonly MapPoint[];
  /** it comes back to its beginning, which is not repeated */
  readonly closed: boolean;
}

/** Where one limit, or one side of a limit that has two, is exactly full. */
export interface MapCurve {
  readonly limit: LimitId;
  /** what the limit demands, SI, where that is one number for the whole curve; else null */
  readonly demand: number | null;
  /** whether that is a least value, not a greatest */
  readonly atLeast: boolean;
  /** it closes the region somewhere in the window */
  readonly closing: boolean;
  /** empty where the limit is not full anywhere in the window */
  readonly branches: readonly Branch[];
}

/** A ring of the region, with the limit that closes it from each point to the next; null along the rim of the window. */
export interface Ring {
  readonly points: readonly MapPoint[];
  readonly limits: readonly (LimitId | null)[];
}

/** A size of the stock list, and whether it passes. */
export interface StockPoint extends MapPoint {
  readonly fits: boolean;
}

/** The design space of one metal: every limit's boundary in a window of sizes, and where all limits pass. */
export interface DesignMap {
  readonly window: MapWindow;
  /** in the order of the limits; boundaries reach a little past the window */
  readonly curves: readonly MapCurve[];
  /** rings of the region, inside the window; a ring in a ring is a hole */
  readonly region: readonly Ring[];
  /** listed sizes in the window; null where any size may be had */
  readonly stock: readonly StockPoint[] | null;
}

/** Traces the design space of one metal over a window, to a thousandth of its axes and better. */
export function designMap(job: Job, metal: Metal, window: MapWindow): DesignMap {
  const checks = prepareChecks(job, metal);
  const scale = new MapScale(window);
  const sides = sidesOf(checks).map((side) => ({ side, level: new Level(side) }));
  const region = new Level([...checks, ...rims(window)]);
  const tracer = new Tracer(scale, new Section(metal.wallTolerance), metal.wallTolerance);
  const traced = tracer.trace([...sides.map(({ level }) => level), region]);
  const linesOf = (level: Level): readonly Polyline[] => traced.get(level) ?? [];
  const rings = linesOf(region);
  const closing = new Set(rings.flatMap(({ points }) => points.map(({ check }) => region.checks[check])));
  return {
    window,
    curves: sides.map(({ side, level }) => ({
      ...demandOf(side),
      closing: side.some((check) => closing.has(check)),
      branches: linesOf(level).map((line) => branchOf(line, scale)),
    })),
    region: rings.map((line) => ringOf(line, scale, checks)),
    stock: stockOf(job, metal, window),
  };
}

/** One limit's checks under all loads together; where they hold the size itself from two sides, each side alone. */
function sidesOf(checks: readonly Check[]): readonly (readonly [Check, ...Check[]])[] {
  const sides = new Map<string, [Check, ...Check[]]>();
  for (const check of checks) {
    const key = check.load === null ? `${check.limit} ${String(check.proportion?.measure)}` : check.limit;
    const side = sides.get(key);
    if (side === undefined) sides.set(key, [check]);
    else side.push(check);
  }
  return [...sides.values()];
}

/** Any tube will do to ask a check what it compares. */
const ANY = new Section(0).set(0.1, 0.01);
const OTHER = new Section(0).set(0.2, 0.013);

/** What a limit demands, if it is the same all over: its demand where that is the least, its capacity where it is the greatest. */
function demandOf(side: readonly [Check, ...Check[]]): Pick<MapCurve, 'limit' | 'demand' | 'atLeast'> {
  const [first] = side;
  const { limit } = first;
  const own = (check: Check, at: Section): [number, number] => {
    const { demand, capacity, interaction } = check.pair(at);
    return interaction ? [Number.NaN, Number.NaN] : [demand, capacity];
  };
  const same = (place: 0 | 1): boolean =>
    side.every(
      (check) =>
        own(check, ANY)[place] === own(first, ANY)[place] && own(check, ANY)[place] === own(check, OTHER)[place],
    );
  if (same(1)) return { limit, demand: own(first, ANY)[1], atLeast: false };
  if (same(0)) return { limit, demand: own(first, ANY)[0], atLeast: true };
  return { limit, demand: null, atLeast: false };
}

function branchOf({ points, closed }: Polyline, scale: MapScale): Branch {
  return { points: points.map((place) => pointOf(place, scale)), closed };
}

function ringOf({ points }: Polyline, scale: MapScale, checks: readonly Check[]): Ring {
  return {
    points: points.map((place) => pointOf(place, scale)),
    limits: points.map(({ check }) => checks[check]?.limit ?? null),
  };
}

function pointOf({ x, y }: { readonly x: number; readonly y: number }, scale: MapScale): MapPoint {
  return { outerDiameter: scale.outer.at(x), wall: scale.wall.at(y) };
}

function stockOf(job: Job, metal: Metal, { outerLo, outerHi, wallLo, wallHi }: MapWindow): StockPoint[] | null {
  const tubes = tubesOf(sizesOf(job, metal));
  if (tubes === null) return null;
  const problem = new Problem(job, metal);
  return tubes
    .filter(({ outerDiameter: d, wall: t }) => d >= outerLo && d <= outerHi && t >= wallLo && t <= wallHi)
    .map(({ outerDiameter, wall }) => ({ outerDiameter, wall, fits: problem.passes(outerDiameter, wall) }));
}
