import type { CheckArguments, Follows } from '../contract.js';
import { jsonText } from './json.js';
import { Refused } from './refused.js';

function bad(sentence: string): Refused {
  return new Refused({ code: 'bad-arguments', sentence });
}

/**
 * The arguments of a call that takes none.
 * @throws Refused
 */
export function noArguments(args: unknown): null {
  if (args !== null) throw bad('This call takes no arguments; expected null.');
  return args;
}

/**
 * The arguments of `size`: an object with a job document and nothing else. The engine reads the document itself.
 * @throws Refused
 */
export function sizeArguments(args: unknown): Follows['size']['args'] {
  if (typeof args !== 'object' || args === null || Array.isArray(args)) throw bad('Expected an object with a job.');
  const own = new Map<string, unknown>(Object.entries(args));
  if (own.size !== 1 || !own.has('job')) throw bad('Expected an object with a job and nothing else.');
  const job = own.get('job');
  jsonText(job, 'The job');
  return { job };
}

const CHECK_KEYS = ['job', 'material', 'outerDiameter', 'wall'] as const;

/**
 * The arguments of `check`: a job document, the id of a material and the size of a tube, m, and nothing else.
 * @throws Refused
 */
export function checkArguments(args: unknown): CheckArguments {
  if (typeof args !== 'object' || args === null || Array.isArray(args)) throw bad('Expected an object with a job.');
  const own = new Map<string, unknown>(Object.entries(args));
  if (own.size !== CHECK_KEYS.length || !CHECK_KEYS.every((key) => own.has(key)))
    throw bad('Expected a job, a material, an outerDiameter and a wall, and nothing else.');
  const [job, material, outerDiameter, wall] = CHECK_KEYS.map((key) => own.get(key));
  jsonText(job, 'The job');
  if (typeof material !== 'string') throw bad('The material is not the id of one.');
  if (typeof outerDiameter !== 'number' || typeof wall !== 'number') throw bad('The size is not in numbers.');
  if (!Number.isFinite(outerDiameter) || !(wall > 0 && wall < outerDiameter / 2))
    throw bad('Expected a wall above 0 and under half of the outer diameter.');
  return { job, material, outerDiameter, wall };
}
