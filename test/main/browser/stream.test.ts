import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { expect, it, onTestFinished } from 'vitest';
import { answerStream } from '../../../main/browser/stream.js';
import { HEARTBEAT } from '../../../main/browser/wire.js';
import type { AnyLine, Service } from '../../../main/calls/service.js';

/** Serves one stream to whoever asks. */
async function streamed(follow: Service['follow']): Promise<string> {
  const service: Service = { ask: () => Promise.resolve({ answer: null }), follow };
  const server = createServer((_request, response) => {
    answerStream(response, service, 'size', null);
  });
  onTestFinished(() => {
    server.closeAllConnections();
    server.close();
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return `http://127.0.0.1:${String((server.address() as AddressInfo).port)}/`;
}

it('shows a sign of life in every heartbeat in which a run says nothing', async () => {
  const address = await streamed((_name, _args, onLine) => {
    setTimeout(() => {
      onLine({ end: 1 });
    }, 1.5 * HEARTBEAT);
    return () => undefined;
  });
  expect(await (await fetch(address)).text()).toBe('{"alive":true}\n{"end":1}\n');
});

it('ends with a refusal as its only line', async () => {
  const refusal = { code: 'bad-arguments', sentence: 'No.' } as const;
  const address = await streamed((_name, _args, onLine) => {
    onLine({ refusal });
    return () => undefined;
  });
  expect(await (await fetch(address)).text()).toBe(`${JSON.stringify({ refusal })}\n`);
});

it('stops the run when its client goes away, and writes no more', async () => {
  let say: (line: AnyLine) => void = () => undefined;
  const stopped = new Promise<void>((resolve) => {
    void streamed((_name, _args, onLine) => {
      say = onLine;
      return resolve;
    }).then(async (address) => {
      const abort = new AbortController();
      await fetch(address, { signal: abort.signal });
      abort.abort();
    });
  });
  await stopped;
  expect(() => {
    say({ update: 1 });
    say({ end: 1 });
  }).not.toThrow();
});
