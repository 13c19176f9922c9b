import { describe, expect, it } from 'vitest';
import { costRows, othersSentence, smallMassText } from '../../../renderer/pick/costRows.js';
import type { LimitEntry } from '../../../src/report/report.js';
import { design, entry } from './entries.js';

/** The requirement of a full limit, as it stands and eased. */
function change(full: LimitEntry): string {
  const [row] = costRows([{ limit: full.limit, massSavedPerPercent: 0.01 }], [full], design(), 'SI');
  return `${row?.change.first ?? ''} to ${row?.change.second ?? ''} ${row?.change.unit ?? ''}`;
}

describe('costRows', () => {
  it('eases what asks for at most upwards', () => {
    expect(change(entry({ demand: 0.0523, capacity: 0.0523598775 }))).toBe('3.00 to 3.03 deg');
    expect(change(entry({ limit: 'outer-diameter', unit: 'm', demand: 0.09, capacity: 0.0900001 }))).toBe(
      '90.0 to 90.9 mm',
    );
    expect(change(entry({ limit: 'wall-buckling', unit: 'N·m', demand: 1757, capacity: 1758 }))).toBe(
      '1758 to 1776 N·m',
    );
  });

  it('eases what asks for at least downwards', () => {
    expect(change(entry({ limit: 'whirl', unit: 'rad/s', demand: 490.0885, capacity: 490.1 }))).toBe(
      '4680 to 4634 rpm',
    );
    expect(change(entry({ limit: 'wall-min', unit: 'm', demand: 0.002, capacity: 0.002 }))).toBe('2.00 to 1.98 mm');
    expect(change(entry({ limit: 'bore', unit: 'm', demand: 0.086, capacity: 0.086 }))).toBe('86.0 to 85.1 mm');
    expect(change(entry({ limit: 'outer-diameter', unit: 'm', demand: 0.0899999, capacity: 0.09 }))).toBe(
      '90.0 to 89.1 mm',
    );
    expect(change(entry({ limit: 'diameter-to-wall', unit: '1', demand: 44.9999, capacity: 45 }))).toBe(
      '45.0 to 44.6 ',
    );
  });

  it('sets the dearest first, and leaves out what the report has no entry for', () => {
    const rows = costRows(
      [
        { limit: 'twist', massSavedPerPercent: 0.0178 },
        { limit: 'bore', massSavedPerPercent: 0.0366 },
        { limit: 'column', massSavedPerPercent: 0.5 },
      ],
      [entry(), entry({ limit: 'bore', unit: 'm' })],
      design(),
      'SI',
    );
    expect(rows.map(({ label, saved }) => [label, saved])).toEqual([
      ['bore', '36.6 g'],
      ['twist', '17.8 g'],
    ]);
  });
});

describe('smallMassText', () => {
  it('is in grams, in ounces, or nothing', () => {
    expect(smallMassText(0.0112, 'SI')).toBe('11.2 g');
    expect(smallMassText(0.0283495231, 'US')).toBe('1.00 oz');
    expect(smallMassText(0, 'SI')).toBe('nothing');
  });
});

describe('othersSentence', () => {
  const three = [entry(), entry({ limit: 'bore' }), entry({ limit: 'whirl' })];

  it.each([
    [0, 'No limit is quite full.'],
    [1, 'The other two are not full.'],
    [2, 'The other one is not full.'],
    [3, ''],
  ])('of three limits, %d of them full, is %j', (full, expected) => {
    expect(othersSentence(full, three)).toBe(expected);
  });
});
