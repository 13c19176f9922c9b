import type { Follows } from '../contract.js';
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
