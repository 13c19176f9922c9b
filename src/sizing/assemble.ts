import { jobDigest } from '../job/digest.js';
import type { Brief, Pick } from '../job/job.js';
import type { Candidate, HeldResult, Report } from '../report/report.js';
import { ENGINE_VERSION } from '../job/version.js';
import { type OwnPoint, withDominance } from './dominance.js';
import { preferred } from './stock.js';

/** The report of all materials that were sized, their fronts, and all designs in hand. */
export function assemble(
  { job }: Brief,
  sized: readonly Candidate[],
  fronts: readonly OwnPoint[],
  held: readonly HeldResult[],
): Report {
  const candidates = [...sized].sort(byMass);
  const { against } = job.front;
  return {
    format: 'wringwall-report',
    version: 1,
    engine: ENGINE_VERSION,
    jobDigest: jobDigest(job),
    units: 'SI: m, kg, s, N, Pa, rad',
    candidates,
    job,
    held,
    pick: pickOf(job.pick, candidates, held),
    front: { against, points: withDominance(fronts, against) },
  };
}

/** Lightest first; of one mass the smaller outer diameter, then the first listed; those with no design last. */
function byMass(a: Candidate, b: Candidate): number {
  if (a.design === null || b.design === null) return Number(a.design === null) - Number(b.design === null);
  if (preferred(a.design, b.design)) return -1;
  return preferred(b.design, a.design) ? 1 : 0;
}

/** The job's own pick where it has a design, else the lightest. */
function pickOf(pick: Pick | null, candidates: readonly Candidate[], held: readonly HeldResult[]): Pick | null {
  if (pick !== null && 'held' in pick && held.some(({ name }) => name === pick.held)) return pick;
  const feasible = candidates.filter((candidate) => candidate.feasible);
  if (pick !== null && 'material' in pick && feasible.some(({ material }) => material === pick.material)) return pick;
  const lightest = feasible[0];
  return lightest === undefined ? null : { material: lightest.material };
}
