import type { Refusal } from '../contract.js';

/** A request that the host turns away: an HTTP status, what the client is told, and the reason for the log. */
export class TurnedAway extends Error {
  override readonly name = 'TurnedAway';

  constructor(
    readonly status: number,
    readonly refusal: Refusal,
    readonly reason: string,
  ) {
    super(reason);
  }
}

/**
 * A request turned away by the host itself.
 * @param status HTTP status
 * @param reason in a clause; holds nothing that the request brought
 */
export function turnedAway(status: number, code: Refusal['code'], reason: string): TurnedAway {
  return new TurnedAway(status, { code, sentence: `The request is refused: ${reason}.` }, reason);
}

const STATUS_OF: Readonly<Record<Refusal['code'], number>> = {
  'unknown-call': 404,
  'bad-arguments': 400,
  'too-large': 413,
  'not-allowed': 403,
  failed: 500,
};

/** A call that was let in and then refused by the work behind it. */
export function refusedCall(refusal: Refusal): TurnedAway {
  return new TurnedAway(STATUS_OF[refusal.code], refusal, refusal.sentence);
}
