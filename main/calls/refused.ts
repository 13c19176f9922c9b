import type { Refusal } from '../contract.js';

/** A call that a host refuses; crosses to the window as plain data. */
export class Refused extends Error {
  override readonly name = 'Refused';

  constructor(readonly refusal: Refusal) {
    super(refusal.sentence);
  }
}

/** The refusal that an error stands for: its own, or `failed` with a sentence that shows nothing of the machine. */
export function refusalOf(error: unknown, log: (line: string) => void): Refusal {
  if (error instanceof Refused) return error.refusal;
  const said = error instanceof Error ? error.message.split('\n')[0] : String(error);
  log(`failed: ${said ?? ''}`);
  return { code: 'failed', sentence: `The desk met an error: ${said ?? ''}` };
}
