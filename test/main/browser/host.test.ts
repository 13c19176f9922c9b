import { request as httpRequest, type IncomingHttpHeaders } from 'node:http';
import { connect } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import { describe, expect, it } from 'vitest';
import type { Gate } from '../../../main/browser/gate.js';
import { POLICY_HEADERS } from '../../../main/policy.js';
import { jobOf, loadCases, metals } from '../solver/jobs.js';
import { httpDesk, pageHeaders } from './client.js';
import { testHost } from './opened.js';

interface Sent {
  readonly method?: string;
  readonly path?: string;
  readonly headers?: Readonly<Record<string, string>>;
  readonly without?: readonly string[];
  readonly body?: string | Buffer;
}

interface Got {
  readonly status: number;
  readonly headers: IncomingHttpHeaders;
  readonly body: string;
}

/** Sends a request as it is told to: what a browser would put right, such as the Host, is left as given. */
function send(
  gate: Gate,
  { method = 'POST', path = '/ask/begin', headers = {}, without = [], body }: Sent,
): Promise<Got> {
  const [hostname, port] = gate.host.split(':');
  const own = { host: gate.host, ...pageHeaders(gate), ...headers };
  const kept = Object.fromEntries(Object.entries(own).filter(([name]) => !without.includes(name)));
  return new Promise((resolve, reject) => {
    const request = httpRequest({ hostname, port, method, path, headers: kept, setHost: false }, (response) => {
      let text = '';
      response.on('data', (part: Buffer) => {
        text += part.toString('utf8');
      });
      response.on('end', () => {
        resolve({ status: response.statusCode ?? 0, headers: response.headers, body: text });
      });
    });
    request.on('error', reject);
    request.end(body ?? (method === 'POST' ? 'null' : undefined));
  });
}

const big = (bytes: number): Buffer => Buffer.alloc(bytes, ' ');

/** Each request that must be refused: the status, and what the log says after the method and path. */
const REFUSED: readonly (readonly [name: string, sent: Sent, status: number, why: string])[] = [
  ['without a token', { without: ['x-wringwall-token'] }, 401, 'the token is missing'],
  ['with an empty token', { headers: { 'x-wringwall-token': '' } }, 401, 'the token is wrong'],
  ['with another token', { headers: { 'x-wringwall-token': 'A'.repeat(43) } }, 401, 'the token is wrong'],
  ['with another Host', { headers: { host: 'wringwall.example' } }, 403, 'the Host is not this host'],
  ['with a Host of another port', { headers: { host: '127.0.0.1:1' } }, 403, 'the Host is not this host'],
  ['with the Host by its name', { headers: { host: 'localhost' } }, 403, 'the Host is not this host'],
  ['with another Origin', { headers: { origin: 'http://wringwall.example' } }, 403, 'the Origin is another page'],
  ['with the Origin "null"', { headers: { origin: 'null' } }, 403, 'the Origin is another page'],
  ['with an Origin of another port', { headers: { origin: 'http://127.0.0.1:1' } }, 403, 'the Origin is another page'],
  ['without an Origin', { without: ['origin'] }, 403, 'the Origin is missing'],
  ['from another site', { headers: { 'sec-fetch-site': 'cross-site' } }, 403, 'it comes from another site'],
  ['from another port', { headers: { 'sec-fetch-site': 'same-site' } }, 403, 'it comes from another site'],
  ['from no page', { headers: { 'sec-fetch-site': 'none' } }, 403, 'it does not come from the page'],
  ['by another method', { method: 'PUT' }, 405, 'the method is neither GET nor POST'],
  ['by a preflight', { method: 'OPTIONS' }, 405, 'the method is neither GET nor POST'],
  ['of another type', { headers: { 'content-type': 'text/plain' } }, 415, 'the Content-Type is not application/json'],
  ['of no type', { without: ['content-type'] }, 415, 'the Content-Type is not application/json'],
  ['that is compressed', { headers: { 'content-encoding': 'gzip' } }, 415, 'the body is compressed'],
  ['of malformed JSON', { body: '{"job":' }, 400, 'the body is not JSON text in UTF-8'],
  ['of nothing', { body: '' }, 400, 'the body is not JSON text in UTF-8'],
  ['of bytes that are no text', { body: Buffer.from([0x22, 0xff, 0x22]) }, 400, 'the body is not JSON text in UTF-8'],
  ['of 10 MB', { body: big(10_000_000) }, 413, 'the body is larger than 4 MB'],
  [
    'of 10 MB in pieces',
    { body: big(10_000_000), headers: { 'transfer-encoding': 'chunked' } },
    413,
    'the body is larger than 4 MB',
  ],
  [
    'of a window with an id of its own making',
    { headers: { 'x-wringwall-window': '../x' } },
    400,
    'the id of the window is malformed',
  ],
  ['for a call that is none', { path: '/ask/nothing' }, 404, 'there is no such call'],
  ['for an ask that is to be followed', { path: '/follow/begin' }, 404, 'there is no such call'],
  ['for a name that objects inherit', { path: '/ask/constructor' }, 404, 'there is no such call'],
  ['for a call with more after it', { path: '/ask/begin/more' }, 404, 'there is no such call'],
  ['with arguments that it does not take', { body: '{}' }, 400, 'This call takes no arguments; expected null.'],
];

