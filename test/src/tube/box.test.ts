import { describe, expect, it } from 'vitest';
import { Box } from '../../../src/tube/box.js';
import { Section } from '../../../src/tube/section.js';
import type { Span } from '../../../src/tube/span.js';

const QUANTITIES = [
  'meanRadius',
  'area',
  'gyrationSquared',
  'secondMoment',
  'polarMoment',
  'perSecondMoment',
  'shearPerTorque',
] as const;

/** Central difference of ln q in ln D or in ln t. */
function slope(of: (D: number, t: number) => number, D: number, t: number, along: 'D' | 't'): number {
  const h = 1e-5;
  const [d, w] = along === 'D' ? [h, 0] : [0, h];
  return Math.log(of(D * Math.exp(d), t * Math.exp(w)) / of(D * Math.exp(-d), t * Math.exp(-w))) / (2 * h);
}

const expectSlopes = (span: Span, of: (D: number, t: number) => number, D: number, t: number): void => {
  expect(span.dLo).toBeCloseTo(slope(of, D, t, 'D'), 8);
  expect(span.dHi).toBeCloseTo(span.dLo, 13);
  expect(span.tLo).toBeCloseTo(slope(of, D, t, 't'), 8);
  expect(span.tHi).toBeCloseTo(span.tLo, 13);
};

describe.each([
  [0.06, 0.01, 0],
  [0.06, 0.01, 0.125],
  [0.09, 0.0005, 0.1],
])('a box of no width at %d × %d m, tolerance %d', (D, t, tolerance) => {
  const box = new Box(tolerance, 6).set(D, D, t, t);
  const section = new Section(tolerance);

  it.each(QUANTITIES)('has the value and the gradient of %s', (name) => {
    expect(box[name].lo / section.set(D, t)[name]).toBeCloseTo(1, 14);
    expect(box[name].hi / section.set(D, t)[name]).toBeCloseTo(1, 14);
    expectSlopes(box[name], (d, w) => section.set(d, w)[name], D, t);
  });

  it('has the value and the gradient of the thickness tc/r', () => {
    const thickness = (d: number, w: number): number => section.set(d, w).checkedWall / section.meanRadius;
    expect(box.thickness.lo / thickness(D, t)).toBeCloseTo(1, 14);
    expectSlopes(box.thickness, thickness, D, t);
  });
});

describe('a box with width', () => {
  const box = new Box(0, 6).set(0.05, 0.1, 0.001, 0.002);
  const section = new Section(0);

  it.each(QUANTITIES)('reaches no further than its corners for %s', (name) => {
    const corners = [0.05, 0.1].flatMap((D) => [0.001, 0.002].map((t) => section.set(D, t)[name]));
    const least = Math.min(...corners);
    const most = Math.max(...corners);
    expect(box[name].lo).toBeLessThanOrEqual(least * (1 + 1e-14));
    expect(box[name].hi).toBeGreaterThanOrEqual(most * (1 - 1e-14));
    // r and t are taken as if they did not move together, and ro as if it did not move with I: that costs some room
    const room = name === 'shearPerTorque' ? 2.2 : 1.1;
    expect(least / box[name].lo).toBeLessThan(room);
    expect(box[name].hi / most).toBeLessThan(room);
  });

  it('has its range of D/t from its corners, and none below the slimmest wall', () => {
    expect([box.slimLo, box.slimHi]).toEqual([25, 100]);
    const stout = new Box(0, 6).set(0.01, 0.02, 0.01, 0.02);
    expect([stout.slimLo, stout.slimHi]).toEqual([6, 6]);
  });
});
