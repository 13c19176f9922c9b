import type { Refusal } from '../../../main/contract.js';

/** A refusal as a test's client throws it. */
export class RefusedCall extends Error {
  constructor(readonly refusal: Refusal) {
    super(refusal.sentence);
  }
}