const NO_FILE = 'there is no such file';
const REFUSED_FILES: readonly (readonly [path: string, status: number, why: string])[] = [
  ['/package.json', 404, NO_FILE],
  ['/../package.json', 404, NO_FILE],
  ['/assets/../../package.json', 404, NO_FILE],
  ['/%2e%2e/package.json', 404, NO_FILE],
  ['/assets%2fwindow.js', 404, NO_FILE],
  ['/assets', 404, NO_FILE],
  ['//assets/window.js', 404, NO_FILE],
  ['/ask/begin', 404, NO_FILE],
];

describe('a call', () => {
  it('of the page is answered, with the policy in every answer', async () => {
    const { host, log } = await testHost();
    const got = await send(host.gate, {});
    expect(got.status).toBe(200);
    expect(JSON.parse(got.body)).toMatchObject({ answer: { remembered: null } });
    for (const [name, value] of Object.entries(POLICY_HEADERS)) expect(got.headers[name.toLowerCase()]).toBe(value);
    expect(got.headers).not.toHaveProperty('set-cookie');
    expect(got.headers).not.toHaveProperty('access-control-allow-origin');
    expect(log).toEqual([]);
  });

  it.each(REFUSED)('%s is refused, and the log says why', async (_name, sent, status, why) => {
    const { host, log } = await testHost();
    const got = await send(host.gate, sent);
    expect(got.status).toBe(status);
    const { refusal } = JSON.parse(got.body) as { refusal: { code: string; sentence: string } };
    expect(refusal.sentence).toContain(why);
    expect(got.headers['content-security-policy']).toBe(POLICY_HEADERS['Content-Security-Policy']);
    expect(log).toEqual([`refused ${sent.method ?? 'POST'} ${sent.path ?? '/ask/begin'}: ${why}`]);
  });

  it('of 4 MB is read', async () => {
    const { host } = await testHost();
    const body = JSON.stringify('x'.repeat(3_999_998));
    expect((await send(host.gate, { path: '/ask/remember', body })).status).toBe(200);
  });

  it('leaves the host as it was when it is refused', async () => {
    const { host } = await testHost();
    for (const [, sent] of REFUSED) await send(host.gate, sent);
    expect((await send(host.gate, {})).status).toBe(200);
  });

  it('has no line in the log that holds the token, or that it could break', async () => {
    const { host, log } = await testHost();
    const { token } = host.gate;
    await send(host.gate, { path: `/${token}?${token}`, without: ['x-wringwall-token'] });
    await send(host.gate, { method: 'GET', path: `/${'a'.repeat(5000)}%0Aforged` });
    expect(log).toHaveLength(2);
    expect(log[0]).toBe('refused POST /(token): the token is missing');
    expect(log[1]?.length).toBeLessThan(120);
  });
});

describe('a stream', () => {
  const long = JSON.stringify({ job: jobOf({ materials: metals(40), loads: loadCases(30) }) });

  it('is lines of JSON, the last of them the end', async () => {
    const { host } = await testHost();
    const got = await send(host.gate, { path: '/follow/size', body: JSON.stringify({ job: jobOf() }) });
    expect(got.headers['content-type']).toBe('application/x-ndjson; charset=utf-8');
    expect(got.body.endsWith('\n')).toBe(true);
    const lines = got.body.trimEnd().split('\n');
    const keys = lines.map((line) => Object.keys(JSON.parse(line) as object).join());
    expect(new Set(keys.slice(0, -1))).toEqual(new Set(['update']));
    expect(keys.at(-1)).toBe('end');
  });

  it('of one window is not superseded by that of another', async () => {
    const { host } = await testHost();
    const both = ['one', 'two'].map((id) =>
      send(host.gate, { path: '/follow/size', body: long, headers: { 'x-wringwall-window': id } }),
    );
    for (const { body } of await Promise.all(both)) expect(body).toContain('"kind":"report"');
  });

  it('that its client leaves stops the run', async () => {
    const { host } = await testHost();
    const desk = httpDesk(host.gate);
    const followed = desk.follow('size', JSON.parse(long) as { job: unknown }, () => {
      followed.stop();
    });
    expect(await followed.done).toEqual({ kind: 'stopped' });
    const begun = performance.now();
    expect((await desk.follow('size', { job: jobOf() }, () => undefined).done).kind).toBe('report');
    expect(performance.now() - begun).toBeLessThan(3000);
  });
});

