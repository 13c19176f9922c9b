import type { FrontAxis, Job } from '../../src/job/job.js';
import type { FrontPoint, Report } from '../../src/report/report.js';
import { type OwnPoint, withDominance } from '../../src/sizing/dominance.js';

/** Every material's front as it is shown. */
export interface ShownFront {
  /** the job that the fronts belong to; while they come in, the new one */
  readonly job: Job;
  readonly against: FrontAxis;
  readonly points: readonly FrontPoint[];
}

/**
 * What is shown: the report's fronts as they are, or, for a run in flight, those found so far with those of the last
 * report in the places that are still to come, all held against one another.
 * @param partial the fronts of the run in flight by material
 * @param job the job in flight; null where the report alone counts
 */
export function shownFront(
  report: Report | null,
  partial: ReadonlyMap<string, readonly OwnPoint[]>,
  job: Job | null,
): ShownFront | null {
  if (job === null) return report === null ? null : { job: report.job, ...report.front };
  const { against } = job.front;
  const before = report?.front.against === against ? report.front.points : [];
  const points = job.materials.flatMap(({ id }) => partial.get(id) ?? before.filter(({ material }) => material === id));
  return { job, against, points: withDominance(points, against) };
}
