import { expect, it } from 'vitest';
import { countWords, fitWords, secondsWords } from '../../../renderer/shell/runWords.js';
import type { Results } from '../../../renderer/job/shownResults.js';

function results(...feasible: boolean[]): Results {
  return { candidates: feasible.map((fits) => ({ feasible: fits })) } as unknown as Results;
}

it.each([
  [[], ''],
  [[false], 'nothing fits'],
  [[false, false], 'nothing fits'],
  [[true], 'it fits'],
  [[true, true], 'all 2 fit'],
  [[true, false], '1 fits, 1 does not'],
  [[true, true, false, false], '2 fit, 2 do not'],
])('says of %j: %s', (feasible, words) => {
  expect(fitWords(results(...feasible))).toBe(words);
});

it('counts', () => {
  expect(countWords(1, 'mistake')).toBe('1 mistake');
  expect(countWords(7, 'material')).toBe('7 materials');
});

it('says a time as short as it was', () => {
  expect([0.001, 0.08, 1.234, 12.6].map(secondsWords)).toEqual(['under 0.01 s', '0.08 s', '1.23 s', '13 s']);
});
