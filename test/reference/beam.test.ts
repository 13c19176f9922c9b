import { describe, expect, it } from 'vitest';
import { prepareChecks } from '../../src/limit/index.js';
import { WhirlSpeed } from '../../src/limit/whirl.js';
import type { LoadCase } from '../../src/job/job.js';
import { Section } from '../../src/tube/section.js';
import { job, load, metal } from '../src/fixtures.js';
import { criticalThrust, criticalTorque, gauss, leftOfSquaredFrequency, naturalFrequency, type Shaft } from './beam.js';

/** A metal that never yields, so that columns stay elastic. */
const elastic = metal({ compressiveYield: 1e15 });
const SPAN = 2;

function sectionOf(D: number, t: number): Section {
  return new Section(0).set(D, t);
}

function shaftOf({ secondMoment, area }: Section, span: number): Shaft {
  const { youngsModulus, shearModulus, density, poissonRatio: nu } = elastic;
  const shearCoefficient = (2 * (1 + nu)) / (4 + 3 * nu);
  return {
    bending: youngsModulus * secondMoment,
    shear: shearCoefficient * shearModulus * area,
    massPerLength: density * area,
    rotaryInertia: density * secondMoment,
    span,
  };
}

/** U of the column limit under loads without a factor. */
function columnUtilisation(own: Partial<LoadCase>, at: Section): number {
  const tube = { ...job().tube, length: SPAN, supportSpacing: SPAN };
  const check = prepareChecks(job({ tube, loads: [load({ bucklingFactor: 1, ...own })] }), elastic).find(
    ({ limit }) => limit === 'column',
  );
  return check!.utilisation(at);
}

const SIZES = [
  [0.05, 0.002],
  [0.08, 0.012],
  [0.12, 0.0008],
] as const;

describe('the column limit', () => {
  it.each(SIZES)('is full at the thrust at which a shaft by finite differences buckles: %d × %d', (D, t) => {
    const at = sectionOf(D, t);
    const thrust = criticalThrust(shaftOf(at, SPAN));
    expect(columnUtilisation({ torque: 0, axial: -thrust }, at)).toBeCloseTo(1, 7);
  });

  it.each([0, 0.2, 0.5, 0.9])('is full at the torque at which it buckles, under %d of that thrust', (share) => {
    const at = sectionOf(0.05, 0.002);
    const shaft = shaftOf(at, SPAN);
    const thrust = share * criticalThrust(shaft);
    const torque = criticalTorque(shaft, thrust);
    expect(columnUtilisation({ torque, axial: -thrust }, at)).toBeCloseTo(1, 5);
    expect(columnUtilisation({ torque: -torque, axial: -thrust }, at)).toBeCloseTo(1, 5);
  });

  it('is proportional to load: at half of both it is half full', () => {
    const at = sectionOf(0.05, 0.002);
    const shaft = shaftOf(at, SPAN);
    const thrust = 0.5 * criticalThrust(shaft);
    const torque = criticalTorque(shaft, thrust);
    expect(columnUtilisation({ torque: torque / 2, axial: -thrust / 2 }, at)).toBeCloseTo(0.5, 5);
  });
});

