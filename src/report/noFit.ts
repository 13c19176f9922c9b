import type { NoFit } from './report.js';
import { figures, joinWords, limitLabel } from './words.js';

/** Why nothing fits, without full stop. */
export function conflictWords({ conflict }: NoFit): string {
  const words = joinWords(conflict.map(limitLabel));
  if (conflict.length === 0) return 'nothing fits';
  return conflict.length === 1
    ? `nothing fits: ${words} cannot be met`
    : `nothing fits: ${words} stand against each other`;
}

/** The factor rounded down to three figures, so that what it promises holds. */
export function floored(factor: number): string {
  const [head = '0', exponent = '0'] = factor.toExponential(6).split('e');
  return figures((Math.floor(Number(head) * 100 + 1e-9) / 100) * 10 ** Number(exponent), 3);
}

/** What stands in the way of a material, and each single change that would open it, in one or two sentences. */
export function noFitText(material: string, noFit: NoFit): string {
  const eases = noFit.ease.map(({ path, from, to }) => `${path} at ${to} in place of ${from}`);
  const said = [`${material}: ${conflictWords(noFit)}.`];
  if (eases.length > 0) said.push(`Something fits with ${joinWords(eases, 'or')}.`);
  if (noFit.torqueFactor !== null) said.push(`Something fits at ${floored(noFit.torqueFactor)} times the torque.`);
  if (eases.length === 0 && noFit.torqueFactor === null) said.push('No single change of the job lets something fit.');
  return said.join(' ');
}
