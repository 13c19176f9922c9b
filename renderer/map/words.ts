import { sizeTexts } from '../../src/figure/decimals.js';
import { formatQuantity } from '../../src/quantity/format.js';
import { shownUnit, type UnitSystem } from '../../src/quantity/register.js';
import type { DesignCheck, LimitEntry, LimitId } from '../../src/report/report.js';
import { limitLabel } from '../../src/report/words.js';
import { percentFull, worstOfEach } from '../pick/limitRows.js';
import { pairText } from '../pick/values.js';

/** "84.8 × 1.75 mm, 1.432 kg" */
export function tubeText({ design }: DesignCheck, system: UnitSystem): string {
  const [outer = ''] = sizeTexts([design.outerDiameter], 'outerDiameter', system);
  const [wall = ''] = sizeTexts([design.wall], 'wall', system);
  const mass = formatQuantity(design.mass, 'mass', shownUnit('mass', system), { decimals: 3 });
  return `${outer} × ${wall} ${shownUnit('length', system)}, ${mass}`;
}

/** "twist 3.12 / 3.00 deg, 104 %": the pair that a checker sets side by side. */
export function limitText({ limit, demand, capacity, unit, utilisation }: LimitEntry, system: UnitSystem): string {
  const pair = pairText(demand, capacity, unit, system);
  const values = `${pair.first} / ${pair.second}${pair.unit === '' ? '' : ` ${pair.unit}`}`;
  return `${limitLabel(limit)} ${values}, ${String(percentFull(utilisation))} %`;
}

/** The fullest entry, or the fullest of one limit. */
function fullestOf(limits: readonly LimitEntry[], limit: LimitId | null): LimitEntry | null {
  const all = limit === null ? limits : limits.filter((entry) => entry.limit === limit);
  return all.reduce<LimitEntry | null>(
    (best, one) => (best !== null && best.utilisation >= one.utilisation ? best : one),
    null,
  );
}

/** What is said at a place on the map: the tube, and the limit whose curve is there or, of all, the fullest. */
export function placeLines(check: DesignCheck, limit: LimitId | null, system: UnitSystem): readonly string[] {
  const entry = fullestOf(check.limits, limit) ?? fullestOf(check.limits, null);
  return [tubeText(check, system), ...(entry === null ? [] : [limitText(entry, system)])];
}

/** What is said of a tube on trial beside its mark. */
export function trialLines(check: DesignCheck, system: UnitSystem): readonly string[] {
  const over = worstOfEach(check.limits).filter(({ utilisation }) => percentFull(utilisation) > 100);
  const rest = over.length > 1 ? ` and ${String(over.length - 1)} more` : '';
  const [size = '', fullest = ''] = placeLines(check, null, system);
  return [`trial ${size}`, check.feasible ? `passes: ${fullest}` : `does not pass: ${fullest}${rest}`];
}
