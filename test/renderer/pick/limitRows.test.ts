import { describe, expect, it } from 'vitest';
import { limitRows, percentFull, worstOfEach } from '../../../renderer/pick/limitRows.js';
import { entry } from './entries.js';

describe('percentFull', () => {
  it.each([
    [0, 0],
    [0.674, 67],
    [0.9984, 99],
    [0.999, 100],
    [1, 100],
    [1 + 5e-10, 100],
    [1.0000001, 101],
    [1.634, 164],
  ])('says 100 of what is full and passes, never else: %d is %d', (utilisation, percent) => {
    expect(percentFull(utilisation)).toBe(percent);
  });
});

const entries = [
  entry({ load: 'cruise', utilisation: 0.2 }),
  entry({ load: 'jam', utilisation: 0.9995, governs: true }),
  entry({ limit: 'bore', load: null, unit: 'm', demand: 0.02, capacity: 0.08, utilisation: 0.25 }),
  entry({ limit: 'wall-buckling', unit: 'N·m', demand: 900, capacity: 1345, utilisation: 0.8, interaction: true }),
];

describe('limitRows', () => {
  it('gives each limit its fullest case, fullest first', () => {
    const rows = limitRows(entries, true, false, 'SI');
    expect(rows.map(({ label, load, percent }) => [label, load, percent])).toEqual([
      ['twist', 'jam', 100],
      ['wall buckling', 'jam', 80],
      ['bore', null, 25],
    ]);
    expect(rows.map(({ governs }) => governs)).toEqual([true, false, false]);
    expect(rows.map(({ interaction }) => interaction)).toEqual([false, true, false]);
  });

  it('gives every case a row where it is asked for, each with a key of its own', () => {
    const rows = limitRows(entries, true, true, 'SI');
    expect(rows.map(({ load }) => load)).toEqual(['jam', 'jam', null, 'cruise']);
    expect(new Set(rows.map(({ key }) => key)).size).toBe(4);
  });

  it('keeps the order of the report among limits that govern together', () => {
    const together = [entry({ utilisation: 0.9999999 }), entry({ limit: 'outer-diameter', unit: 'm', utilisation: 1 })];
    expect(limitRows(together, false, false, 'SI').map(({ label }) => label)).toEqual(['twist', 'outer diameter']);
  });

  it('leaves the load case out where the job has but one', () => {
    expect(limitRows(entries, false, false, 'SI').every(({ load }) => load === null)).toBe(true);
  });

  it('marks a limit that governs though it is not full, and one that is over', () => {
    const [over, governing] = limitRows(
      [entry({ utilisation: 0.98, governs: true }), entry({ limit: 'bore', utilisation: 1.2 })],
      false,
      false,
      'SI',
    );
    expect(over).toMatchObject({ over: true, governs: true, percent: 120 });
    expect(governing).toMatchObject({ over: false, governs: true, percent: 98 });
  });
});

describe('worstOfEach', () => {
  it('keeps a limit that is not used at all', () => {
    expect(worstOfEach([entry({ utilisation: 0 })])).toHaveLength(1);
  });
});
