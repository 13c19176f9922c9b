import type { AskName, FollowName } from '../contract.js';

/** Names of the channels between preload and desk; each call has its own. */
export const channelOfAsk = (name: AskName): string => `wringwall:ask:${name}`;
export const channelOfFollow = (name: FollowName): string => `wringwall:follow:${name}`;
/** stops a run of the window that speaks, by the number that its preload gave it */
export const channelOfStop = (name: FollowName): string => `wringwall:stop:${name}`;
/** the lines of a window's runs, each with its run's number */
export const channelOfLines = (name: FollowName): string => `wringwall:lines:${name}`;
