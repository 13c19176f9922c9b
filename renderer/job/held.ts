import { sizeTexts } from '../../src/figure/decimals.js';
import { formatQuantity, roundedDown, roundedUp } from '../../src/quantity/format.js';
import { shownUnit, type UnitSystem } from '../../src/quantity/register.js';
import { documentOf, type JobDocument } from './keyPath.js';

/** A tube's size, m. */
export interface TubeSize {
  readonly outerDiameter: number;
  readonly wall: number;
}

/** Figures that a workshop would be given of an outer diameter and a wall. */
const FIGURES = { outerDiameter: 5, wall: 4 } as const;

/** Sizes of few figures beside one that a search has found, the nearest first: the wall goes up, the diameter either way. */
export function roundedSizes({ outerDiameter, wall }: TubeSize, system: UnitSystem): readonly TubeSize[] {
  const unit = shownUnit('length', system);
  const thicker = roundedUp(wall, 'length', unit, FIGURES.wall).value;
  const up = roundedUp(outerDiameter, 'length', unit, FIGURES.outerDiameter).value;
  const down = roundedDown(outerDiameter, 'length', unit, FIGURES.outerDiameter).value;
  const order = up - outerDiameter < outerDiameter - down ? [up, down] : [down, up];
  return order
    .map((outer) => ({ outerDiameter: outer, wall: thicker }))
    .filter((size) => 2 * size.wall < size.outerDiameter);
}

/** A name that no design in hand bears yet: "84.8 × 1.75", and a number behind it where it must be. */
export function heldName({ outerDiameter, wall }: TubeSize, held: readonly unknown[], system: UnitSystem): string {
  const names = new Set(held.map((entry) => documentOf(entry)['name']));
  const [outer = ''] = sizeTexts([outerDiameter], 'outerDiameter', system);
  const [thick = ''] = sizeTexts([wall], 'wall', system);
  const base = `${outer} × ${thick}`;
  let name = base;
  for (let again = 2; names.has(name); again += 1) name = `${base} (${String(again)})`;
  return name;
}

/** A design in hand as a job file writes it, its size to the last figure. */
export function heldEntry(
  name: string,
  material: string,
  { outerDiameter, wall }: TubeSize,
  system: UnitSystem,
): JobDocument {
  const unit = shownUnit('length', system);
  const text = (length: number): string => formatQuantity(length, 'length', unit);
  return { name, material, outerDiameter: text(outerDiameter), wall: text(wall) };
}
