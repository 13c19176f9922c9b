import fc from 'fast-check';
import type { Job, LoadCase } from '../../../src/job/job.js';
import type { Metal } from '../../../src/material/material.js';
import { job, load, metal } from '../fixtures.js';

/** A job and the metal to make the tube of. */
export interface Task {
  readonly job: Job;
  readonly metal: Metal;
}

/** Uniform, in steps fine enough; fast-check's own doubles dwell on the tiniest. */
export const real = (min: number, max: number): fc.Arbitrary<number> =>
  fc.integer({ min: 0, max: 2 ** 30 }).map((i) => min + (max - min) * (i / 2 ** 30));

/** Uniform in the logarithm. */
export const logReal = (min: number, max: number): fc.Arbitrary<number> =>
  real(Math.log(min), Math.log(max)).map(Math.exp);

/** With a chance of one in `n` the value, else null. */
export const seldom = (n: number, value: fc.Arbitrary<number>): fc.Arbitrary<number | null> =>
  fc.oneof({ weight: 1, arbitrary: value }, { weight: n - 1, arbitrary: fc.constant(null) });

export const metals: fc.Arbitrary<Metal> = fc
  .record({
    youngsModulus: real(40e9, 220e9),
    poissonRatio: real(0.25, 0.36),
    density: real(1700, 8900),
    tensileYield: logReal(100e6, 1200e6),
    hardening: real(1.05, 1.6),
    wallMin: logReal(1e-4, 2e-3),
    wallTolerance: fc.constantFrom(0, 0, 0.05, 0.125),
    jointFactor: fc.constantFrom(1, 1, 0.8),
  })
  .map(({ hardening, ...own }) =>
    metal({
      ...own,
      shearModulus: own.youngsModulus / (2 * (1 + own.poissonRatio)),
      tensileUltimate: own.tensileYield * hardening,
      shearYield: own.tensileYield / Math.sqrt(3),
      shearUltimate: own.tensileYield * hardening * 0.6,
      compressiveYield: own.tensileYield,
    }),
  );

/** Shares are of the torque, so that neither thrust nor bending drowns it. */
const loads: fc.Arbitrary<LoadCase> = fc
  .record({
    torque: logReal(10, 1e5),
    hand: fc.constantFrom(-1, 1),
    bending: fc.oneof(fc.constant(0), real(0.02, 1)),
    axial: fc.oneof(fc.constant(0), real(-20, 20)),
    twistMax: seldom(2, logReal(0.01, 0.3)),
    shearStressMax: seldom(4, logReal(30e6, 200e6)),
    yieldFactor: real(1, 1.3),
    ultimateFactor: real(1.2, 2),
    bucklingFactor: real(1, 2),
  })
  .map(({ hand, torque, bending, axial, ...own }) =>
    load({ ...own, torque: hand * torque, bending: bending * torque, axial: axial * torque }),
  );

/**
 * A job of one to three loads on a tube of any ordinary size. Envelope, bore and speed are set about where they matter,
 * so that some jobs have no answer.
 */
export const tasks: fc.Arbitrary<Task> = fc
  .record({
    metal: metals,
    length: logReal(0.2, 6),
    spanShare: fc.oneof(fc.constant(1), real(0.3, 1)),
    loads: fc.array(loads, { minLength: 1, maxLength: 3 }),
    outerDiameterMax: seldom(3, real(0.6, 3)),
    outerDiameterMin: seldom(4, real(0.3, 1.6)),
    boreMin: seldom(4, real(0.4, 2)),
    wallMin: seldom(4, logReal(2e-4, 4e-3)),
    diameterToWallMin: fc.constantFrom(6, 6, 25),
    diameterToWallMax: fc.constantFrom(100, 600),
    speed: seldom(3, logReal(20, 1500)),
    knockdown: real(0.5, 1),
  })
  .map((x) => {
    // a diameter at which a wall of a twentieth would carry the largest torque at a third of yield
    const torque = Math.max(...x.loads.map((one) => Math.abs(one.torque)));
    const D = Math.cbrt((torque * 60) / (Math.PI * x.metal.shearYield));
    const times = (share: number | null): number | null => (share === null ? null : share * D);
    const tube = {
      length: x.length,
      supportSpacing: x.length * x.spanShare,
      outerDiameterMax: times(x.outerDiameterMax),
      outerDiameterMin: times(x.outerDiameterMin),
      boreMin: times(x.boreMin),
      wallMin: x.wallMin,
      diameterToWallMin: x.diameterToWallMin,
      diameterToWallMax: x.diameterToWallMax,
    };
    const named = x.loads.map((one, index) => ({ ...one, name: `load ${index}` }));
    const speed = x.speed === null ? null : { max: x.speed, margin: 1.25 };
    const buckling = { torsionKnockdown: x.knockdown, method: 'formula' } as const;
    return { metal: x.metal, job: job({ tube, loads: named, speed, buckling, materials: [x.metal] }) };
  });
