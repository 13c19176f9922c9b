import { describe, expect, it } from 'vitest';
import { shownFront } from '../../../renderer/job/shownFront.js';
import { withDominance } from '../../../src/sizing/dominance.js';
import { sized, smallJob } from '../window.js';

function reportOf(job = smallJob()) {
  const { end } = sized(job);
  if (end.kind !== 'report') throw new Error('the job is sound');
  return end.report;
}

describe('the fronts that are shown', () => {
  const report = reportOf();

  it('are none before there is anything, and the report’s where no run is in flight', () => {
    expect(shownFront(null, new Map(), null)).toBeNull();
    expect(shownFront(report, new Map(), null)).toEqual({ job: report.job, ...report.front });
  });

  it('are, for a run in flight, the new ones with the old in the places still to come', () => {
    const next = reportOf(smallJob({ tube: { length: '1.4 m', outerDiameterMax: '60 mm' } }));
    const fresh = next.front.points.filter(({ material }) => material === 'al-2024-t3');
    const shown = shownFront(report, new Map([['al-2024-t3', fresh]]), next.job);
    const old = report.front.points.filter(({ material }) => material !== 'al-2024-t3');
    const key = ({ material, mass }: { material: string; mass: number }): string => `${material} ${String(mass)}`;
    expect(shown?.points.map(key).sort()).toEqual([...fresh, ...old].map(key).sort());
    expect(shown?.points).toEqual(withDominance(shown?.points ?? [], 'twist'));
  });

  it('are not the old ones where they are against something else, nor of materials that are gone', () => {
    const other = reportOf(smallJob({ front: { against: 'outerDiameter' } }));
    expect(shownFront(report, new Map(), other.job)).toMatchObject({ against: 'outerDiameter', points: [] });
    const one = reportOf(smallJob({ materials: ['al-2024-t3'] }));
    const shown = shownFront(report, new Map(), one.job);
    expect(new Set(shown?.points.map(({ material }) => material))).toEqual(new Set(['al-2024-t3']));
  });
});
