import type { Ease, NoFit } from '../../src/report/report.js';
import { floored } from '../../src/report/noFit.js';

/** A job as far as its load cases have names. */
export interface NamedLoads {
  readonly loads: readonly { readonly name: string }[];
}

/** What the brief calls the requirements that can be eased. */
const TERMS: Readonly<Record<string, string>> = {
  'tube.outerDiameterMax': 'outer diameter at most',
  'tube.outerDiameterMin': 'outer diameter at least',
  'tube.boreMin': 'bore at least',
  'tube.wallMin': 'wall at least',
  'speed.max': 'running speed',
};

/** The requirement at a key path in the brief's words; a load case by its name where there are several. */
export function requirementTerm(path: string, { loads }: NamedLoads): string {
  const load = /^loads\.(\d+)\.twistMax$/.exec(path)?.[1];
  if (load === undefined) return TERMS[path] ?? path;
  const name = loads[Number(load)]?.name ?? '';
  return loads.length > 1 && name !== '' ? `twist at most, ${name}` : 'twist at most';
}

/** What is left where no single requirement opens the way, without full stop; null where one does. */
export function lastResort({ ease, torqueFactor }: NoFit): string | null {
  if (ease.length > 0) return null;
  if (torqueFactor === null) return 'no single change of the brief lets something fit';
  return `it fits at ${floored(torqueFactor)} times the torque`;
}

/** One change and how it is said. */
export interface EaseLine {
  readonly ease: Ease;
  readonly term: string;
  /** the whole change in words, for those who hear the key alone */
  readonly spoken: string;
}

/** The smallest single changes in words. */
export function easeLines({ ease }: NoFit, job: NamedLoads): readonly EaseLine[] {
  return ease.map((one) => {
    const term = requirementTerm(one.path, job);
    return { ease: one, term, spoken: `apply: ${term} ${one.to} in place of ${one.from}` };
  });
}
