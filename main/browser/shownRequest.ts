import type { IncomingMessage } from 'node:http';
import { clip } from '../../src/material/problem.js';

/** A request in a line of the log: method and path, clipped, without query, and without the token wherever it stands. */
export function shownRequest({ method, url }: IncomingMessage, token: string): string {
  const path = (url ?? '').split(/[?#]/)[0] ?? '';
  return `${method ?? ''} ${clip(path.replaceAll(token, '(token)'))}`;
}
