import { describe, expect, it } from 'vitest';
import { ranking } from '../../../renderer/lineup/ranking.js';
import { standingText } from '../../../renderer/pick/standing.js';
import { fitting, inHand, results, unfit } from '../lineup/ranked.js';

function standings(...of: Parameters<typeof results>): string[] {
  const all = ranking(results(...of));
  return all.entries.map((entry) => standingText(entry, all, 'SI'));
}

describe('standingText', () => {
  it('says the form, the place and what the tube is over the lightest', () => {
    const held = [inHand('shelf', 'a', 1.2), inHand('scrap', 'a', 0.2, false)];
    expect(standings([fitting('a', 1), fitting('b', 1.7264), unfit('c')], held)).toEqual([
      'drawn tube, the lightest of 5',
      'in hand, a steel, drawn tube, second of 5, 0.200 kg over the lightest',
      'drawn tube, third of 5, 0.726 kg over the lightest',
      'in hand, a steel, drawn tube, does not carry the job',
      'drawn tube',
    ]);
  });

  it('says where a tube in hand is lighter, and where there is but one', () => {
    expect(standings([fitting('a', 1)], [inHand('shelf', 'a', 0.9)])[0]).toMatch(
      /first of 2, 0\.100 kg under the lightest$/,
    );
    expect(standings([fitting('a', 1)])).toEqual(['drawn tube, the only one']);
  });
});
