import { createHash, randomBytes, timingSafeEqual } from 'node:crypto';
import type { IncomingHttpHeaders } from 'node:http';
import { turnedAway } from './turnedAway.js';
import { WIRE_HEADERS } from './wire.js';

/** What a request must show to be let in. */
export interface Gate {
  /** 127.0.0.1:PORT */
  readonly host: string;
  readonly token: string;
}

/** A token for one start: 256 bits from the system's own source, as 43 characters of base64url. */
export function newToken(): string {
  return randomBytes(32).toString('base64url');
}

function refuse(reason: string, status = 403): never {
  throw turnedAway(status, 'not-allowed', reason);
}

const digest = (text: string): Buffer => createHash('sha256').update(text).digest();

/** Compares in a time that tells nothing; over digests, since the lengths may differ. */
function isSame(given: string, expected: string): boolean {
  return timingSafeEqual(digest(given), digest(expected));
}

/**
 * Refuses what another page of the same browser could send: a Host that is a name which somebody pointed at this
 * machine, an Origin that is not the window's own, a request that the browser itself marks as from another site.
 * @throws TurnedAway
 */
export function checkPlace(headers: IncomingHttpHeaders, { host }: Gate): void {
  if (headers.host !== host) refuse('the Host is not this host');
  if (headers.origin !== undefined && headers.origin !== `http://${host}`) refuse('the Origin is another page');
  const site = headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin' && site !== 'none') refuse('it comes from another site');
}

/**
 * Lets in the calls of the window alone: the place as above, with an Origin and from the page itself, and the token.
 * @throws TurnedAway
 */
export function checkCaller(headers: IncomingHttpHeaders, gate: Gate): void {
  checkPlace(headers, gate);
  if (headers.origin === undefined) refuse('the Origin is missing');
  if (headers['sec-fetch-site'] === 'none') refuse('it does not come from the page');
  const token = headers[WIRE_HEADERS.token];
  if (typeof token !== 'string') refuse('the token is missing', 401);
  if (!isSame(token, gate.token)) refuse('the token is wrong', 401);
}

const WINDOW_ID = /^[A-Za-z0-9-]{1,64}$/;

/**
 * The id of the window that calls.
 * @throws TurnedAway where it is malformed
 */
export function windowOf(headers: IncomingHttpHeaders): string {
  const id = headers[WIRE_HEADERS.window] ?? 'main';
  if (typeof id === 'string' && WINDOW_ID.test(id)) return id;
  throw turnedAway(400, 'bad-arguments', 'the id of the window is malformed');
}
