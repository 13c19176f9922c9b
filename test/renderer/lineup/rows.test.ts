import { describe, expect, it } from 'vitest';
import { ranking } from '../../../renderer/lineup/ranking.js';
import { lineUpRows, type DesignTexts } from '../../../renderer/lineup/rows.js';
import type { UnitSystem } from '../../../src/quantity/register.js';
import { design, entry } from '../pick/entries.js';
import { fitting, inHand, results, unfit } from './ranked.js';

function texts(system: UnitSystem, ...of: Parameters<typeof results>): (DesignTexts | null)[] {
  return lineUpRows(ranking(results(...of)), system).map((row) => row.texts);
}

/** How many decimals a text has. */
function decimals(text: string): number {
  return text.split('.')[1]?.length ?? 0;
}

describe('lineUpRows', () => {
  const wide = [
    fitting('a', 1.0031, { design: design({ mass: 1.0031, outerDiameter: 0.0848123, wall: 0.00175, cost: 95.286 }) }),
    fitting('b', 1.7291, { design: design({ mass: 1.7291, outerDiameter: 0.09, wall: 0.0016137 }) }),
    fitting('c', 124.31, { design: design({ mass: 124.31, outerDiameter: 0.6, wall: 0.02, twist: 0.00123 }) }),
  ];

  it.each(['SI', 'US'] as const)('gives the numbers of a column the same decimals, in %s units', (system) => {
    const rows = texts(system, wide);
    for (const column of ['outerDiameter', 'wall', 'mass', 'twist'] as const)
      expect(new Set(rows.map((row) => decimals(row?.[column] ?? ''))).size, column).toBe(1);
  });

  it('shows four figures of the lightest, and what the others weigh over it', () => {
    const [a, b, c] = texts('SI', wide);
    expect(a).toMatchObject({ outerDiameter: '84.81', wall: '1.750', mass: '1.003', cost: '95.29' });
    expect(a?.over).toEqual({ mass: '', percent: '' });
    expect(b).toMatchObject({ mass: '1.729', over: { mass: '0.726', percent: '+72' }, cost: '' });
    expect(c).toMatchObject({ mass: '124.310', twist: '0.0705' });
  });

  it('sets all bars on one scale from 0: up to the lightest, and past it', () => {
    const [a, b, c] = texts('SI', [fitting('a', 1), fitting('b', 3), fitting('c', 4)]).map((row) => row?.bar);
    expect(a).toEqual({ base: 0.25, past: 0 });
    expect(b).toEqual({ base: 0.25, past: 0.5 });
    expect(c).toEqual({ base: 0.25, past: 0.75 });
  });

  it('shows a lighter tube in hand as under the lightest, with a true minus', () => {
    const [held] = texts('SI', [fitting('a', 1)], [inHand('shelf', 'a', 0.9)]);
    expect(held).toMatchObject({ over: { mass: '−0.1000', percent: '−10' }, bar: { base: 0.9, past: 0 } });
  });

  it('says what governs, or what a design in hand fails and by how much', () => {
    const limits = [
      entry({ utilisation: 1, governs: true }),
      entry({ utilisation: 1, governs: true, load: 'cruise' }),
      entry({ limit: 'bore', utilisation: 1, governs: true }),
    ];
    const [a, failing] = texts('SI', [fitting('a', 1, { limits })], [inHand('scrap', 'a', 0.5, false)]);
    expect(a?.governs).toBe('twist, bore');
    expect(failing).toMatchObject({ governs: 'fails twist 134 %', over: null, bar: null });
  });

  it('has no numbers where nothing fits', () => {
    expect(texts('SI', [unfit('a')])).toEqual([null]);
  });
});
