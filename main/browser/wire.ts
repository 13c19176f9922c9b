import type { AskName, Asks, FollowName, Follows, Refusal, Reply, StreamLine } from '../contract.js';

/**
 * The wire format of the browser host. One host listens on 127.0.0.1, at a port that the system chose.
 *
 * **Address.** `http://127.0.0.1:PORT/#TOKEN`. The token is made anew at each start, 256 bits as 43 characters of
 * base64url. It stands in the fragment, which a browser sends to nobody. A page that takes it out of the address keeps
 * it in `sessionStorage`, so that a reload finds it. A browser that the host starts is given `/?ticket=…` in its place,
 * good once, and is sent on to this address: its command line may be read by others, and must not hold the token.
 *
 * **Asks.** `POST /ask/NAME` with the arguments as JSON; the answer is JSON, a `Reply`.
 *
 * **Follows.** `POST /follow/NAME` with the arguments as JSON; the answer is a stream of lines, each the JSON text of a
 * `StreamLine` and a line feed. The last line holds `end` or `refusal`; a stream that closes without one has failed.
 * A line `{"alive":true}` comes every two seconds, whatever else does. To stop a run, abort the request: what is still
 * on its way is dropped, and the client itself tells the run's `stopped` end.
 *
 * **Headers of both.** `Content-Type: application/json`; `X-Wringwall-Token: TOKEN`; `X-Wringwall-Window: ID`, an id of
 * 1 to 64 letters, digits and hyphens that a page makes for itself when it loads, so that two windows do not supersede
 * each other's runs (left out, the window is "main"). Host and Origin, which a browser sends by itself, must be the
 * host's own, and `Sec-Fetch-Site`, where present, must say `same-origin`. A body holds at most 4 MB. No cookies.
 *
 * **Refusals.** Any status other than 200 comes with `{"refusal": Refusal}` as JSON: 400 malformed or wrong arguments,
 * 401 token, 403 Host, Origin or other site, 404 unknown call or file, 405 method, 413 too large, 415 content type,
 * 500 failed.
 *
 * **Files.** `GET` of the built window's own files, and `/` for its page; no token, since they hold nothing private.
 */
export interface Wire {
  readonly asks: { readonly [N in AskName]: { readonly body: Parameters<Asks[N]>[0]; readonly reply: AskReply<N> } };
  readonly follows: { readonly [N in FollowName]: { readonly body: Follows[N]['args']; readonly line: FollowLine<N> } };
}

export type AskReply<N extends AskName> = Reply<ReturnType<Asks[N]>>;
export type FollowLine<N extends FollowName> = StreamLine<Follows[N]['update'], Follows[N]['end']>;

/** The body of every answer whose status is not 200. */
export interface WireRefusal {
  readonly refusal: Refusal;
}

/** Names of the wire's own headers, as the host looks them up. */
export const WIRE_HEADERS = { token: 'x-wringwall-token', window: 'x-wringwall-window' } as const;

/** Milliseconds between the lines that show that a host is alive. */
export const HEARTBEAT = 2000;
