import type { Job } from '../job/job.js';
import type { Metal } from '../material/material.js';
import { bore } from './bore.js';
import type { Check, Limit } from './check.js';
import { column } from './column.js';
import { diameterToWall } from './diameter-to-wall.js';
import { outerDiameter } from './outer-diameter.js';
import { shearAllowable } from './shear-allowable.js';
import { shearUltimate } from './shear-ultimate.js';
import { shearYield } from './shear-yield.js';
import { twist } from './twist.js';
import { wallBuckling } from './wall-buckling.js';
import { wallMin } from './wall-min.js';
import { whirl } from './whirl.js';

/** Every limit on a metal tube, in the order in which reports list them. */
export const METAL_LIMITS: readonly Limit[] = [
  shearYield,
  shearUltimate,
  shearAllowable,
  twist,
  wallBuckling,
  column,
  whirl,
  wallMin,
  outerDiameter,
  bore,
  diameterToWall,
];

/** All checks that the job puts on a tube of this metal, limit by limit. */
export function prepareChecks(job: Job, metal: Metal): Check[] {
  return METAL_LIMITS.flatMap((limit) => limit.prepare(job, metal));
}
