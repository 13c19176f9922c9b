import type { Job } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { LimitEntry, LimitId, Relief } from '../report/report.js';
import { solve } from './solve.js';
import type { Size } from './stock.js';

/** A limit is full, and worth easing, above this utilisation. */
const FULL = 0.999;

/** What easing means here: the limit passes at U ≤ 1.01. */
const EASED_BY = 1.01;

/** For every full limit, the kilograms saved when it alone is relaxed by 1 % in every load case; most first. */
export function relief(job: Job, metal: Metal, size: Size, entries: readonly LimitEntry[]): Relief[] {
  const full = new Set<LimitId>(entries.filter(({ utilisation }) => utilisation > FULL).map(({ limit }) => limit));
  const reliefs = [...full].map((limit) => {
    const eased = solve(job, metal, { eased: { limit, by: EASED_BY } }, { start: size });
    return { limit, massSavedPerPercent: Math.max(0, size.mass - (eased.size?.mass ?? size.mass)) };
  });
  return reliefs.sort((a, b) => b.massSavedPerPercent - a.massSavedPerPercent);
}
