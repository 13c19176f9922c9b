import type { UnitSystem } from '../quantity/register.js';
import { sizeTexts } from './decimals.js';
import type { Point } from './point.js';

/** A tube to be drawn; m. */
export interface DrawnTube {
  readonly outerDiameter: number;
  readonly wall: number;
  /** what must pass through; null where nothing must */
  readonly boreMin: number | null;
}

/** How large the section is drawn; type and the weight of lines do not follow. */
export type SheetSize = 'small' | 'large';

/** Where things stand on a sheet, px. */
export interface Sheet {
  readonly width: number;
  readonly height: number;
  /** middle of the section */
  readonly middle: Point;
  /** outer radius of the tube */
  readonly radius: number;
  /** the circle in which the wall is enlarged */
  readonly glass: { readonly x: number; readonly y: number; readonly r: number };
  /** base of the outer diameter's dimension line */
  readonly outerDimensionY: number;
  /** base line of the first caption under the glass */
  readonly captionsY: number;
}

export const SHEETS: Readonly<Record<SheetSize, Sheet>> = {
  small: {
    width: 320,
    height: 164,
    middle: { x: 70, y: 68 },
    radius: 56,
    glass: { x: 218, y: 58, r: 46 },
    outerDimensionY: 148,
    captionsY: 120,
  },
  large: {
    width: 390,
    height: 212,
    middle: { x: 94, y: 92 },
    radius: 80,
    glass: { x: 278, y: 72, r: 58 },
    outerDimensionY: 196,
    captionsY: 150,
  },
};

/** A tube at the scale of the sheet. */
export interface Scaled {
  readonly sheet: Sheet;
  readonly tube: DrawnTube;
  readonly system: UnitSystem;
  /** px per m */
  readonly scale: number;
  /** px */
  readonly wall: number;
  readonly boreRadius: number;
}

/** The tube at the scale at which its outline has the radius of the sheet. */
export function scaled(tube: DrawnTube, system: UnitSystem, size: SheetSize): Scaled {
  const sheet = SHEETS[size];
  const scale = (2 * sheet.radius) / tube.outerDiameter;
  const wall = tube.wall * scale;
  return { sheet, tube, system, scale, wall, boreRadius: sheet.radius - wall };
}

/** What a drawing says of a diameter, m. */
export function diameterText(diameter: number, system: UnitSystem): string {
  return `Ø ${sizeTexts([diameter], 'outerDiameter', system)[0] ?? ''}`;
}

export function outerText({ tube, system }: Scaled): string {
  return diameterText(tube.outerDiameter, system);
}

export function boreText({ tube, system }: Scaled): string {
  return diameterText(tube.outerDiameter - 2 * tube.wall, system);
}

export function wallText({ tube, system }: Scaled): string {
  return sizeTexts([tube.wall], 'wall', system)[0] ?? '';
}
