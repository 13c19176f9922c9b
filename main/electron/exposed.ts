import type { Exposed } from '../contract.js';
import { channelOfAsk, channelOfFollow, channelOfLines, channelOfStop } from './channels.js';

/** What the preload uses of Electron. */
export interface PreloadIpc {
  invoke(channel: string, ...args: readonly unknown[]): Promise<unknown>;
  send(channel: string, ...args: readonly unknown[]): void;
  on(channel: string, listener: (event: unknown, ...args: readonly unknown[]) => void): unknown;
}

type Size = Exposed['size'];
type OnLine = Parameters<Size>[1];
type Line = Parameters<OnLine>[0];

/** Arguments as JSON would carry them, so that both hosts see the same: what is undefined is left out. */
const plain = (args: unknown): unknown => (args === undefined ? null : JSON.parse(JSON.stringify(args)));

const isLast = (line: Line): boolean => 'end' in line || 'refusal' in line;

/**
 * The functions that the window gets, one for each call. The channels are written out here and not given by the window,
 * which can reach no other.
 */
export function exposedTo(ipc: PreloadIpc): Exposed {
  const listeners = new Map<number, OnLine>();
  let count = 0;
  // the desk alone sends on this channel, and speaks the contract's types
  ipc.on(channelOfLines('size'), (_event, run, line) => {
    const heard = line as Line;
    const listener = listeners.get(run as number);
    if (isLast(heard)) listeners.delete(run as number);
    listener?.(heard);
  });
  const size: Size = (args, onLine) => {
    count += 1;
    const run = count;
    listeners.set(run, onLine);
    ipc.send(channelOfFollow('size'), run, plain(args));
    return () => {
      ipc.send(channelOfStop('size'), run);
    };
  };
  // each fits its call's own type, since the desk answers each channel with the reply of the contract
  const ask =
    (channel: string) =>
    (args: unknown): Promise<never> =>
      ipc.invoke(channel, plain(args)) as Promise<never>;
  return {
    begin: ask(channelOfAsk('begin')),
    remember: ask(channelOfAsk('remember')),
    check: ask(channelOfAsk('check')),
    size,
  };
}
