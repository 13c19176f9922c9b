import type { Job } from '../job/job.js';
import { prepareChecks } from '../limit/index.js';
import type { Metal } from '../material/material.js';
import type { LimitId } from '../report/report.js';
import { fits } from './solve.js';

/**
 * Limits that cannot be met together, though any of them could be left out: each is lifted in turn, and stays lifted
 * where nothing fits all the same (a deletion filter for an irreducible infeasible set; Chinneck & Dravnieks 1991, from
 * memory). Strength and the range of D/t are lifted first, so that what the user asked for stands out.
 */
export function conflict(job: Job, metal: Metal): LimitId[] {
  const order: readonly LimitId[] = [
    'diameter-to-wall',
    'wall-min',
    'column',
    'shear-ultimate',
    'shear-yield',
    'wall-buckling',
    'shear-allowable',
    'whirl',
    'bore',
    'twist',
    'outer-diameter',
  ];
  const present = new Set(prepareChecks(job, metal).map(({ limit }) => limit));
  const lifted = new Set<LimitId>();
  for (const limit of order.filter((id) => present.has(id))) {
    lifted.add(limit);
    if (fits(job, metal, { lifted })) lifted.delete(limit);
  }
  return [...present].filter((limit) => !lifted.has(limit));
}
