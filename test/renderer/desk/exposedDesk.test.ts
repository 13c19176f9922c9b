import { describe, expect, it } from 'vitest';
import type { Beginning, Exposed, Reply, SizeEnd, SizeUpdate, StreamLine } from '../../../main/contract.js';
import { exposedDesk } from '../../../renderer/desk/exposedDesk.js';

type Line = StreamLine<SizeUpdate, SizeEnd>;

function exposed(reply: Reply<Beginning>): Exposed & { say: (line: Line) => void; stops: number } {
  const bridge = {
    stops: 0,
    say: (line: Line): void => {
      throw new Error(`nobody listens to ${JSON.stringify(line)}`);
    },
    begin: () => Promise.resolve(reply),
    remember: () => Promise.resolve({ answer: null }),
    check: () => Promise.reject(new Error('not asked')),
    size: (_: { readonly job: unknown }, onLine: (line: Line) => void) => {
      bridge.say = onLine;
      return () => {
        bridge.stops += 1;
      };
    },
  };
  return bridge;
}

const BEGINNING: Beginning = { version: '1', records: [], stockLists: [], demos: [], remembered: null };
const UPDATE: SizeUpdate = { kind: 'progress', done: 0, of: 1, material: 'steel' };

describe('the desk behind the preload', () => {
  it('answers asks, and throws refusals', async () => {
    expect(await exposedDesk(exposed({ answer: BEGINNING })).ask('begin', null)).toBe(BEGINNING);
    const refused = exposedDesk(exposed({ refusal: { code: 'failed', sentence: 'Broken.' } }));
    await expect(refused.ask('begin', null)).rejects.toMatchObject({ code: 'failed', message: 'Broken.' });
  });

  it('follows a run to its end, and hears nothing after it', async () => {
    const bridge = exposed({ answer: BEGINNING });
    const heard: unknown[] = [];
    const run = exposedDesk(bridge).follow('size', { job: {} }, (update) => heard.push(update));
    bridge.say({ alive: true });
    bridge.say({ update: UPDATE });
    run.stop();
    expect(bridge.stops).toBe(1);
    bridge.say({ end: { kind: 'stopped' } });
    bridge.say({ update: UPDATE });
    expect(await run.done).toEqual({ kind: 'stopped' });
    expect(heard).toEqual([UPDATE]);
  });
});