describe('the first whirl speed', () => {
  const speed = (at: Section, span: number, own: Partial<LoadCase> = {}): number =>
    new WhirlSpeed(load({ torque: 0, ...own }), elastic, span).speed(at);

  it.each([
    [0.05, 0.002, 2],
    [0.08, 0.012, 1.5],
    [0.12, 0.0008, 0.9],
    [0.15, 0.003, 0.8],
  ])(
    'is that of a beam with shear and rotary inertia, but for the term that the formula drops: %d × %d, %d',
    (D, t, span) => {
      const at = sectionOf(D, t);
      const beam = naturalFrequency(shaftOf(at, span));
      const wave = (Math.PI / span) ** 2 * at.gyrationSquared;
      const { youngsModulus, shearModulus } = elastic;
      const dropped = wave * ((wave * youngsModulus) / (0.53 * shearModulus));
      // the quartic's ω⁴ left out: low by half the product of the two corrections, so on the safe side
      expect(speed(at, span)).toBeLessThanOrEqual(beam * (1 + 1e-8));
      expect(speed(at, span)).toBeGreaterThan(beam * (1 - 0.6 * dropped - 1e-8));
    },
  );

  it('needs both corrections: without them a short shaft would seem much faster', () => {
    const at = sectionOf(0.15, 0.003);
    const beam = naturalFrequency(shaftOf(at, 0.8));
    const plain = (Math.PI / 0.8) ** 2 * Math.sqrt((elastic.youngsModulus * at.gyrationSquared) / elastic.density);
    expect(plain / beam).toBeGreaterThan(1.1);
  });

  it.each([0.1, 0.5, 0.9])('falls under %d of the buckling thrust as that of a slender beam does', (share) => {
    const at = sectionOf(0.02, 0.001);
    const shaft = shaftOf(at, SPAN);
    const thrust = share * criticalThrust(shaft);
    const beam = naturalFrequency(shaft, thrust) / naturalFrequency(shaft);
    const engine = speed(at, SPAN, { axial: -thrust }) / speed(at, SPAN);
    // shear lowers the buckling thrust of this shaft by a few ten-thousandths, which the quotient 1 − P/P_E magnifies
    expect(Math.abs(engine / beam - 1)).toBeLessThan(2e-3 / (1 - share) / 2);
  });
});

describe('what torque and thrust leave of the whirl speed', () => {
  /** Share of ω₁² that is left, by the engine, under shares of T_cr and P_E. */
  function left(torqueShare: number, thrustShare: number): number {
    const at = sectionOf(0.02, 0.001);
    const { bending } = shaftOf(at, SPAN);
    const own = {
      torque: (torqueShare * 2 * Math.PI * bending) / SPAN,
      axial: (-thrustShare * Math.PI ** 2 * bending) / SPAN ** 2,
    };
    const speed = (loads: Partial<LoadCase>): number => new WhirlSpeed(load(loads), elastic, SPAN).speed(at);
    return (speed(own) / speed({ torque: 0 })) ** 2;
  }

  it.each([
    [0.2, 0],
    [0.5, 0],
    [0.8, 0],
    [0.95, 0],
    [0.2, 0.5],
    [0.5, 0.5],
    [0.3, 0.8],
  ])(
    'is a little less than a shaft by Galerkin’s method keeps, at %d of T_cr and %d of P_E',
    (torqueShare, thrustShare) => {
      const kept = leftOfSquaredFrequency(torqueShare, thrustShare);
      expect(left(torqueShare, thrustShare)).toBeLessThan(kept);
      expect(left(torqueShare, thrustShare)).toBeGreaterThan(0.75 * kept);
    },
  );

  it('is exact under thrust alone, and nothing where the shaft buckles', () => {
    expect(left(0, 0.6)).toBeCloseTo(leftOfSquaredFrequency(0, 0.6), 9);
    expect(Math.abs(leftOfSquaredFrequency(1, 0))).toBeLessThan(2e-4);
    expect(left(1, 0)).toBeLessThan(2e-6);
  });
});

describe('the section', () => {
  it.each(SIZES)('is what quadrature over its radius gives: %d × %d', (D, t) => {
    const at = sectionOf(D, t);
    const over = (f: (r: number) => number): number =>
      gauss(6).reduce((sum, { node, weight }) => sum + weight * (t / 2) * f(D / 2 - t / 2 + (node * t) / 2), 0);
    expect(at.area / over((r) => 2 * Math.PI * r)).toBeCloseTo(1, 12);
    expect(at.polarMoment / over((r) => 2 * Math.PI * r ** 3)).toBeCloseTo(1, 12);
    expect(at.secondMoment / over((r) => Math.PI * r ** 3)).toBeCloseTo(1, 12);
  });
});
