import type { Ease, NoFit } from '../../src/report/report.js';
import { joinWords, limitLabel } from '../../src/report/words.js';

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

/** Why nothing fits, without full stop. */
export function conflictWords({ conflict }: NoFit): string {
  if (conflict.length === 0) return 'nothing fits';
  const words = joinWords(conflict.map(limitLabel));
  return conflict.length === 1
    ? `nothing fits: ${words} cannot be met`
    : `nothing fits: ${words} stand against each other`;
}

/** What is left where no single requirement opens the way, without full stop; null where one does. */
export function lastResort({ ease, torqueFactor }: NoFit): string | null {
  if (ease.length > 0) return null;
  if (torqueFactor === null) return 'no single change of the brief lets something fit';
  return `it fits at ${String(floored(torqueFactor))} times the torque`;
}

/** Three figures, never more than the factor, so that what it promises holds. */
function floored(factor: number): number {
  const said = Number(factor.toPrecision(3));
  if (said <= factor) return said;
  return Number((said - 10 ** (Math.floor(Math.log10(factor)) - 2)).toPrecision(3));
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
