import { readJob } from '../../src/job/read.js';
import { buildLibrary, buildStockLists, rowsById } from '../../src/material/library.js';
import { checkDesign } from '../../src/sizing/candidate.js';
import type { CheckAnswer, CheckArguments } from '../contract.js';
import { Refused } from './refused.js';
import type { Shipped } from './shipped.js';

/**
 * Checks single tubes against a job, beside whatever run is in flight: one point takes no longer than the reading of the
 * job, so that no worker is needed.
 * @throws Refused where the job has no such material
 */
export function tubeChecker({ records, stockLists }: Shipped): (args: CheckArguments) => CheckAnswer {
  const stock = rowsById(buildStockLists(stockLists));
  const library = buildLibrary(records, stock);
  return ({ job, material, outerDiameter, wall }) => {
    const read = readJob(job, library, stock);
    if (!read.ok) return { kind: 'refused', problems: read.problems };
    const metal = read.brief.job.materials.find(({ id }) => id === material);
    if (metal === undefined)
      throw new Refused({ code: 'bad-arguments', sentence: 'The material is none of this job.' });
    return { kind: 'checked', check: checkDesign(read.brief.job, metal, outerDiameter, wall) };
  };
}
