import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ThrustedBending } from '../../../src/buckling/thrust.js';
import { WhirlSpeed } from '../../../src/limit/whirl.js';
import { Box } from '../../../src/tube/box.js';
import { Section } from '../../../src/tube/section.js';
import { OUTWARD, Span } from '../../../src/tube/span.js';
import { load, metal } from '../fixtures.js';

/** Where thrust takes all but 10^(−p) of the stiffness, what is left is a difference that has lost p digits. */
const soft = fc.record({
  D: fc.integer({ min: 10_000, max: 200_000 }).map((i) => i * 1e-6),
  slimness: fc.integer({ min: 6001, max: 100_000 }).map((i) => i * 1e-3),
  span: fc.integer({ min: 300, max: 4000 }).map((i) => i * 1e-3),
  tolerance: fc.integer({ min: 0, max: 200 }).map((i) => i * 1e-3),
  left: fc.integer({ min: 0, max: 6000 }).map((i) => 10 ** (-i * 1e-3)),
  torqueShare: fc.integer({ min: 0, max: 1000 }).map((i) => i * 1e-3),
});

const steel = metal();

describe('an enclosure where almost no stiffness is left', () => {
  it('still holds the whirl speed', () => {
    fc.assert(
      fc.property(soft, ({ D, slimness, span, tolerance, left, torqueShare }) => {
        const t = D / slimness;
        const section = new Section(tolerance).set(D, t);
        const bendingStiffness = steel.youngsModulus * section.secondMoment;
        const axial = -(1 - left) * (1 - torqueShare) * bendingStiffness * (Math.PI / span) ** 2;
        const torque = (Math.sqrt((1 - left) * torqueShare) * 2 * Math.PI * bendingStiffness) / span;
        const whirl = new WhirlSpeed(load({ axial, torque }), steel, span);
        const out = new Span();
        whirl.ratioOver(new Box(tolerance, 6).set(D, D, t, t), out);
        const speed = whirl.speed(section);
        expect(out.lo * speed).toBeLessThanOrEqual(1 + OUTWARD);
        expect(out.hi * speed).toBeGreaterThanOrEqual(1 - OUTWARD);
        expect(out.hi / out.lo).toBeLessThan(1 + 1e-12 + 3e-14 / left);
      }),
      { numRuns: 20_000 },
    );
  });

  it('still holds the amplified bending', () => {
    fc.assert(
      fc.property(soft, ({ D, slimness, span, tolerance, left }) => {
        const t = D / slimness;
        const section = new Section(tolerance).set(D, t);
        const thrust = (1 - left) * steel.youngsModulus * section.secondMoment * (Math.PI / span) ** 2;
        const bending = new ThrustedBending(100, thrust, steel.youngsModulus, span);
        const out = bending.momentOver(new Box(tolerance, 6).set(D, D, t, t), new Span());
        const moment = bending.moment(section);
        expect(out.lo / moment).toBeLessThanOrEqual(1 + OUTWARD);
        expect(out.hi / moment).toBeGreaterThanOrEqual(1 - OUTWARD);
        expect(out.hi / out.lo).toBeLessThan(1 + 1e-12 + 1e-14 / Math.max(left, 1e-3));
      }),
      { numRuns: 20_000 },
    );
  });
});
