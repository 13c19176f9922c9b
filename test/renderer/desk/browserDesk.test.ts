import { afterEach, describe, expect, it, vi } from 'vitest';
import { browserDesk } from '../../../renderer/desk/browserDesk.js';
import { DeskError } from '../../../renderer/desk/deskError.js';

const ask = vi.fn<typeof fetch>();

afterEach(() => {
  vi.unstubAllGlobals();
  ask.mockReset();
});

function answerWith(answer: () => Promise<Response>): ReturnType<typeof browserDesk> {
  vi.stubGlobal('fetch', ask.mockImplementation(answer));
  return browserDesk('secret');
}

const json = (value: unknown, status = 200): Promise<Response> =>
  Promise.resolve(new Response(JSON.stringify(value), { status }));

/** A response whose body comes in these pieces. */
const pieces = (...texts: string[]): Promise<Response> => {
  const encoder = new TextEncoder();
  const body = new ReadableStream<Uint8Array>({
    start(controller) {
      for (const text of texts) controller.enqueue(encoder.encode(text));
      controller.close();
    },
  });
  return Promise.resolve(new Response(body));
};

const progress = { kind: 'progress', done: 1, of: 2, material: 'Ti–6Al' } as const;

describe('an ask', () => {
  it('posts its arguments as JSON with token and window, and gives the answer', async () => {
    const desk = answerWith(() => json({ answer: null }));
    expect(await desk.ask('remember', { a: 1 })).toBeNull();
    const [path, init] = ask.mock.calls[0] ?? [];
    expect(path).toBe('/ask/remember');
    expect(init).toMatchObject({ method: 'POST', body: '{"a":1}' });
    expect(init?.headers).toMatchObject({ 'content-type': 'application/json', 'x-wringwall-token': 'secret' });
    expect((init?.headers as Record<string, string>)['x-wringwall-window']).toMatch(/^[a-z0-9-]{1,64}$/);
  });

  it.each([
    [
      'a refusal',
      () => json({ refusal: { code: 'too-large', sentence: 'Too large.' } }, 413),
      'too-large',
      'Too large.',
    ],
    [
      'a refusal in a reply',
      () => json({ refusal: { code: 'bad-arguments', sentence: 'No.' } }),
      'bad-arguments',
      'No.',
    ],
    ['no sense', () => Promise.resolve(new Response('oops', { status: 500 })), 'failed', 'does not answer'],
    ['nothing', () => Promise.reject(new TypeError('network')), 'failed', 'does not answer'],
  ])('throws a sentence where the host gives %s', async (_, answer, code, sentence) => {
    const error = await answerWith(answer)
      .ask('begin', null)
      .catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(DeskError);
    expect(error).toMatchObject({ code, message: expect.stringContaining(sentence) as unknown });
  });
});

describe('a follow', () => {
  it('hears lines however they are cut, and ends with the last', async () => {
    const text = `{"alive":true}\n${JSON.stringify({ update: progress })}\n{"end":{"kind":"stopped"}}`;
    const bytes = Array.from(text);
    const heard: unknown[] = [];
    const { done } = answerWith(() => pieces(...bytes)).follow('size', { job: {} }, (update) => heard.push(update));
    expect(await done).toEqual({ kind: 'stopped' });
    expect(heard).toEqual([progress]);
    expect(ask.mock.calls[0]?.[0]).toBe('/follow/size');
  });

  it.each([
    ['breaks off', () => pieces(`${JSON.stringify({ update: progress })}\n`), 'does not answer'],
    ['is not JSON', () => pieces('oops\n'), 'does not answer'],
    ['refuses in a line', () => pieces('{"refusal":{"code":"failed","sentence":"Broken."}}\n'), 'Broken.'],
    ['refuses at once', () => json({ refusal: { code: 'not-allowed', sentence: 'Not you.' } }, 401), 'Not you.'],
    ['does not answer', () => Promise.reject(new TypeError('network')), 'does not answer'],
  ])('fails where the stream %s', async (_, answer, sentence) => {
    const { done } = answerWith(answer).follow('size', { job: {} }, () => undefined);
    await expect(done).rejects.toThrow(sentence);
  });

  it('is stopped by breaking the request off', async () => {
    const desk = answerWith(() => new Promise<Response>(() => undefined));
    const { done, stop } = desk.follow('size', { job: {} }, () => undefined);
    stop();
    expect(await done).toEqual({ kind: 'stopped' });
    expect(ask.mock.calls[0]?.[1]?.signal?.aborted).toBe(true);
  });
});
