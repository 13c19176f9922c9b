import type { Results } from '../job/shownResults.js';

/** "6 fit, 1 does not", "all 5 fit", "nothing fits"; empty where nothing is sized. */
export function fitWords({ candidates }: Results): string {
  const fit = candidates.filter(({ feasible }) => feasible).length;
  const not = candidates.length - fit;
  if (fit === 0) return candidates.length === 0 ? '' : 'nothing fits';
  if (not === 0) return fit === 1 ? 'it fits' : `all ${fit} fit`;
  return `${fit} ${fit === 1 ? 'fits' : 'fit'}, ${not} ${not === 1 ? 'does' : 'do'} not`;
}

/** "7 materials", "1 material". */
export function countWords(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
}

/** A time as the head says it: "0.08 s", "12 s". */
export function secondsWords(seconds: number): string {
  if (seconds < 0.005) return 'under 0.01 s';
  return `${seconds < 10 ? seconds.toFixed(2) : seconds.toFixed(0)} s`;
}
