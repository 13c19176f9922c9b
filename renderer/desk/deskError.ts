import type { Refusal, Reply } from '../../main/contract.js';

/** The desk refused a call, or did not answer. */
export class DeskError extends Error {
  override readonly name = 'DeskError';

  constructor(
    readonly code: Refusal['code'],
    sentence: string,
  ) {
    super(sentence);
  }
}

/** The desk gave no answer, or broke off. */
export function unanswered(): DeskError {
  return new DeskError('failed', 'The desk behind this window does not answer; close the window and start again.');
}

/** The answer of a reply; a refusal is thrown. */
export function answerOf<A>(reply: Reply<A>): A {
  if ('refusal' in reply) throw new DeskError(reply.refusal.code, reply.refusal.sentence);
  return reply.answer;
}
