import type { UnitSystem } from '../../src/quantity/register.js';
import type { LimitEntry } from '../../src/report/report.js';
import { limitLabel } from '../../src/report/words.js';
import { pairText, type ShownPair } from './values.js';

/** A limit passes up to this; what is over it is shown as over, however little. */
const PASSES = 1 + 1e-9;

/** From here a limit counts as full. */
const FULL = 0.999;

/** One row of "how full each limit is". */
export interface LimitRow {
  readonly key: string;
  readonly label: string;
  /** the load case; null where the limit knows none or the job has but one */
  readonly load: string | null;
  readonly percent: number;
  /** full, over, or fullest of all */
  readonly governs: boolean;
  /** over full: the tube does not pass */
  readonly over: boolean;
  /** demand and capacity */
  readonly pair: ShownPair;
  /** the percentage is an interaction's, not the quotient of the pair */
  readonly interaction: boolean;
}

/** Whole per cent: 100 is said of what is full alone, and never of what does not pass. */
export function percentFull(utilisation: number): number {
  if (utilisation > PASSES) return Math.max(101, Math.ceil(utilisation * 100));
  return utilisation >= FULL ? 100 : Math.min(99, Math.round(utilisation * 100));
}

/** The fullest entry of each limit. */
export function worstOfEach(entries: readonly LimitEntry[]): readonly LimitEntry[] {
  const worst = new Map<string, LimitEntry>();
  for (const entry of entries)
    if (entry.utilisation > (worst.get(entry.limit)?.utilisation ?? -1)) worst.set(entry.limit, entry);
  return [...worst.values()];
}

function rowOf(entry: LimitEntry, severalLoads: boolean, system: UnitSystem): LimitRow {
  const { limit, load, utilisation, demand, capacity, unit } = entry;
  const percent = percentFull(utilisation);
  return {
    key: `${limit} ${load ?? ''}`,
    label: limitLabel(limit),
    load: severalLoads ? load : null,
    percent,
    governs: entry.governs || percent >= 100,
    over: percent > 100,
    pair: pairText(demand, capacity, unit, system),
    interaction: entry.interaction === true,
  };
}

/** Fullest first; within a thousandth the order of the report stands, so that limits that govern together do not trade places. */
function fullestFirst(a: LimitEntry, b: LimitEntry): number {
  return Math.round(b.utilisation * 1000) - Math.round(a.utilisation * 1000);
}

/**
 * The rows of "how full each limit is", fullest first.
 * @param everyCase a row for each load case; else each limit's fullest alone
 */
export function limitRows(
  entries: readonly LimitEntry[],
  severalLoads: boolean,
  everyCase: boolean,
  system: UnitSystem,
): readonly LimitRow[] {
  return [...(everyCase ? entries : worstOfEach(entries))]
    .sort(fullestFirst)
    .map((entry) => rowOf(entry, severalLoads, system));
}
