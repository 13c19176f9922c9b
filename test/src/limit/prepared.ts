import type { Job } from '../../../src/job/job.js';
import type { Check, Limit } from '../../../src/limit/check.js';
import type { Metal } from '../../../src/material/material.js';
import { Section } from '../../../src/tube/section.js';
import { job, metal } from '../fixtures.js';

/** 60 × 3 mm, D/t = 20, at its nominal wall. */
export const at = new Section(0).set(0.06, 0.003);

/** The one check that a job puts on a metal under one limit. */
export function only(limit: Limit, own: Partial<Job>, record: Metal = metal()): Check {
  const checks = limit.prepare(job(own), record);
  if (checks[0] === undefined || checks.length > 1) throw new Error(`${checks.length} checks, not one`);
  return checks[0];
}

/** A job's tube with some of its fields set. */
export const tube = (own: Partial<Job['tube']>): Partial<Job> => ({ tube: { ...job().tube, ...own } });
