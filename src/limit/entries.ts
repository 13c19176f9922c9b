import type { Job } from '../job/job.js';
import type { LimitEntry } from '../report/report.js';
import type { Section } from '../tube/section.js';
import type { Check } from './check.js';
import { METAL_LIMITS } from './index.js';

/** A limit governs within this of the fullest. */
const GOVERNS = 0.001;

const UNITS = new Map(METAL_LIMITS.map(({ id, unit }) => [id, unit]));

/** How full each limit is under each load at a size; where one limit has two sides, the fuller. */
export function limitEntries(job: Job, checks: readonly Check[], at: Section): LimitEntry[] {
  const entries = new Map<string, LimitEntry>();
  const fullest = Math.max(...checks.map((check) => check.utilisation(at)));
  for (const check of checks) {
    const entry = entryOf(job, check, at, fullest);
    const key = `${check.limit} ${String(check.load)}`;
    if (entry.utilisation >= (entries.get(key)?.utilisation ?? 0)) entries.set(key, entry);
  }
  return [...entries.values()];
}

function entryOf(job: Job, check: Check, at: Section, fullest: number): LimitEntry {
  const utilisation = check.utilisation(at);
  const { demand, capacity, interaction, unit } = check.pair(at);
  return {
    limit: check.limit,
    load: check.load === null ? null : (job.loads[check.load]?.name ?? null),
    demand,
    capacity,
    unit: unit ?? UNITS.get(check.limit) ?? '1',
    utilisation,
    margin: utilisation === 0 ? null : 1 / utilisation - 1,
    governs: utilisation >= fullest - GOVERNS,
    ...(interaction ? { interaction } : {}),
  };
}
