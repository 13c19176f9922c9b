import { expect, it } from 'vitest';
import { ASKS, FOLLOWS } from '../../../main/contract.js';
import { exposedTo, type PreloadIpc } from '../../../main/electron/exposed.js';

interface Told {
  readonly sent: unknown[][];
  readonly hear: (channel: string, ...args: readonly unknown[]) => void;
  readonly ipc: PreloadIpc;
}

function told(): Told {
  const sent: unknown[][] = [];
  const listeners = new Map<string, (event: unknown, ...args: readonly unknown[]) => void>();
  const ipc: PreloadIpc = {
    invoke: (...args) => {
      sent.push(args);
      return Promise.resolve({ answer: null });
    },
    send: (...args) => void sent.push(args),
    on: (channel, listener) => listeners.set(channel, listener),
  };
  return { sent, ipc, hear: (channel, ...args) => listeners.get(channel)?.({}, ...args) };
}

const LINES = 'wringwall:lines:size';

it('exposes a function for each call of the contract and nothing else', () => {
  const exposed = exposedTo(told().ipc);
  expect(Object.keys(exposed).sort()).toEqual([...ASKS, ...FOLLOWS].sort());
});

it('asks on the channel of the call, with what JSON would carry', async () => {
  const { sent, ipc } = told();
  const exposed = exposedTo(ipc);
  await exposed.begin(null);
  await exposed.remember({ kept: 1, left: undefined });
  await exposed.remember(undefined);
  expect(sent).toEqual([
    ['wringwall:ask:begin', null],
    ['wringwall:ask:remember', { kept: 1 }],
    ['wringwall:ask:remember', null],
  ]);
});

it('gives each run the lines of its own number until the last', () => {
  const { ipc, hear, sent } = told();
  const exposed = exposedTo(ipc);
  const one: unknown[] = [];
  const two: unknown[] = [];
  const stop = exposed.size({ job: 1 }, (line) => one.push(line));
  exposed.size({ job: 2 }, (line) => two.push(line));
  hear(LINES, 2, { update: 'a' });
  hear(LINES, 1, { end: 'b' });
  hear(LINES, 1, { update: 'late' });
  hear(LINES, 3, { update: 'nobody' });
  stop();
  expect(one).toEqual([{ end: 'b' }]);
  expect(two).toEqual([{ update: 'a' }]);
  expect(sent).toEqual([
    ['wringwall:follow:size', 1, { job: 1 }],
    ['wringwall:follow:size', 2, { job: 2 }],
    ['wringwall:stop:size', 1],
  ]);
});
