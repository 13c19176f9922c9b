import fc from 'fast-check';
import type { Job, LoadCase } from '../../../src/job/job.js';
import type { Metal } from '../../../src/material/material.js';
import { job, load, metal } from '../fixtures.js';

/** A job, its metal, and a box of sizes [D0, D1] × [t0, t1], m, at least part of which are tubes. */
export interface Scene {
  readonly job: Job;
  readonly metal: Metal;
  readonly outer: readonly [number, number];
  readonly wall: readonly [number, number];
}

/** Uniform, in steps fine enough; fast-check's own doubles dwell on the tiniest. */
const real = (min: number, max: number): fc.Arbitrary<number> =>
  fc.integer({ min: 0, max: 2 ** 30 }).map((i) => min + (max - min) * (i / 2 ** 30));

/** Uniform in the logarithm. */
const logReal = (min: number, max: number): fc.Arbitrary<number> =>
  real(Math.log(min), Math.log(max)).map((x) => Math.min(max, Math.max(min, Math.exp(x))));

export const metals: fc.Arbitrary<Metal> = fc
  .record({
    youngsModulus: real(40e9, 220e9),
    poissonRatio: real(0.2, 0.4),
    isotropy: real(0.9, 1.1),
    density: real(1700, 8900),
    tensileYield: logReal(50e6, 1600e6),
    hardening: real(1, 2.5),
    ultimateShare: real(0.5, 0.7),
    yieldShare: real(0.4, 0.65),
    compressiveShare: real(0.6, 1.1),
    wallMin: real(0, 2e-3),
    wallTolerance: fc.oneof(fc.constant(0), real(0, 0.2)),
    jointFactor: fc.oneof(fc.constant(1), real(0.4, 1)),
  })
  .map(({ isotropy, hardening, ultimateShare, yieldShare, compressiveShare, ...own }) =>
    metal({
      ...own,
      shearModulus: (isotropy * own.youngsModulus) / (2 * (1 + own.poissonRatio)),
      tensileUltimate: own.tensileYield * hardening,
      shearYield: own.tensileYield * yieldShare,
      shearUltimate: own.tensileYield * hardening * ultimateShare,
      compressiveYield: own.tensileYield * compressiveShare,
    }),
  );

/** A share of some critical load: none, ordinary, or so near to it that stiffness all but vanishes. */
const share = (most: number): fc.Arbitrary<number> =>
  fc.oneof(
    { weight: 2, arbitrary: fc.constant(0) },
    { weight: 4, arbitrary: real(0.01, most) },
    { weight: 1, arbitrary: fc.tuple(fc.constantFrom(-1, 1), real(-8, -2)).map(([sign, p]) => 1 + sign * 10 ** p) },
  );

/** Shares of the loads at which a tube at the box's slim corner would fail in one way or another. */
const shares = fc.record({
  torque: fc.oneof(
    { weight: 1, arbitrary: fc.constant(0) },
    { weight: 5, arbitrary: fc.tuple(fc.constantFrom(-1, 1), logReal(1e-3, 3)).map(([hand, size]) => hand * size) },
  ),
  whirling: share(1.2),
  bending: fc.oneof(fc.constant(0), real(0.01, 2)),
  thrust: share(1.2),
  tension: fc.oneof({ weight: 3, arbitrary: fc.constant(0) }, { weight: 1, arbitrary: real(0.01, 1) }),
  longTwist: fc.boolean(),
  yieldFactor: real(1, 2),
  ultimateFactor: real(1, 3),
  bucklingFactor: real(1, 3),
  twistMax: fc.option(logReal(1e-3, 1)),
  shearStressMax: fc.option(logReal(10e6, 500e6)),
});

type Shares = typeof shares extends fc.Arbitrary<infer S> ? S : never;

interface Corner {
  readonly metal: Metal;
  readonly span: number;
  readonly D: number;
  readonly t: number;
}

