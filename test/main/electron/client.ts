import type { Asks, AskName, Desk, Exposed, FollowName, Follows, Reply } from '../../../main/contract.js';
import { RefusedCall } from '../contract/refusedCall.js';

/** The desk of the window, over what the preload exposes. */
export function exposedDesk(exposed: Exposed): Desk {
  return {
    ask: async <N extends AskName>(name: N, args: Parameters<Asks[N]>[0]) => {
      const call = exposed[name] as (args: unknown) => Promise<Reply<ReturnType<Asks[N]>>>;
      const reply = await call(args);
      if ('refusal' in reply) throw new RefusedCall(reply.refusal);
      return reply.answer;
    },
    follow: <N extends FollowName>(
      name: N,
      args: Follows[N]['args'],
      onUpdate: (update: Follows[N]['update']) => void,
    ) => {
      let stop = (): void => undefined;
      const done = new Promise<Follows[N]['end']>((resolve, reject) => {
        stop = exposed[name](args, (line) => {
          if ('refusal' in line) reject(new RefusedCall(line.refusal));
          else if ('end' in line) resolve(line.end);
          else if ('update' in line) onUpdate(line.update);
        });
      });
      return { done, stop };
    },
  };
}
