import { describe, expect, it } from 'vitest';
import { ranking } from '../../../renderer/lineup/ranking.js';
import { fitting, inHand, results, unfit } from './ranked.js';

function places(...of: Parameters<typeof results>): [string, number | null][] {
  return ranking(results(...of)).entries.map(({ key, rank }) => [key, rank]);
}

describe('ranking', () => {
  it('ranks by mass; designs in hand that fail stand after the rest, materials without design last', () => {
    const candidates = [fitting('a', 1), fitting('b', 3), unfit('c')];
    const held = [inHand('shelf', 'b', 2), inHand('scrap', 'a', 0.5, false)];
    expect(places(candidates, held)).toEqual([
      ['m a', 1],
      ['h shelf', 2],
      ['m b', 3],
      ['h scrap', null],
      ['m c', null],
    ]);
  });

  it('measures against the lightest sized tube, even where a lighter one is in hand', () => {
    const held = [inHand('shelf', 'a', 0.9)];
    expect(ranking(results([fitting('a', 1)], held)).lightest).toBe(1);
    expect(ranking(results([unfit('a')], held)).lightest).toBe(0.9);
    expect(ranking(results([unfit('a')])).lightest).toBeNull();
  });

  it('leaves out what is of a material that the job no longer has', () => {
    const { entries } = ranking({ ...results([fitting('a', 1)]), candidates: [fitting('a', 1), fitting('gone', 2)] });
    expect(entries.map(({ key }) => key)).toEqual(['m a']);
  });
});
