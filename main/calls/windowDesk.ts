import type { AskName, Asks, CheckAnswer, CheckArguments, Followed, FollowName, Follows } from '../contract.js';
import type { Runner } from '../solver/runner.js';
import { checkArguments, noArguments, sizeArguments } from './arguments.js';
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
  /** checks one tube against a job */
  readonly check: (args: CheckArguments) => CheckAnswer;
}

/** The work behind each ask of a window. Each throws Refused where its arguments are wrong. */
export function askWork({ shipped, memory, check }: WindowMeans): AskWork {
  return {
    begin: async (args) => {
      noArguments(args);
      return { ...shipped, remembered: await memory.recall() };
    },
    remember: async (state) => {
      await memory.keep(state);
      return null;
    },
    check: (args) =>
      new Promise((resolve) => {
        resolve(check(checkArguments(args)));
      }),
  };
}

/** The work behind each follow of a window. Each throws Refused where its arguments are wrong. */
export function followWork({ runner }: WindowMeans): FollowWork {
  return {
    size: (args, onUpdate) => runner.size(sizeArguments(args).job, onUpdate),
  };
}
