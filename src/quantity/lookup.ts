import { nearest } from './nearest.js';
import { quantities, quantityNames, type QuantityName } from './register.js';
import { otherWords, unitKey } from './spelling.js';
import type { Unit } from './units.js';

type Index = ReadonlyMap<string, Unit>;

function spellings(unit: Unit): readonly string[] {
  return [unit.symbol, ...unit.aliases, ...otherWords(unit.symbol)];
}

function indexOf(quantity: QuantityName): Index {
  return new Map(
    quantities[quantity].units.flatMap((unit) =>
      [unit.symbol, ...unit.aliases].map((text) => [keyOf(text), unit] as const),
    ),
  );
}

function keyOf(text: string): string {
  const key = unitKey(text);
  if (key === null) throw new Error(`The register holds a unit that cannot be read: ${text}.`);
  return key;
}

const INDEX: ReadonlyMap<QuantityName, Index> = new Map(quantityNames.map((name) => [name, indexOf(name)]));

/** The quantity's unit in any of its spellings, or null. */
export function findUnit(text: string, quantity: QuantityName): Unit | null {
  const key = unitKey(text);
  return key === null ? null : (INDEX.get(quantity)?.get(key) ?? null);
}

/** The first quantity of the register that has such a unit, or null. */
export function quantityOfUnit(text: string): QuantityName | null {
  return quantityNames.find((name) => findUnit(text, name) !== null) ?? null;
}

/** Symbol of the unit of these quantities that is spelt most like the text, or null. */
export function nearestUnit(text: string, names: readonly QuantityName[]): string | null {
  const symbols = new Map<string, string>();
  for (const unit of names.flatMap((name) => quantities[name].units))
    for (const spelling of spellings(unit)) if (!symbols.has(spelling)) symbols.set(spelling, unit.symbol);
  const found = nearest(text, [...symbols.keys()]);
  return found === null ? null : (symbols.get(found) ?? null);
}
