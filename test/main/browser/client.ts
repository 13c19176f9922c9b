import type { AskName, Asks, Desk, FollowName, Follows, Refusal } from '../../../main/contract.js';
import type { Gate } from '../../../main/browser/gate.js';
import { RefusedCall } from '../contract/refusedCall.js';

/** Headers of a call as a browser sends it from the host's own page. */
export function pageHeaders({ host, token }: Gate, id = 'main'): Record<string, string> {
  return {
    'content-type': 'application/json',
    origin: `http://${host}`,
    'sec-fetch-site': 'same-origin',
    'x-wringwall-token': token,
    'x-wringwall-window': id,
  };
}

async function refused(response: Response): Promise<RefusedCall> {
  return new RefusedCall(((await response.json()) as { refusal: Refusal }).refusal);
}

async function* linesOf(response: Response): AsyncGenerator<string> {
  const decoder = new TextDecoder();
  let rest = '';
  for await (const part of response.body ?? []) {
    const lines = (rest + decoder.decode(part, { stream: true })).split('\n');
    rest = lines.pop() ?? '';
    yield* lines;
  }
}

/** The desk of a browser host, spoken to as its wire format says. */
export function httpDesk(gate: Gate, id = 'main'): Desk {
  const post = (path: string, args: unknown, signal: AbortSignal | null = null): Promise<Response> =>
    fetch(`http://${gate.host}${path}`, {
      method: 'POST',
      headers: pageHeaders(gate, id),
      body: JSON.stringify(args),
      signal,
    });

  async function follow<N extends FollowName>(
    name: N,
    args: unknown,
    onUpdate: (update: Follows[N]['update']) => void,
    signal: AbortSignal,
  ): Promise<Follows[N]['end']> {
    try {
      const response = await post(`/follow/${name}`, args, signal);
      if (!response.ok) throw await refused(response);
      for await (const text of linesOf(response)) {
        const line = JSON.parse(text) as { update?: unknown; end?: unknown; refusal?: Refusal };
        if (line.refusal !== undefined) throw new RefusedCall(line.refusal);
        if (line.end !== undefined) return line.end as Follows[N]['end'];
        if (line.update !== undefined) onUpdate(line.update as Follows[N]['update']);
      }
    } catch (error) {
      if (signal.aborted) return { kind: 'stopped' };
      throw error;
    }
    throw new Error('the stream broke off');
  }

  return {
    ask: async <N extends AskName>(name: N, args: Parameters<Asks[N]>[0]) => {
      const response = await post(`/ask/${name}`, args);
      if (!response.ok) throw await refused(response);
      return ((await response.json()) as { answer: ReturnType<Asks[N]> }).answer;
    },
    follow: (name, args, onUpdate) => {
      const abort = new AbortController();
      return {
        done: follow(name, args, onUpdate, abort.signal),
        stop: () => {
          abort.abort();
        },
      };
    },
  };
}
