import { fixed } from '../../src/figure/decimals.js';
import { inUnit } from '../../src/quantity/format.js';
import { shownUnit, type UnitSystem } from '../../src/quantity/register.js';
import type { Ranked, Ranking } from '../lineup/ranking.js';
import { nameParts, ordinal } from './names.js';

function heavierText(mass: number, lightest: number, system: UnitSystem): string {
  const unit = shownUnit('mass', system);
  const difference = inUnit(Math.abs(mass - lightest), 'mass', unit);
  return `${fixed(difference, 3)} ${unit} ${mass < lightest ? 'under' : 'over'} the lightest`;
}

function placeText({ rank, design }: Ranked, { entries, lightest }: Ranking, system: UnitSystem): string {
  if (design === null) return '';
  if (rank === null || lightest === null) return 'does not carry the job';
  if (design.mass === lightest)
    return entries.length === 1 ? 'the only one' : `the lightest of ${String(entries.length)}`;
  return `${ordinal(rank)} of ${String(entries.length)}, ${heavierText(design.mass, lightest, system)}`;
}

/** "drawn tube, second of 7, 0.726 kg over the lightest". */
export function standingText(entry: Ranked, all: Ranking, system: UnitSystem): string {
  const form = entry.held ? `in hand, ${entry.material.name}` : nameParts(entry.name).form;
  return [form, placeText(entry, all, system)].filter((part) => part !== '').join(', ');
}
