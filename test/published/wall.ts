import type { Engine } from './engine.js';

/** A wall in torsion: mean radius, wall, length; SI. */
export interface Wall {
  readonly E: number;
  readonly nu: number;
  readonly r: number;
  readonly t: number;
  readonly L: number;
}

/** E 72.4 GPa, ν 0.33, r 25, t 0.5, L 500 mm: one tube that every formula is tried on. */
export const oneTube = { E: '72.4 GPa', nu: 0.33, r: '25 mm', t: '0.5 mm', L: '500 mm' } as const;

export const torsion = (x: Wall, { TorsionBuckling }: Engine, kappa = 1) => new TorsionBuckling(x.E, x.nu, x.L, kappa);

/** The engine's stresses, Pa, without knock-down. */
export const moderate = (x: Wall, engine: Engine): number => torsion(x, engine).moderateStress(x.r, x.t);
export const long = (x: Wall, engine: Engine): number => torsion(x, engine).longStress(x.r, x.t);

/** Z */
export const batdorf = ({ nu, r, t, L }: Wall): number => (L ** 2 / (r * t)) * Math.sqrt(1 - nu ** 2);

/** k·π²E/(12(1 − ν²))·(t/L)² */
export const plate = (k: number, { E, nu, t, L }: Wall): number =>
  ((k * Math.PI ** 2 * E) / (12 * (1 - nu ** 2))) * (t / L) ** 2;
