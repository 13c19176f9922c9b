import { nameParts } from '../pick/names.js';
import type { Ranked } from './ranking.js';

/** How a row is named: the name, and what is set small beside it ('' where nothing need be). */
export interface RowName {
  readonly name: string;
  readonly note: string;
}

/**
 * Short names, by key. A material leaves its form out where no other would then bear its name; a design in hand says
 * what it is made of.
 */
export function rowNames(entries: readonly Ranked[]): ReadonlyMap<string, RowName> {
  const bearers = new Map<string, number>();
  for (const { name, held } of entries) {
    const short = nameParts(name).name;
    if (!held) bearers.set(short, (bearers.get(short) ?? 0) + 1);
  }
  return new Map(
    entries.map(({ key, name, held, material }) => {
      if (held) return [key, { name, note: `in hand, ${nameParts(material.name).name}` }];
      const { name: short, form } = nameParts(name);
      return [key, { name: short, note: (bearers.get(short) ?? 0) > 1 ? form : '' }];
    }),
  );
}
