import type { Job } from '../../src/job/job.js';
import type { Candidate, HeldResult, Report } from '../../src/report/report.js';

/** What the stations show. */
export interface Results {
  /** the job that the results belong to; while they come in, the new one */
  readonly job: Job;
  /** lightest first, those with no design last */
  readonly candidates: readonly Candidate[];
  readonly held: readonly HeldResult[];
  /** material ids whose candidate is of the job before this one */
  readonly old: ReadonlySet<string>;
  /** the whole report is here */
  readonly complete: boolean;
}

function byMass(one: Candidate, other: Candidate): number {
  return (one.design?.mass ?? Infinity) - (other.design?.mass ?? Infinity) || 0;
}

function mixed(report: Report | null, partial: readonly Candidate[], job: Job): Results {
  const fresh = new Map(partial.map((candidate) => [candidate.material, candidate]));
  const before = new Map((report?.candidates ?? []).map((candidate) => [candidate.material, candidate]));
  const ids = job.materials.map(({ id }) => id);
  const candidates = ids.flatMap((id) => fresh.get(id) ?? before.get(id) ?? []).sort(byMass);
  const old = new Set(ids.filter((id) => !fresh.has(id)));
  return { job, candidates, held: report?.held ?? [], old, complete: false };
}

/**
 * What is shown: the report as it is, or, for a run in flight, its candidates so far with those of the last report in
 * the places that are still to come.
 * @param partial candidates of the run in flight, in any order
 * @param job the job in flight; null where the report alone counts
 */
export function shownResults(report: Report | null, partial: readonly Candidate[], job: Job | null): Results | null {
  if (job !== null && (report !== null || partial.length > 0)) return mixed(report, partial, job);
  if (report === null) return null;
  const { candidates, held } = report;
  return { job: report.job, candidates, held, old: new Set(), complete: true };
}
