import type { IncomingMessage } from 'node:http';
import { CALL_LIMITS } from '../calls/json.js';
import { turnedAway, type TurnedAway } from './turnedAway.js';

const JSON_TYPE = /^application\/json(?:\s*;\s*charset=utf-8)?$/i;

function tooLarge(): TurnedAway {
  return turnedAway(413, 'too-large', `the body is larger than ${CALL_LIMITS.bytes / 1e6} MB`);
}

/** Refuses by the headers what need not be read. */
function checkHead({ headers }: IncomingMessage): void {
  if (!JSON_TYPE.test(headers['content-type'] ?? ''))
    throw turnedAway(415, 'bad-arguments', 'the Content-Type is not application/json');
  if (headers['content-encoding'] !== undefined) throw turnedAway(415, 'bad-arguments', 'the body is compressed');
  if (Number(headers['content-length'] ?? 0) > CALL_LIMITS.bytes) throw tooLarge();
}

async function readBytes(request: IncomingMessage): Promise<Uint8Array> {
  const chunks: Uint8Array[] = [];
  let length = 0;
  // an iterator of the stream itself would destroy it on the way out, and with it the answer's connection
  for await (const chunk of request.iterator({ destroyOnReturn: false })) {
    const bytes = chunk as Uint8Array;
    length += bytes.length;
    if (length > CALL_LIMITS.bytes) throw tooLarge();
    chunks.push(bytes);
  }
  return Buffer.concat(chunks);
}

function parse(bytes: Uint8Array): unknown {
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
  } catch {
    throw turnedAway(400, 'bad-arguments', 'the body is not JSON text in UTF-8');
  }
}

/**
 * The JSON value that a request's body holds.
 * @throws TurnedAway where it is too large, of another type, or malformed
 */
export async function readJsonBody(request: IncomingMessage): Promise<unknown> {
  checkHead(request);
  return parse(await readBytes(request));
}
