import { POLICY_HEADERS } from '../policy.js';
import type { WindowFiles } from '../windowFiles.js';

/** The scheme under which the window's files are served, and nothing else is. */
export const SCHEME = 'wringwall';
export const PAGE = `${SCHEME}://window/`;

const isPage = (url: URL): boolean => url.protocol === `${SCHEME}:` && url.host === 'window';

/** Whether an address is the window's own page. */
export function isOwnPage(address: string): boolean {
  return URL.canParse(address) && isPage(new URL(address));
}

function refused(status: number): Response {
  return new Response(null, { status, headers: POLICY_HEADERS });
}

/** Answers what the window asks for under its scheme: a file of the built window, with the policy's headers. */
export function answerFrom(
  files: WindowFiles,
): (request: { readonly url: string; readonly method: string }) => Response {
  return ({ url, method }) => {
    if (method !== 'GET') return refused(405);
    if (!isOwnPage(url)) return refused(403);
    const file = files.get(new URL(url).pathname);
    if (file === undefined) return refused(404);
    return new Response(file.bytes, { status: 200, headers: { ...POLICY_HEADERS, 'Content-Type': file.type } });
  };
}
