import type { ServerResponse } from 'node:http';
import type { AnyLine, Service } from '../calls/service.js';
import { POLICY_HEADERS } from '../policy.js';
import { HEARTBEAT } from './wire.js';

/** Bytes that may wait for a client that does not read; a run whose client reads nothing is stopped. */
const MOST_WAITING = 64_000_000;

/**
 * Answers with the lines of a stream, each as it comes, with signs of life between them. A client that goes away stops
 * the run. A refusal that comes before anything else is the whole stream.
 */
export function answerStream(response: ServerResponse, service: Service, name: string, args: unknown): void {
  response.writeHead(200, { ...POLICY_HEADERS, 'Content-Type': 'application/x-ndjson; charset=utf-8' });
  response.flushHeaders();
  const write = (line: AnyLine): void => {
    if (response.writableEnded || response.destroyed) return;
    response.write(`${JSON.stringify(line)}\n`);
    if (response.writableLength > MOST_WAITING) response.destroy();
  };
  const heart = setInterval(() => {
    write({ alive: true });
  }, HEARTBEAT);
  const stop = service.follow(name, args, (line) => {
    write(line);
    if ('end' in line || 'refusal' in line) response.end();
  });
  response.on('close', () => {
    clearInterval(heart);
    stop();
  });
}
