import type { StockTube } from '../material/material.js';
import type { Problem } from './problem.js';

/** A size that passes, with what a listed one costs; m, kg. */
export interface Size {
  readonly outerDiameter: number;
  readonly wall: number;
  readonly mass: number;
  /** price of the listed size; null where it has none */
  readonly pricePerMetre: number | null;
}

/** Masses within this of each other are the same mass, and the smaller outer diameter wins. */
export const TIE = 1e-9;

/** Whether a is to be preferred: lighter; of one mass, the smaller outer diameter; else the one listed first. */
export function preferred(
  a: { mass: number; outerDiameter: number },
  b: { mass: number; outerDiameter: number },
): boolean {
  if (Math.abs(a.mass - b.mass) > TIE * Math.max(a.mass, b.mass)) return a.mass < b.mass;
  return a.outerDiameter < b.outerDiameter;
}

/** Every listed size that passes, in the order of the list. */
export function passing(problem: Problem, tubes: readonly StockTube[]): Size[] {
  return tubes
    .filter(({ outerDiameter, wall }) => problem.passes(outerDiameter, wall))
    .map(({ outerDiameter, wall, pricePerMetre }) => {
      return { outerDiameter, wall, pricePerMetre, mass: problem.mass.of(outerDiameter, wall) };
    });
}

/** The lightest listed size that passes, or null. */
export function lightestListed(problem: Problem, tubes: readonly StockTube[]): Size | null {
  return passing(problem, tubes).reduce<Size | null>(
    (best, size) => (best === null || preferred(size, best) ? size : best),
    null,
  );
}
