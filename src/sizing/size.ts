import type { Brief } from '../job/job.js';
import type { Candidate, Report } from '../report/report.js';
import { assemble } from './assemble.js';
import { checkHeld, sizeMaterial } from './candidate.js';
import type { OwnPoint } from './dominance.js';
import { frontOf } from './front.js';

/** What a run has just done: one material sized, or one material's front found, its points not yet held against others. */
export type Step =
  | { readonly kind: 'candidate'; readonly candidate: Candidate }
  | { readonly kind: 'front'; readonly material: string; readonly points: readonly OwnPoint[] };

/** Is told, as each material is begun, how many are done, of how many, and which is next. */
export type Progress = (done: number, of: number, material: string) => void;

/**
 * Sizes every material of a brief, then finds the fronts, then checks the designs in hand, a step at a time, so that
 * whoever runs it can show what there is and stop between steps. The same brief gives the same report, to the bit.
 */
export function* sizeSteps(brief: Brief): Generator<Step, Report, undefined> {
  const { job } = brief;
  const candidates: Candidate[] = [];
  for (const metal of job.materials) {
    const candidate = sizeMaterial(brief, metal);
    candidates.push(candidate);
    yield { kind: 'candidate', candidate };
  }
  const fronts = [];
  for (const [index, metal] of job.materials.entries()) {
    const points = frontOf(job, metal, candidates[index]?.design ?? null);
    fronts.push(...points);
    yield { kind: 'front', material: metal.id, points };
  }
  return assemble(brief, candidates, fronts, checkHeld(brief));
}

/** Sizes a brief in one go. */
export function sizeJob(brief: Brief, onProgress?: Progress): Report {
  const { materials } = brief.job;
  const of = 2 * materials.length;
  const steps = sizeSteps(brief);
  for (let done = 0; ; done++) {
    onProgress?.(done, of, materials[done % materials.length]?.name ?? '');
    const step = steps.next();
    if (step.done === true) return step.value;
  }
}
