import { inUnit } from '../quantity/format.js';
import { shownUnit, type QuantityName, type UnitSystem } from '../quantity/register.js';
import type { LimitId } from '../report/report.js';
import { limitLabel } from '../report/words.js';
import type { MapCurve } from '../sizing/map.js';

/** Limits whose demand a map names, and in what; lengths are in the unit of the axes, which need not be said. */
const SAID: ReadonlyMap<LimitId, QuantityName | null> = new Map<LimitId, QuantityName | null>([
  ['twist', 'angle'],
  ['shear-allowable', 'stress'],
  ['outer-diameter', 'length'],
  ['wall-min', 'length'],
  ['bore', 'length'],
  ['diameter-to-wall', null],
]);

const FIGURES = 4;

/** "twist 3 deg", "outer diameter 90", "whirl": what a map calls a limit's boundary. */
export function curveName({ limit, demand, atLeast }: MapCurve, system: UnitSystem): string {
  const label = limitLabel(limit);
  const quantity = SAID.get(limit);
  if (demand === null || quantity === undefined) return label;
  const least = limit === 'outer-diameter' && atLeast ? 'least ' : '';
  const unit = quantity === null ? '' : shownUnit(quantity, system);
  const number = Number((quantity === null ? demand : inUnit(demand, quantity, unit)).toPrecision(FIGURES));
  return `${least}${label} ${String(number)}${quantity === 'length' || unit === '' ? '' : ` ${unit}`}`;
}
