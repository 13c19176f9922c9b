import { describe, expect, it } from 'vitest';
import { shownResults } from '../../../renderer/job/shownResults.js';
import { sized, smallJob } from '../window.js';

function reportOf(job = smallJob()) {
  const { end } = sized(job);
  if (end.kind !== 'report') throw new Error('the job is sound');
  return end.report;
}

describe('what is shown', () => {
  it('is nothing before there is anything', () => {
    expect(shownResults(null, [], null)).toBeNull();
    expect(shownResults(null, [], reportOf().job)).toBeNull();
  });

  it('is the report as it is where no run is in flight', () => {
    const report = reportOf();
    const shown = shownResults(report, [], null);
    expect(shown).toMatchObject({ complete: true, job: report.job });
    expect(shown?.candidates).toBe(report.candidates);
    expect(shown?.old.size).toBe(0);
  });

  it('is the report with new candidates in their places, lightest first and without a design last', () => {
    const report = reportOf();
    const next = reportOf(smallJob({ tube: { length: '1.4 m', outerDiameterMax: '60 mm' } }));
    const fresh = next.candidates.filter(({ material }) => material !== 'steel-4130-n');
    const shown = shownResults(report, fresh, next.job);
    expect(Array.from(shown?.old ?? [])).toEqual(['steel-4130-n']);
    for (const candidate of fresh) expect(shown?.candidates).toContain(candidate);
    const masses = shown?.candidates.map(({ design }) => design?.mass ?? Infinity) ?? [];
    expect(masses).toEqual(masses.toSorted((one, other) => one - other));
  });
});