describe('a file', () => {
  it.each(['/', '/?theme=paper', '/assets/window.js'])('%s of the window is given', async (path) => {
    const { host } = await testHost();
    const got = await send(host.gate, {
      method: 'GET',
      path,
      without: ['x-wringwall-token', 'origin', 'content-type'],
    });
    expect(got.status).toBe(200);
    expect(got.headers['x-content-type-options']).toBe('nosniff');
  });

  it.each(REFUSED_FILES)('%s is refused', async (path, status, why) => {
    const { host, log } = await testHost();
    expect((await send(host.gate, { method: 'GET', path })).status).toBe(status);
    expect(log).toEqual([`refused GET ${path}: ${why}`]);
  });

  it('is refused to another Host and to another site', async () => {
    const { host, log } = await testHost();
    const page = { method: 'GET', path: '/' };
    expect((await send(host.gate, { ...page, headers: { host: 'wringwall.example' } })).status).toBe(403);
    expect((await send(host.gate, { ...page, headers: { 'sec-fetch-site': 'cross-site' } })).status).toBe(403);
    expect(log).toHaveLength(2);
  });
});

describe('a ticket', () => {
  const open = (host: { readonly gate: Gate }, address: string): Promise<Got> =>
    send(host.gate, { method: 'GET', path: address.slice(`http://${host.gate.host}`.length) });

  it('leads a browser to the token once, and then to the bare page', async () => {
    const { host, log } = await testHost();
    const address = host.ticketAddress();
    expect(address).not.toContain(host.gate.token);
    const first = await open(host, address);
    expect([first.status, first.headers.location]).toEqual([302, `/#${host.gate.token}`]);
    const second = await open(host, address);
    expect([second.status, second.headers.location]).toEqual([200, undefined]);
    expect(log).toEqual([]);
  });

  it('made up leads to the bare page, and one is spent on no other path or place', async () => {
    const { host } = await testHost();
    expect((await open(host, `http://${host.gate.host}/?ticket=`)).status).toBe(200);
    const path = host.ticketAddress().slice(`http://${host.gate.host}`.length);
    expect((await send(host.gate, { method: 'GET', path: `/index.html${path.slice(1)}` })).status).toBe(404);
    const elsewhere = { 'sec-fetch-site': 'cross-site' };
    expect((await send(host.gate, { method: 'GET', path, headers: elsewhere })).status).toBe(403);
    expect((await send(host.gate, { method: 'GET', path })).status).toBe(302);
  });
});

describe('a host', () => {
  it('listens on the loopback address alone, with a token of 256 bits for each start', async () => {
    const one = (await testHost()).host;
    const two = (await testHost()).host;
    expect(one.address).toMatch(/^http:\/\/127\.0\.0\.1:\d+\/#[A-Za-z0-9_-]{43}$/);
    expect(one.gate.token).not.toBe(two.gate.token);
    expect(one.address.endsWith(`#${one.gate.token}`)).toBe(true);
  });

  it('answers what is not HTTP with 400, and says so', async () => {
    const { host, log } = await testHost();
    const answer = await new Promise<string>((resolve) => {
      const socket = connect(Number(host.gate.host.split(':')[1]), '127.0.0.1', () =>
        socket.write('\u0016\u0003\u0001\r\n\r\n'),
      );
      socket.on('data', (text) => {
        resolve(text.toString('utf8'));
      });
    });
    expect(answer).toMatch(/^HTTP\/1\.1 400 /);
    expect(log[0]).toMatch(/^refused a request that is not HTTP: /);
  });

  it('that closes ends what is in flight', async () => {
    const { host } = await testHost();
    const job = jobOf({ materials: metals(40), loads: loadCases(30) });
    const broken = httpDesk(host.gate)
      .follow('size', { job }, () => undefined)
      .done.catch(() => 'broken off');
    await wait(50);
    await host.close();
    expect(await broken).toBe('broken off');
    await expect(send(host.gate, {})).rejects.toThrow('ECONNREFUSED');
  });
});
