import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { prepareChecks } from '../../../src/limit/index.js';
import { Kernel } from '../../../src/limit/kernel.js';
import { Box } from '../../../src/tube/box.js';
import { Section } from '../../../src/tube/section.js';
import { OUTWARD } from '../../../src/tube/span.js';
import { places, scenes, sizeIn, type Scene } from './scene.js';

const sectionAt = (scene: Scene, u: number, v: number): Section =>
  new Section(scene.metal.wallTolerance).set(...sizeIn(scene, u, v));

describe('Kernel', () => {
  it('says at a point what its checks say one by one', () => {
    fc.assert(
      fc.property(scenes, places, (scene, [u, v]) => {
        const checks = prepareChecks(scene.job, scene.metal);
        const kernel = new Kernel(checks);
        const at = sectionAt(scene, u, v);
        const most = Math.max(...checks.map((check) => check.utilisation(at)));
        expect(kernel.fullest(at) / most).toBeCloseTo(1, 12);
        const everyPlace = Array.from({ length: kernel.count }, (_, place) => kernel.utilisation(place, at));
        expect(Math.max(...everyPlace) / most).toBeCloseTo(1, 12);
      }),
      { numRuns: 1000 },
    );
  });

  it('takes an eased limit at its level, and no other', () => {
    fc.assert(
      fc.property(scenes, places, fc.integer({ min: 0, max: 30 }), (scene, [u, v], which) => {
        const checks = prepareChecks(scene.job, scene.metal);
        const { limit } = checks[which % checks.length]!;
        const at = sectionAt(scene, u, v);
        const eased = checks.map((check) => check.utilisation(at) / (check.limit === limit ? 1.25 : 1));
        expect(new Kernel(checks, { limit, by: 1.25 }).fullest(at) / Math.max(...eased)).toBeCloseTo(1, 12);
      }),
      { numRuns: 1000 },
    );
  });

  it('encloses every place over a box, value and slope', () => {
    fc.assert(
      fc.property(scenes, places, places, (scene, p, q) => {
        const kernel = new Kernel(prepareChecks(scene.job, scene.metal));
        const { outer, wall } = scene;
        kernel.bounds(
          new Box(scene.metal.wallTolerance, scene.job.tube.diameterToWallMin).set(
            outer[0],
            outer[1],
            wall[0],
            wall[1],
          ),
        );
        const [a, b] = [sizeIn(scene, ...p), sizeIn(scene, ...q)];
        const [dD, dt] = [Math.log(b[0] / a[0]), Math.log(b[1] / a[1])];
        kernel.spans.forEach((span, place) => {
          const before = kernel.utilisation(place, sectionAt(scene, ...p));
          const after = kernel.utilisation(place, sectionAt(scene, ...q));
          expect(before).toBeGreaterThanOrEqual(span.lo * (1 - OUTWARD));
          expect(before).toBeLessThanOrEqual(span.hi * (1 + OUTWARD));
          if (span.hi === 0) return;
          const least = Math.min(dD * span.dLo, dD * span.dHi) + Math.min(dt * span.tLo, dt * span.tHi);
          expect(Math.log(after / before)).toBeGreaterThanOrEqual(least - 1e-9);
        });
      }),
      { numRuns: 1000 },
    );
  });
});
