import { describe, expect, it } from 'vitest';
import { ranking } from '../../../renderer/lineup/ranking.js';
import { rowNames } from '../../../renderer/lineup/rowNames.js';
import { job, metal } from '../../src/fixtures.js';
import { fitting, inHand } from './ranked.js';

describe('rowNames', () => {
  it('gives the form only to materials that share a name, and the material to a design in hand', () => {
    const materials = [
      metal({ id: 'a', name: 'Steel 4130, wall to 4 mm' }),
      metal({ id: 'b', name: 'Steel 4130, wall over 4 mm' }),
      metal({ id: 'c', name: 'Steel E355, drawn' }),
    ];
    const candidates = [fitting('a', 1), fitting('b', 2), fitting('c', 3)];
    const { entries } = ranking({ job: job({ materials }), candidates, held: [inHand('shelf, left', 'c', 4)] });
    expect([...rowNames(entries).values()]).toEqual([
      { name: 'Steel 4130', note: 'wall to 4 mm' },
      { name: 'Steel 4130', note: 'wall over 4 mm' },
      { name: 'Steel E355', note: '' },
      { name: 'shelf, left', note: 'in hand, Steel E355' },
    ]);
  });
});
