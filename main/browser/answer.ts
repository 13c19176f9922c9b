import type { IncomingMessage, ServerResponse } from 'node:http';
import type { Refusal } from '../contract.js';
import { POLICY_HEADERS } from '../policy.js';

/** What a refused request may still send, bytes and milliseconds, so that its client gets to read why. */
const DRAIN = { bytes: 16_000_000, time: 5000 };

/** Answers with a whole body. */
export function answerBytes(response: ServerResponse, status: number, type: string, body: Uint8Array): void {
  response.writeHead(status, { ...POLICY_HEADERS, 'Content-Type': type, 'Content-Length': body.length });
  response.end(body);
}

/** Sends a browser on to another address of the host. */
export function answerElsewhere(response: ServerResponse, address: string): void {
  response.writeHead(302, { ...POLICY_HEADERS, Location: address, 'Content-Length': 0 });
  response.end();
}

/** Answers with a JSON value. */
export function answerJson(response: ServerResponse, status: number, value: unknown): void {
  answerBytes(response, status, 'application/json; charset=utf-8', Buffer.from(JSON.stringify(value)));
}

/** Lets go of a body that nobody reads, within bounds. */
function drain(request: IncomingMessage): void {
  if (request.readableEnded || request.destroyed) return;
  let length = 0;
  const end = (): void => {
    request.destroy();
  };
  const limit = setTimeout(end, DRAIN.time);
  request.on('data', (chunk: Uint8Array) => {
    length += chunk.length;
    if (length > DRAIN.bytes) end();
  });
  request.on('close', () => {
    clearTimeout(limit);
  });
}

/** Answers with a refusal, and closes the connection once the rest of the body is gone. */
export function answerRefusal(
  request: IncomingMessage,
  response: ServerResponse,
  status: number,
  refusal: Refusal,
): void {
  response.setHeader('Connection', 'close');
  drain(request);
  answerJson(response, status, { refusal });
}
