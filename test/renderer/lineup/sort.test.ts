import { describe, expect, it } from 'vitest';
import { ranking } from '../../../renderer/lineup/ranking.js';
import { lineUpRows } from '../../../renderer/lineup/rows.js';
import { BY_RANK, type SortColumn, sortedBy, sortRows } from '../../../renderer/lineup/sort.js';
import { design } from '../pick/entries.js';
import { fitting, inHand, results, unfit } from './ranked.js';

const candidates = [
  fitting('b', 1, { design: design({ mass: 1, cost: 20, outerDiameter: 0.08 }) }),
  fitting('a10', 2, { design: design({ mass: 2, cost: null, outerDiameter: 0.07 }) }),
  fitting('a9', 3, { design: design({ mass: 3, cost: 10, outerDiameter: 0.09 }) }),
  unfit('aa'),
];
const rows = lineUpRows(ranking(results(candidates, [inHand('scrap', 'b', 0.5, false)])), 'SI');

function order(by: SortColumn, descending = false): string[] {
  return sortRows(rows, { by, descending }).map(({ key }) => key.slice(2));
}

describe('sortRows', () => {
  it('goes by mass as it comes, and the other way round', () => {
    expect(order('mass')).toEqual(['b', 'a10', 'a9', 'scrap', 'aa']);
    expect(order('mass', true)).toEqual(['a9', 'a10', 'b', 'scrap', 'aa']);
  });

  it('goes by name as people count, and by size', () => {
    expect(order('material').slice(0, 3)).toEqual(['a9', 'a10', 'b']);
    expect(order('size').slice(0, 3)).toEqual(['a10', 'b', 'a9']);
  });

  it('keeps what has no value after what has one, either way, and what has no rank after all', () => {
    expect(order('cost')).toEqual(['a9', 'b', 'a10', 'scrap', 'aa']);
    expect(order('cost', true)).toEqual(['b', 'a9', 'a10', 'scrap', 'aa']);
  });

  it('leaves the ranks as they are', () => {
    const sorted = sortRows(rows, { by: 'material', descending: false });
    expect(sorted.map(({ rank }) => rank)).toEqual([3, 2, 1, null, null]);
  });
});

describe('sortedBy', () => {
  it('turns round what is sorted by already, and starts upwards with another', () => {
    expect(sortedBy(BY_RANK, 'mass')).toEqual({ by: 'mass', descending: true });
    expect(sortedBy({ by: 'mass', descending: true }, 'mass')).toEqual(BY_RANK);
    expect(sortedBy({ by: 'mass', descending: true }, 'cost')).toEqual({ by: 'cost', descending: false });
  });
});
