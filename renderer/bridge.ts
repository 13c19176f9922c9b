import type { Desk, Exposed } from '../main/contract.js';
import { browserDesk } from './desk/browserDesk.js';
import { exposedDesk } from './desk/exposedDesk.js';
import { takeToken } from './desk/token.js';

declare global {
  interface Window {
    /** the contract as Electron's preload gives it; absent in a browser */
    readonly wringwall?: Exposed;
  }
}

/** The desk behind this window, whoever hosts it. */
export function openDesk(): Desk {
  return window.wringwall === undefined ? browserDesk(takeToken(window)) : exposedDesk(window.wringwall);
}
