import type { UnitSystem } from '../../src/quantity/register.js';
import { shownUnit } from '../../src/quantity/register.js';
import { documentOf, type JobDocument } from '../job/keyPath.js';

/** The load cases of a document as entered; an empty list where there is none. */
export function casesOf(loads: unknown): readonly JobDocument[] {
  return Array.isArray(loads) ? loads.map(documentOf) : [];
}

/** The name of a case, as entered. */
export function caseName(load: JobDocument | undefined): string {
  const name = load?.['name'];
  return typeof name === 'string' ? name : '';
}

/** A name that no case has yet: the wish, or the wish with a number. */
function freeName(wish: string, loads: readonly JobDocument[]): string {
  const taken = new Set(loads.map(caseName));
  for (let number = 2, name = wish; ; number += 1) {
    if (!taken.has(name)) return name;
    name = `${wish} ${number}`;
  }
}

/** The cases with one more, which asks nothing of the tube until it is given a torque. */
export function withNewCase(loads: readonly JobDocument[], system: UnitSystem): readonly JobDocument[] {
  const name = freeName(`case ${loads.length + 1}`, loads);
  return [...loads, { name, torque: `0 ${shownUnit('torque', system)}` }];
}

/** The cases with a copy of one beside it, under a name of its own. */
export function withCopy(loads: readonly JobDocument[], index: number): readonly JobDocument[] {
  const source = loads[index];
  if (source === undefined) return loads;
  const copy = { ...source, name: freeName(`${caseName(source)} copy`, loads) };
  return loads.toSpliced(index + 1, 0, copy);
}
