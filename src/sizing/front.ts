import type { FrontAxis, Job } from '../job/job.js';
import { limitEntries } from '../limit/entries.js';
import type { Metal } from '../material/material.js';
import type { Design } from '../report/report.js';
import { designOf } from './design.js';
import { beatenPoints, type OwnPoint, tradedOf } from './dominance.js';
import { ladder, OPEN_END } from './ladder.js';
import { least } from './least.js';
import { Problem } from './problem.js';
import { sizesOf, solve, tubesOf } from './solve.js';
import { passing, type Size } from './stock.js';
import { type Traded, tradedDiameter, tradedTwist } from './traded.js';

/**
 * The last rung stands this much before the least that any tube reaches: at the very end a single size is left, and
 * where a limit bends there its mass hangs on the last digits.
 */
const HAIR = 1e-4;

/** The front of one metal: its lightest tubes over a ladder of the traded quantity, or at its own price. */
export function frontOf(job: Job, metal: Metal, chosen: Design | null): OwnPoint[] {
  const { against } = job.front;
  const tubes = tubesOf(sizesOf(job, metal));
  if (against === 'cost') return costFront(job, metal, chosen);
  const traded = against === 'twist' ? tradedTwist(job, metal) : tradedDiameter(job);
  if (tubes === null) return rungs(job, metal, traded);
  const sizes = passing(new Problem(traded.free, metal), tubes);
  const own = new Problem(job, metal);
  return unbeaten(
    sizes.map((size) => pointOf(job, metal, size, traded.free, own)),
    against,
  );
}

/** One point, the lightest tube; from a priced list every size that no other beats. */
function costFront(job: Job, metal: Metal, chosen: Design | null): OwnPoint[] {
  const tubes = tubesOf(sizesOf(job, metal));
  const lightest = chosen === null ? [] : [{ ...chosen, pricePerMetre: null }];
  const own = new Problem(job, metal);
  const sizes: readonly Size[] = tubes === null ? lightest : passing(own, tubes);
  const points = sizes.map((size) => pointOf(job, metal, size, job, own));
  const priced = points.filter(({ cost }) => cost !== null);
  if (priced.length > 0) return unbeaten(priced, 'cost');
  return points.filter(({ mass, outerDiameter }) => mass === chosen?.mass && outerDiameter === chosen.outerDiameter);
}

function rungs(job: Job, metal: Metal, traded: Traded): OwnPoint[] {
  const free = solve(traded.free, metal);
  if (free.size === null) return [];
  const tightest = new Problem(traded.free, metal, { objective: traded.objective });
  const value = (size: { outerDiameter: number; wall: number }): number =>
    traded.objective.value(tightest.section.set(size.outerDiameter, size.wall));
  const first = value(free.size);
  const end = least(tightest, { start: free.size }).found;
  if (end === null) return [];
  const last = Math.max(end.value * (1 + HAIR), first * OPEN_END);
  const own = new Problem(job, metal);
  const points: OwnPoint[] = [];
  let start: { outerDiameter: number; wall: number } = free.size;
  for (const rung of last < first ? ladder(first, last) : [first]) {
    const at = traded.at(rung * (1 + 1e-12));
    const { size } = solve(at, metal, {}, { start });
    if (size === null) continue;
    start = size;
    points.push(pointOf(job, metal, size, at, own));
  }
  return points;
}

/** @param own the job's own problem, the same for every point of a front */
function pointOf(job: Job, metal: Metal, size: Size, rung: Job, own: Problem): OwnPoint {
  const { outerDiameter, wall, pricePerMetre } = size;
  const { mass, twist, cost } = designOf(job, metal, outerDiameter, wall, pricePerMetre);
  const meetsJob = own.passes(outerDiameter, wall);
  const checks = rung === job ? own.checks : new Problem(rung, metal).checks;
  const entries = limitEntries(rung, checks, own.section.set(outerDiameter, wall));
  const governs = entries.find((entry) => entry.governs)?.limit ?? 'wall-min';
  return { material: metal.id, mass, twist, outerDiameter, wall, layup: null, cost, governs, meetsJob };
}

/** The points that no other beats, from the loosest rung to the tightest. */
function unbeaten(points: readonly OwnPoint[], against: FrontAxis): OwnPoint[] {
  const beaten = beatenPoints(points, against);
  const traded = (point: OwnPoint): number => tradedOf(point, against) ?? 0;
  return points.filter((point) => !beaten.has(point)).sort((a, b) => traded(b) - traded(a));
}
