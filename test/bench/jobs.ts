import type { Job } from '../../src/job/job.js';
import type { Metal } from '../../src/material/material.js';
import { job, load, metal } from '../src/fixtures.js';

/** A job to be measured, with what optimum and proof may cost on it. */
export interface BenchJob {
  readonly name: string;
  readonly job: Job;
  readonly metal: Metal;
  /** evaluations: the target, and what is striven for */
  readonly target: number;
  readonly striving: number;
}

const STEEL = metal({ wallTolerance: 0.1 });
const ALLOY = metal({
  density: 2710,
  youngsModulus: 69e9,
  shearModulus: 26e9,
  poissonRatio: 0.33,
  tensileYield: 241e6,
  tensileUltimate: 290e6,
  shearYield: 139e6,
  shearUltimate: 186e6,
  compressiveYield: 234e6,
  wallMin: 0.7e-3,
  wallTolerance: 0.1,
});

const tube = (own: Partial<Job['tube']>): Job['tube'] => ({ ...job().tube, ...own });

/** Wall buckling and twist both full: where two limits cross. */
export const CORNER: BenchJob = {
  name: 'corner of two limits',
  job: job({ loads: [load({ torque: 800, twistMax: 0.02, shearStressMax: 120e6 })] }),
  metal: STEEL,
  target: 500,
  striving: 150,
};

/** Wall buckling alone, a smooth valley: no other limit touches its floor. */
export const SMOOTH: BenchJob = {
  name: 'smooth optimum, wall buckling alone',
  job: job({
    tube: tube({ length: 2, supportSpacing: 0.5 }),
    loads: [load({ torque: 1500, yieldFactor: 0.1, ultimateFactor: 0.1 })],
  }),
  metal: { ...ALLOY, wallMin: 0.1e-3 },
  target: 2000,
  striving: 400,
};

/** Torque, bending and thrust at once in two load cases, with a running speed: wall buckling governs, and is smooth. */
export const COMBINED: BenchJob = {
  name: 'combined loads',
  job: job({
    tube: tube({ length: 1.8, supportSpacing: 1.8, outerDiameterMax: 0.3 }),
    loads: [
      load({ torque: 620, axial: -12000, bending: 250, twistMax: 0.1 }),
      load({ torque: 1150, axial: -20000, bending: 500, yieldFactor: 0.5, ultimateFactor: 1 }),
    ],
    speed: { max: 250, margin: 1.3 },
  }),
  metal: ALLOY,
  target: 1200,
  striving: 500,
};

/** An envelope too small for the torque. */
export const NOTHING_FITS: BenchJob = {
  name: 'nothing fits',
  job: job({
    tube: tube({ outerDiameterMax: 0.03, boreMin: 0.02 }),
    loads: [load({ torque: 2500, twistMax: 0.1 })],
  }),
  metal: STEEL,
  target: 60,
  striving: 30,
};

export const FOUR_CASES: readonly BenchJob[] = [CORNER, SMOOTH, COMBINED, NOTHING_FITS];

/** Jobs on which single evaluations are timed. */
export const KERNEL_JOBS: readonly { readonly name: string; readonly job: Job; readonly metal: Metal }[] = [
  {
    name: 'pure torsion',
    job: job({
      tube: tube({ outerDiameterMax: 0.12, boreMin: 0.02 }),
      loads: [load({ torque: 800, twistMax: 0.02, shearStressMax: 120e6 })],
    }),
    metal: STEEL,
  },
  {
    name: 'combined loads',
    job: { ...COMBINED.job, loads: COMBINED.job.loads.slice(0, 1) },
    metal: ALLOY,
  },
  { name: 'two load cases', job: COMBINED.job, metal: ALLOY },
];

/** Twelve metals over the range that tubes are made of, each to have a front of its own. */
export function twelveMetals(): Metal[] {
  return Array.from({ length: 12 }, (_, i) => {
    const base = i % 2 === 0 ? STEEL : ALLOY;
    const strength = 0.7 + 0.12 * i;
    return {
      ...base,
      id: `metal-${String(i)}`,
      tensileYield: base.tensileYield * strength,
      tensileUltimate: base.tensileUltimate * strength,
      shearYield: base.shearYield * strength,
      shearUltimate: base.shearUltimate * strength,
      compressiveYield: base.compressiveYield * strength,
    };
  });
}

const TORQUE_AND_TWIST: Job = job({
  tube: tube({ length: 1.5, supportSpacing: 1.5, outerDiameterMax: 0.12 }),
  loads: [load({ torque: 900, twistMax: 0.05 })],
});

/** Jobs whose fronts are drawn for every metal; the first is the one that counts. */
export const FRONT_JOBS: readonly { readonly name: string; readonly job: Job; readonly counts: boolean }[] = [
  { name: 'torque, twist and an envelope, against twist', job: TORQUE_AND_TWIST, counts: true },
  {
    name: 'the same against outer diameter',
    job: { ...TORQUE_AND_TWIST, front: { against: 'outerDiameter' } },
    counts: true,
  },
  { name: 'combined loads in two cases, against twist', job: COMBINED.job, counts: false },
];