function loadOf(
  x: Shares,
  { metal: { youngsModulus, tensileYield, shearYield, wallTolerance }, span, D, t }: Corner,
): LoadCase {
  const ri = D / 2 - t * (1 - wallTolerance);
  const I = (Math.PI / 4) * ((D / 2) ** 4 - ri ** 4);
  const A = Math.PI * ((D / 2) ** 2 - ri ** 2);
  const euler = (Math.PI ** 2 * youngsModulus * I) / span ** 2;
  const shearing = (shearYield * 2 * I) / (D / 2);
  const greenhill = (2 * Math.PI * youngsModulus * I) / span;
  const { twistMax, shearStressMax, yieldFactor, ultimateFactor, bucklingFactor } = x;
  return load({
    torque: x.longTwist ? x.whirling * greenhill : x.torque * shearing,
    bending: (x.bending * tensileYield * I) / (D / 2),
    axial: x.thrust > 0 ? -x.thrust * euler : x.tension * tensileYield * A,
    twistMax,
    shearStressMax,
    yieldFactor,
    ultimateFactor,
    bucklingFactor,
  });
}

/** How much larger the box's upper sizes are than the lower: from 1 + 1e-6 to 30. */
const growth = real(-6, Math.log10(Math.log(30))).map((p) => Math.exp(10 ** p));

export const scenes: fc.Arbitrary<Scene> = fc
  .record({
    metal: metals,
    length: logReal(0.05, 20),
    spanShare: fc.oneof(fc.constant(1), real(0.2, 1)),
    D: logReal(5e-3, 0.5),
    slimmest: fc.constantFrom(2.5, 6, 20),
    slimness: logReal(1, 60),
    loads: fc.array(shares, { minLength: 1, maxLength: 2 }),
    growD: growth,
    growT: growth,
    knockdown: real(0.3, 1),
    speed: fc.option(real(10, 2000)),
    envelope: fc.option(real(0.5, 2)),
  })
  .map((x) => {
    const D = x.D * x.growD;
    const t = x.D / (x.slimmest * x.slimness);
    const span = x.length * x.spanShare;
    const corner = { metal: x.metal, span, D, t };
    const tube = {
      length: x.length,
      supportSpacing: span,
      outerDiameterMax: x.envelope === null ? null : D * x.envelope,
      outerDiameterMin: x.envelope === null ? null : D / (3 * x.envelope),
      boreMin: x.envelope === null ? null : (D * x.envelope) / 4,
      wallMin: x.envelope === null ? null : t * x.envelope,
      diameterToWallMin: x.slimmest,
      diameterToWallMax: 600,
    };
    const scene = job({
      tube,
      loads: x.loads.map((one) => loadOf(one, corner)),
      speed: x.speed === null ? null : { max: x.speed, margin: 1.25 },
      buckling: { torsionKnockdown: x.knockdown, method: 'formula' },
    });
    return { job: scene, metal: x.metal, outer: [x.D, D], wall: [t, t * x.growT] };
  });

/** A size in the box, m: D and t by their shares of its logarithmic width, t no thicker than makes a tube. */
export function sizeIn(scene: Scene, u: number, v: number): readonly [number, number] {
  const [D0, D1] = scene.outer;
  const [t0, t1] = scene.wall;
  const D = Math.min(D1, D0 * (D1 / D0) ** u);
  const thickest = Math.min(t1, D / scene.job.tube.diameterToWallMin);
  return [D, Math.min(thickest, t0 * (thickest / t0) ** v)];
}

/** A place in the unit square, its corners and edges more often than chance would. */
export const places = fc.tuple(
  fc.oneof({ weight: 1, arbitrary: fc.constantFrom(0, 1) }, { weight: 3, arbitrary: real(0, 1) }),
  fc.oneof({ weight: 1, arbitrary: fc.constantFrom(0, 1) }, { weight: 3, arbitrary: real(0, 1) }),
);
