import type { Limit } from './check.js';
import { strengthChecks } from './strength.js';

/** Shear and direct stress against yield. */
export const shearYield: Limit = {
  id: 'shear-yield',
  label: 'shear yield',
  unit: 'Pa',
  formula: 'U = n_y·√((σ/Fty)² + (τ/Fsy)²)/j, τ = T·ro/J, σ = |N|/A + M*·ro/I',
  source:
    'Circular interaction, MIL-HDBK-5 §1.5.3 style (from memory); Fsy = Fty/√3 (von Mises) unless the record says',
  prepare: (job, metal) =>
    strengthChecks('shear-yield', job.loads, metal, job.tube.supportSpacing, (load) => ({
      factor: load.yieldFactor,
      direct: metal.tensileYield,
      shear: metal.shearYield,
    })),
};
