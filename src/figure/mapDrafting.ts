import type { UnitSystem } from '../quantity/register.js';
import type { MapPoint } from '../sizing/mapScale.js';
import type { Label, Shape } from './figure.js';
import type { MapSheet } from './mapSheet.js';
import type { Placing } from './placing.js';

/** A design in hand on the map. */
export interface MapDesign extends MapPoint {
  readonly name: string;
  readonly fits: boolean;
  /** it is the pick, and drawn in copper */
  readonly picked: boolean;
}

/** What the parts of the drawing share. */
export interface Drafting {
  readonly sheet: MapSheet;
  readonly system: UnitSystem;
  readonly placing: Placing;
}

/** What a part of the drawing comes to. */
export interface Part {
  readonly shapes: readonly Shape[];
  readonly labels: readonly Label[];
}
