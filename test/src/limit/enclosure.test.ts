import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Check } from '../../../src/limit/check.js';
import { METAL_LIMITS, prepareChecks } from '../../../src/limit/index.js';
import { Box } from '../../../src/tube/box.js';
import { Section } from '../../../src/tube/section.js';
import { OUTWARD, Span } from '../../../src/tube/span.js';
import { places, scenes, sizeIn, type Scene } from './scene.js';

/** Runs of each property; every run looks at a dozen or more checks. */
const RUNS = 4000;

type Size = readonly [number, number];

function boxOf({ job, metal, outer, wall }: Scene): Box {
  return new Box(metal.wallTolerance, job.tube.diameterToWallMin).set(outer[0], outer[1], wall[0], wall[1]);
}

function at(scene: Scene, [D, t]: Size): Section {
  return new Section(scene.metal.wallTolerance).set(D, t);
}

/** Where value or slope falls short, in words; an empty list if the enclosure holds. */
function breaches(check: Check, box: Box, scene: Scene, sizes: readonly Size[]): string[] {
  const span = new Span();
  check.bound(box, span);
  const values = sizes.map((size) => check.utilisation(at(scene, size)));
  const said: string[] = [];
  const say = (what: string): void => void said.push(`${check.limit}: ${what}, box ${JSON.stringify(span)}`);
  values.forEach((u, i) => {
    const inside = u >= span.lo * (1 - OUTWARD) && u <= span.hi * (1 + OUTWARD);
    if (!inside) say(`U = ${u} at ${sizes[i]!.join(' × ')} lies outside`);
  });
  const grown = Math.log(values[1]! / values[0]!);
  const dD = Math.log(sizes[1]![0] / sizes[0]![0]);
  const dt = Math.log(sizes[1]![1] / sizes[0]![1]);
  const least = Math.min(dD * span.dLo, dD * span.dHi) + Math.min(dt * span.tLo, dt * span.tHi);
  const most = Math.max(dD * span.dLo, dD * span.dHi) + Math.max(dt * span.tLo, dt * span.tHi);
  if (!(grown >= least - 1e-9 && grown <= most + 1e-9)) say(`ln U grew by ${grown}, not ${least} to ${most}`);
  return said;
}

describe('the enclosure of every limit over a box', () => {
  it('holds every value and every slope inside', () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(scenes, fc.array(places, { minLength: 2, maxLength: 6 }), (scene, inside) => {
        const box = boxOf(scene);
        const sizes = inside.map(([u, v]) => sizeIn(scene, u, v));
        const checks = prepareChecks(scene.job, scene.metal);
        checks.forEach((check) => seen.add(check.limit));
        expect(checks.flatMap((check) => breaches(check, box, scene, sizes))).toEqual([]);
      }),
      { numRuns: RUNS },
    );
    expect([...seen].sort()).toEqual(METAL_LIMITS.map((limit) => limit.id).sort());
  });

  it('is the value itself, and one gradient, over a box without width', () => {
    const box = (scene: Scene, [D, t]: Size): Box =>
      new Box(scene.metal.wallTolerance, scene.job.tube.diameterToWallMin).set(D, D, t, t);
    fc.assert(
      fc.property(scenes, places, (scene, [u, v]) => {
        const size = sizeIn(scene, u, v);
        const span = new Span();
        for (const check of prepareChecks(scene.job, scene.metal)) {
          const value = check.utilisation(at(scene, size));
          check.bound(box(scene, size), span);
          // what thrust leaves of the stiffness is a difference: soft.test.ts holds it to its own digits
          const slack = check.limit === 'whirl' ? 1e-7 : 1e-11;
          expect(span.lo / value, check.limit).toBeGreaterThan(1 - slack);
          expect(span.hi / value, check.limit).toBeLessThan(1 + slack);
          expect(Math.abs(span.dHi - span.dLo), check.limit).toBeLessThan(100 * slack * (1 + Math.abs(span.dLo)));
          expect(Math.abs(span.tHi - span.tLo), check.limit).toBeLessThan(100 * slack * (1 + Math.abs(span.tLo)));
        }
      }),
      { numRuns: RUNS },
    );
  });

  it('knows nothing of sizes too stout to be tubes', () => {
    const box = new Box(0, 6).set(0.02, 0.06, 0.001, 0.01);
    expect(box.slimLo).toBe(6);
    expect(box.slimHi).toBe(60);
    expect(box.meanRadius.lo).toBeCloseTo(0.01 * (1 - 1 / 6), 15);
  });
});
