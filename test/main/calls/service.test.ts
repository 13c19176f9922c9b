import { describe, expect, it } from 'vitest';
import { Refused } from '../../../main/calls/refused.js';
import { serveWindow, type AnyLine, type Service } from '../../../main/calls/service.js';
import type { AskWork, FollowWork } from '../../../main/calls/windowDesk.js';

function served(own: { asks?: Partial<AskWork>; follows?: Partial<FollowWork> }): { service: Service; log: string[] } {
  const log: string[] = [];
  const none = (): never => {
    throw new Error('not called');
  };
  const asks: AskWork = { begin: none, remember: none, check: none, ...own.asks };
  const follows: FollowWork = { size: none, ...own.follows };
  return { service: serveWindow(asks, follows, (line) => log.push(line)), log };
}

describe('a service', () => {
  it.each(['nothing', 'constructor', '__proto__', '', 'size'])('refuses the ask %j', async (name) => {
    const { service } = served({});
    expect(await service.ask(name, null)).toMatchObject({ refusal: { code: 'unknown-call' } });
  });

  it.each(['begin', 'toString'])('refuses to follow %j', (name) => {
    const lines: AnyLine[] = [];
    served({}).service.follow(name, null, (line) => lines.push(line))();
    expect(lines).toMatchObject([{ refusal: { code: 'unknown-call' } }]);
  });

  it('tells a fault of the machine as failed, in one line without a stack, and logs it', async () => {
    const fault = new Error('the disk is full\n    at somewhere.js:1:1');
    const { service, log } = served({ asks: { remember: () => Promise.reject(fault) } });
    expect(await service.ask('remember', 1)).toEqual({
      refusal: { code: 'failed', sentence: 'The desk met an error: the disk is full' },
    });
    expect(log).toEqual(['failed: the disk is full']);
  });

  it('passes on a refusal as it is', async () => {
    const refusal = { code: 'too-large', sentence: 'No.' } as const;
    const { service, log } = served({ asks: { remember: () => Promise.reject(new Refused(refusal)) } });
    expect(await service.ask('remember', 1)).toEqual({ refusal });
    expect(log).toEqual([]);
  });

  it('gives the lines of a stream, the end last, and what stops it', async () => {
    let stopped = 0;
    const { service } = served({
      follows: {
        size: (_args, onUpdate) => {
          onUpdate({ kind: 'restarted', reason: 'r' });
          return { done: Promise.resolve({ kind: 'stopped' }), stop: () => (stopped += 1) };
        },
      },
    });
    const lines: AnyLine[] = [];
    await new Promise<void>((resolve) => {
      const stop = service.follow('size', null, (line) => {
        lines.push(line);
        if ('end' in line) resolve();
      });
      stop();
    });
    expect(lines).toEqual([{ update: { kind: 'restarted', reason: 'r' } }, { end: { kind: 'stopped' } }]);
    expect(stopped).toBe(1);
  });
});
