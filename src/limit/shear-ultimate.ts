import type { Limit } from './check.js';
import { strengthChecks } from './strength.js';

/** Shear and direct stress against ultimate strength. */
export const shearUltimate: Limit = {
  id: 'shear-ultimate',
  label: 'shear ultimate',
  unit: 'Pa',
  formula: 'U = n_u·√((σ/Ftu)² + (τ/Fsu)²)/j, τ = T·ro/J, σ = |N|/A + M*·ro/I',
  source: 'Circular interaction, MIL-HDBK-5 §1.5.3 style (from memory); Fsu from the record',
  prepare: (job, metal) =>
    strengthChecks('shear-ultimate', job.loads, metal, job.tube.supportSpacing, (load) => ({
      factor: load.ultimateFactor,
      direct: metal.tensileUltimate,
      shear: metal.shearUltimate,
    })),
};
