import { describe, expect, it } from 'vitest';
import { ThrustedBending } from '../../../src/buckling/thrust.js';
import { TorsionBuckling } from '../../../src/buckling/torsion.js';
import { WallBuckling, type WallLoads } from '../../../src/buckling/wall.js';
import { Section } from '../../../src/tube/section.js';

const E = 70e9;
const nu = 0.33;
const L = 0.8;
const kappa = 0.67;
const Fp = 190e6;
const Fcy = 240e6;
const at = new Section(0.1).set(0.06, 0.001);
const { meanRadius: r, checkedWall: tc } = at;

const none: WallLoads = { torque: 0, thrust: 0, factor: 1.5, bending: null };

function utilisation(loads: Partial<WallLoads>): number {
  const material = { youngsModulus: E, poissonRatio: nu, shearPlateau: Fp, compressiveYield: Fcy };
  return new WallBuckling(new TorsionBuckling(E, nu, L, kappa), material, { ...none, ...loads }).utilisation(at);
}

/** The engineering basis written out once more, in its own letters. */
const F = (e: number, p: number): number => (e >= p / 2 ? p * (1 - p / (4 * e)) : e);
const m = 1 - nu * nu;
const moderate = kappa * 0.85 * (Math.PI ** 2 / 12) * E * m ** (-5 / 8) * (tc / r) ** (5 / 4) * (r / L) ** (1 / 2);
const long = ((kappa ** (4 / 3) * E) / (3 * Math.SQRT2 * m ** (3 / 4))) * (tc / r) ** (3 / 2);
const shear = F(Math.max(moderate, long), Fp);
const phi = Math.sqrt(r / tc) / 16;
const direct = (loss: number): number =>
  F((((1 - loss * (1 - Math.exp(-phi))) * E) / Math.sqrt(3 * m)) * (tc / r), Fcy);

describe('WallBuckling', () => {
  it('in pure torsion compares Bredt’s stress with the critical one', () => {
    expect(utilisation({ torque: 1000 })).toBeCloseTo(1000 / (2 * Math.PI * r * r * tc) / shear, 12);
  });

  it('in pure thrust compares P/(2πr·tc)', () => {
    expect(utilisation({ thrust: 20_000 })).toBeCloseTo(20_000 / (2 * Math.PI * r * tc) / direct(0.901), 12);
  });

  it('in pure bending multiplies the amplified moment by the factor', () => {
    const bending = new ThrustedBending(150, 0, E, L);
    expect(utilisation({ bending })).toBeCloseTo((1.5 * 150) / (Math.PI * r * r * tc) / direct(0.731), 12);
  });

  it('combines all three as R_c + R_b + R_s² = 1', () => {
    const thrust = 8000;
    const bending = new ThrustedBending(150, thrust, E, L);
    const u = utilisation({ torque: 400, thrust, bending });
    const amplified = 150 / (1 - thrust / ((Math.PI ** 2 * E * at.secondMoment) / L ** 2));
    const Rc = thrust / (2 * Math.PI * r * tc) / direct(0.901);
    const Rb = (1.5 * amplified) / (Math.PI * r * r * tc) / direct(0.731);
    const Rs = 400 / (2 * Math.PI * r * r * tc) / shear;
    expect((Rc + Rb) / u + (Rs / u) ** 2).toBeCloseTo(1, 12);
  });
});
