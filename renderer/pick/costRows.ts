import { inUnit } from '../../src/quantity/format.js';
import type { UnitSystem } from '../../src/quantity/register.js';
import type { Design, LimitEntry, Relief } from '../../src/report/report.js';
import { limitLabel } from '../../src/report/words.js';
import { worstOfEach } from './limitRows.js';
import { changeText, figuresText, type ShownPair } from './values.js';

/** What easing means: the limit passes at a hundredth over full. */
const EASED = 1.01;

/** One row of "what a limit costs". */
export interface CostRow {
  readonly key: string;
  readonly label: string;
  /** the requirement as it stands and eased by 1 % */
  readonly change: ShownPair;
  /** "36.6 g", or "nothing" */
  readonly saved: string;
}

/** Whether a limit asks for at least its demand, where the tube's own value is the capacity; else the capacity is the requirement. */
function asksForAtLeast({ limit, demand, capacity }: LimitEntry, { outerDiameter, wall }: Design): boolean {
  const own = { 'outer-diameter': outerDiameter, 'diameter-to-wall': outerDiameter / wall };
  if (limit === 'outer-diameter' || limit === 'diameter-to-wall')
    return Math.abs(capacity / own[limit] - 1) < Math.abs(demand / own[limit] - 1);
  return limit === 'whirl' || limit === 'bore' || limit === 'wall-min';
}

function easedText(entry: LimitEntry, design: Design, system: UnitSystem): ShownPair {
  const { demand, capacity, unit } = entry;
  return asksForAtLeast(entry, design)
    ? changeText(demand, demand / EASED, unit, system)
    : changeText(capacity, capacity * EASED, unit, system);
}

/** A small mass: grams, or ounces. */
export function smallMassText(mass: number, system: UnitSystem): string {
  if (mass <= 0) return 'nothing';
  const unit = system === 'SI' ? 'g' : 'oz';
  return `${figuresText(inUnit(mass, 'mass', unit), 3)} ${unit}`;
}

/** What each full limit costs, most first. */
export function costRows(
  relief: readonly Relief[],
  limits: readonly LimitEntry[],
  design: Design,
  system: UnitSystem,
): readonly CostRow[] {
  const worst = new Map(worstOfEach(limits).map((entry) => [entry.limit, entry]));
  return [...relief]
    .sort((a, b) => b.massSavedPerPercent - a.massSavedPerPercent)
    .flatMap(({ limit, massSavedPerPercent }) => {
      const entry = worst.get(limit);
      if (entry === undefined) return [];
      const change = easedText(entry, design, system);
      return [{ key: limit, label: limitLabel(limit), change, saved: smallMassText(massSavedPerPercent, system) }];
    });
}

const COUNTS = ['', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve'];

/** What is to be said of the limits that are not full. */
export function othersSentence(full: number, limits: readonly LimitEntry[]): string {
  const others = worstOfEach(limits).length - full;
  if (full === 0) return 'No limit is quite full.';
  if (others === 0) return '';
  const count = COUNTS[others] ?? String(others);
  return others === 1 ? 'The other one is not full.' : `The other ${count} are not full.`;
}
