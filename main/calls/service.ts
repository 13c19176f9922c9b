import { ASKS, FOLLOWS, type Reply, type StreamLine } from '../contract.js';
import { Refused, refusalOf } from './refused.js';
import type { AskWork, FollowWork } from './windowDesk.js';

/** A line of any stream. */
export type AnyLine = StreamLine<unknown, unknown>;

/** The calls of one window as a host hands them on: names and arguments unchecked, outcomes as plain data. */
export interface Service {
  ask(name: string, args: unknown): Promise<Reply<unknown>>;
  /** Gives the lines of a stream to `onLine`, `end` or `refusal` last; returns what stops it. */
  follow(name: string, args: unknown, onLine: (line: AnyLine) => void): () => void;
}

function known<Name extends string>(name: string, names: readonly Name[]): Name {
  const found = names.find((own) => own === name);
  if (found === undefined) throw new Refused({ code: 'unknown-call', sentence: 'There is no such call.' });
  return found;
}

/** Serves the calls of one window. Whatever goes wrong becomes a refusal; nothing is thrown. */
export function serveWindow(asks: AskWork, follows: FollowWork, log: (line: string) => void): Service {
  return {
    ask: async (name, args) => {
      try {
        return { answer: await asks[known(name, ASKS)](args) };
      } catch (error) {
        return { refusal: refusalOf(error, log) };
      }
    },
    follow: (name, args, onLine) => {
      try {
        const followed = follows[known(name, FOLLOWS)](args, (update) => {
          onLine({ update });
        });
        void followed.done.then((end) => {
          onLine({ end });
        });
        return followed.stop;
      } catch (error) {
        onLine({ refusal: refusalOf(error, log) });
        return () => undefined;
      }
    },
  };
}
