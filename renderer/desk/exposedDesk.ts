import type { AskName, Asks, Desk, Exposed, FollowName, Follows, Reply } from '../../main/contract.js';
import { answerOf } from './deskError.js';
import { hearing } from './hearing.js';

type Ask<N extends AskName> = (args: Parameters<Asks[N]>[0]) => Promise<Reply<ReturnType<Asks[N]>>>;

/** The desk behind Electron's preload. */
export function exposedDesk(exposed: Exposed): Desk {
  return {
    async ask<N extends AskName>(name: N, args: Parameters<Asks[N]>[0]) {
      // each entry of the map has this type, which the compiler does not see through the map
      const call = exposed[name] as Ask<N>;
      return answerOf(await call(args));
    },
    follow<N extends FollowName>(name: N, args: Follows[N]['args'], onUpdate: (update: Follows[N]['update']) => void) {
      const heard = hearing<Follows[N]['update'], Follows[N]['end']>(onUpdate);
      const stop = exposed[name](args, heard.line);
      return { done: heard.done, stop };
    },
  };
}
