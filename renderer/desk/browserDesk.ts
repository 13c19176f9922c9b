import type { AskName, Asks, Desk, FollowName, Follows, Refusal, Reply, StreamLine } from '../../main/contract.js';
import { answerOf, DeskError, unanswered } from './deskError.js';
import { hearing, type Hearing } from './hearing.js';

/** The lines of a text stream, as they come in; the last one too where it lacks its line feed. */
async function* linesOf(body: ReadableStream<Uint8Array>): AsyncGenerator<string, void, undefined> {
  const reader = body.getReader();
  const decoder = new TextDecoder();
  let rest = '';
  for (let part = await reader.read(); !part.done; part = await reader.read()) {
    const lines = (rest + decoder.decode(part.value, { stream: true })).split('\n');
    rest = lines.pop() ?? '';
    yield* lines;
  }
  if (rest !== '') yield rest;
}

async function refusalOf(response: Response): Promise<DeskError> {
  const body = (await response.json().catch(() => null)) as { readonly refusal?: Refusal } | null;
  const refusal = body?.refusal;
  return refusal === undefined ? unanswered() : new DeskError(refusal.code, refusal.sentence);
}

async function listen<U, E>(response: Response, heard: Hearing<U, E>): Promise<void> {
  if (!response.ok || response.body === null) {
    heard.fail(await refusalOf(response));
    return;
  }
  for await (const line of linesOf(response.body)) heard.line(JSON.parse(line) as StreamLine<U, E>);
  heard.fail();
}

/**
 * The desk behind the local host: calls over fetch, runs as lines of JSON. A run is stopped by breaking the request off.
 * @param token of this start; without the right one every call is refused
 */
export function browserDesk(token: string): Desk {
  const headers = {
    'content-type': 'application/json',
    'x-wringwall-token': token,
    'x-wringwall-window': crypto.randomUUID(),
  };
  const post = (path: string, args: unknown, signal: AbortSignal | null): Promise<Response> =>
    fetch(path, { method: 'POST', headers, body: JSON.stringify(args), signal, cache: 'no-store' });

  return {
    async ask<N extends AskName>(name: N, args: Parameters<Asks[N]>[0]) {
      const response = await post(`/ask/${name}`, args, null).catch(() => null);
      if (response === null) throw unanswered();
      if (!response.ok) throw await refusalOf(response);
      return answerOf((await response.json()) as Reply<ReturnType<Asks[N]>>);
    },
    follow<N extends FollowName>(name: N, args: Follows[N]['args'], onUpdate: (update: Follows[N]['update']) => void) {
      const heard = hearing<Follows[N]['update'], Follows[N]['end']>(onUpdate);
      const request = new AbortController();
      post(`/follow/${name}`, args, request.signal)
        .then((response) => listen(response, heard))
        .catch(() => {
          heard.fail();
        });
      const stop = (): void => {
        heard.end({ kind: 'stopped' });
        request.abort();
      };
      return { done: heard.done, stop };
    },
  };
}
