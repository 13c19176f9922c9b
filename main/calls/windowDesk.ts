import type { AskName, Asks, Followed, FollowName, Follows } from '../contract.js';
import type { Runner } from '../solver/runner.js';
import { noArguments, sizeArguments } from './arguments.js';
import type { Memory } from './memory.js';
import type { Shipped } from './shipped.js';

/** The work behind each ask, from arguments that nobody has looked at yet. */
export type AskWork = { readonly [N in AskName]: (args: unknown) => Promise<ReturnType<Asks[N]>> };

/** The work behind each follow, from arguments that nobody has looked at yet. */
export type FollowWork = {
  readonly [N in FollowName]: (
    args: unknown,
    onUpdate: (update: Follows[N]['update']) => void,
  ) => Followed<Follows[N]['end']>;
};

/** What the calls of one window work with. */
export interface WindowMeans {
  readonly shipped: Shipped;
  readonly memory: Memory;
  readonly runner: Runner;
}

/** The work behind each ask of a window. Each throws Refused where its arguments are wrong. */
export function askWork({ shipped, memory }: WindowMeans): AskWork {
  return {
    begin: async (args) => {
      noArguments(args);
      return { ...shipped, remembered: await memory.recall() };
    },
    remember: async (state) => {
      await memory.keep(state);
      return null;
    },
  };
}

/** The work behind each follow of a window. Each throws Refused where its arguments are wrong. */
export function followWork({ runner }: WindowMeans): FollowWork {
  return {
    size: (args, onUpdate) => runner.size(sizeArguments(args).job, onUpdate),
  };
}
