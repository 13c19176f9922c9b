import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { Desk } from '../calls/desk.js';
import { ASKS, FOLLOWS } from '../contract.js';
import type { WindowFiles } from '../windowFiles.js';
import { answerBytes, answerElsewhere, answerJson, answerRefusal } from './answer.js';
import { readJsonBody } from './body.js';
import { checkCaller, checkPlace, newToken, windowOf, type Gate } from './gate.js';
import { shownRequest } from './shownRequest.js';
import { answerStream } from './stream.js';
import { newTickets, type Tickets } from './tickets.js';
import { refusedCall, TurnedAway, turnedAway } from './turnedAway.js';
import { openWindows, type Windows } from './windows.js';

/** The only address that the host listens on. */
const LOOPBACK = '127.0.0.1';

/** The query of an address that holds a ticket. */
const TICKET = 'ticket=';

/** What a browser host is made of. */
export interface HostOptions {
  readonly desk: Desk;
  readonly files: WindowFiles;
  /** takes one line for each refusal; no line holds the token */
  readonly log: (line: string) => void;
}

/** A browser host that listens. */
export interface BrowserHost {
  /** what a browser opens; holds the token */
  readonly address: string;
  readonly gate: Gate;
  /** an address that leads one browser to the above, once, and does not hold the token */
  ticketAddress(): string;
  /** ends the host, its runs and its workers */
  close(): Promise<void>;
}

interface Means {
  readonly gate: Gate;
  readonly files: WindowFiles;
  readonly windows: Windows;
  readonly tickets: Tickets;
}

/** A call as the path names it; null for any other path. */
function callOf(path: string): readonly [kind: string, name: string] | null {
  const [, kind, name] = /^\/(ask|follow)\/([a-z-]{1,40})$/.exec(path) ?? [];
  return kind === undefined || name === undefined ? null : [kind, name];
}

function answerFile(request: IncomingMessage, response: ServerResponse, { gate, files, tickets }: Means): void {
  checkPlace(request.headers, gate);
  // the query is no part of a file's name, and nothing is decoded: the list holds each path as it must be asked for
  const [path = '', query = ''] = (request.url ?? '').split('?');
  if (path === '/' && query.startsWith(TICKET) && tickets.spend(query.slice(TICKET.length))) {
    answerElsewhere(response, `/#${gate.token}`);
    return;
  }
  const file = files.get(path);
  if (file === undefined) throw turnedAway(404, 'unknown-call', 'there is no such file');
  answerBytes(response, 200, file.type, file.bytes);
}

async function answerCall(request: IncomingMessage, response: ServerResponse, { gate, windows }: Means): Promise<void> {
  checkCaller(request.headers, gate);
  const [kind, name] = callOf(request.url ?? '') ?? [];
  const names: readonly string[] = kind === 'ask' ? ASKS : FOLLOWS;
  if (name === undefined || !names.includes(name)) throw turnedAway(404, 'unknown-call', 'there is no such call');
  const id = windowOf(request.headers);
  const args = await readJsonBody(request);
  const service = windows.of(id);
  if (kind === 'follow') {
    answerStream(response, service, name, args);
    return;
  }
  const reply = await service.ask(name, args);
  if (!('refusal' in reply)) answerJson(response, 200, reply);
  else throw refusedCall(reply.refusal);
}

async function answer(request: IncomingMessage, response: ServerResponse, means: Means): Promise<void> {
  if (request.method === 'GET') answerFile(request, response, means);
  else if (request.method === 'POST') await answerCall(request, response, means);
  else throw turnedAway(405, 'not-allowed', 'the method is neither GET nor POST');
}

function turnAway(request: IncomingMessage, response: ServerResponse, error: unknown): string {
  const known = error instanceof TurnedAway ? error : turnedAway(500, 'failed', 'the host met an error');
  if (response.headersSent || response.destroyed) response.destroy();
  else answerRefusal(request, response, known.status, known.refusal);
  return known.reason;
}

function listen(server: Server): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(0, LOOPBACK, () => {
      const address = server.address();
      resolve(typeof address === 'object' && address !== null ? address.port : 0);
    });
  });
}

/** What a socket says whose other end has gone, as when the window stops a run: nobody is refused. */
const GONE: ReadonlySet<string> = new Set(['ECONNRESET', 'EPIPE']);

/** Opens the host on the loopback address, at a port of the system's choice, with a token of its own. */
export async function openHost({ desk, files, log }: HostOptions): Promise<BrowserHost> {
  const server = createServer({ requestTimeout: 20_000, headersTimeout: 10_000, maxHeaderSize: 16_384 });
  const port = await listen(server);
  const gate: Gate = { host: `${LOOPBACK}:${port}`, token: newToken() };
  const windows = openWindows(desk);
  const tickets = newTickets();
  const means: Means = { gate, files, windows, tickets };
  server.on('request', (request: IncomingMessage, response: ServerResponse) => {
    answer(request, response, means).catch((error: unknown) => {
      log(`refused ${shownRequest(request, gate.token)}: ${turnAway(request, response, error)}`);
    });
  });
  server.on('clientError', (error: NodeJS.ErrnoException, socket) => {
    if (!GONE.has(error.code ?? '')) log(`refused a request that is not HTTP: ${error.code ?? 'malformed'}`);
    if (socket.writable) socket.end('HTTP/1.1 400 Bad Request\r\nConnection: close\r\n\r\n');
    else socket.destroy();
  });
  return {
    address: `http://${gate.host}/#${gate.token}`,
    gate,
    ticketAddress: () => `http://${gate.host}/?${TICKET}${tickets.issue()}`,
    close: async () => {
      const closed = new Promise((resolve) => server.close(resolve));
      server.closeAllConnections();
      await Promise.all([closed, windows.close(), desk.settled()]);
    },
  };
}
