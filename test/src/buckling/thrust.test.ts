import { describe, expect, it } from 'vitest';
import { ThrustedBending } from '../../../src/buckling/thrust.js';
import { Box } from '../../../src/tube/box.js';
import { Section } from '../../../src/tube/section.js';
import { Span } from '../../../src/tube/span.js';

const E = 210e9;
const L = 2;
const section = new Section(0).set(0.06, 0.002);
const euler = (Math.PI ** 2 * E * section.secondMoment) / L ** 2;
const amplified = (share: number): number => new ThrustedBending(100, share * euler, E, L).moment(section);

describe('ThrustedBending', () => {
  it.each([
    [0, 100],
    [0.25, 400 / 3],
    [0.5, 200],
    [0.9, 1000],
  ])('turns 100 N·m at %d of the critical thrust to %d N·m', (share, moment) => {
    expect(amplified(share)).toBeCloseTo(moment, 9);
  });

  it('stays at a thousandfold from 0.999 of the critical thrust on', () => {
    expect(amplified(0.9989)).toBeLessThan(100_000);
    for (const share of [0.999, 1, 1.5, 1000]) expect(amplified(share)).toBeCloseTo(100_000, 6);
  });

  it('has no slope over a box in which it is held throughout, and both ends where it is held in part', () => {
    const held = new ThrustedBending(100, 100 * euler, E, L);
    const box = new Box(0, 6).set(0.058, 0.062, 0.002, 0.0021);
    const out = held.momentOver(box, new Span());
    expect([out.dLo, out.dHi, out.tLo, out.tHi].map(Math.abs)).toEqual([0, 0, 0, 0]);
    expect(out.lo).toBe(out.hi);
    const partly = new ThrustedBending(100, euler, E, L).momentOver(box, out);
    expect(partly.hi).toBeCloseTo(100_000, 6);
    expect(Math.abs(partly.dHi)).toBe(0);
    expect(partly.dLo).toBeLessThan(-999);
  });

  it('is plain bending over any box without thrust', () => {
    const out = new ThrustedBending(100, 0, E, L).momentOver(new Box(0, 6).set(0.05, 0.06, 0.001, 0.002), new Span());
    expect([out.lo, out.hi, out.dLo, out.dHi, out.tLo, out.tHi]).toEqual([100, 100, 0, 0, 0, 0]);
  });
});
