import { readdirSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { readBrief } from '../../../main/cli/readBrief.js';
import { demoJob } from '../../../main/files/assets.js';
import type { Report } from '../../../src/report/report.js';
import { sizeJob } from '../../../src/sizing/size.js';

async function sized(name: string): Promise<Report> {
  const { brief, notes } = await readBrief(demoJob(name), null, '.');
  expect(notes).toEqual([]);
  return sizeJob(brief);
}

/** The governing limits of each material that fits. */
function governing(report: Report): readonly (readonly string[])[] {
  const fitting = report.candidates.filter(({ feasible }) => feasible);
  return fitting.map(({ limits }) => limits.filter(({ governs }) => governs).map(({ limit }) => limit));
}

describe('the demo jobs', () => {
  it('are these three', () => {
    const names = readdirSync(path.dirname(demoJob('x'))).sort();
    expect(names).toEqual(['control-surface.wring.json', 'interconnect.wring.json', 'tracker.wring.json']);
  });

  it('interconnect: every material fits, and its speed asks for the diameter', async () => {
    const report = await sized('interconnect.wring.json');
    expect(report.candidates.every(({ feasible }) => feasible)).toBe(true);
    expect(governing(report).every((limits) => limits.includes('whirl'))).toBe(true);
  });

  it('tracker: twist governs the lightest tube of the list', async () => {
    const report = await sized('tracker.wring.json');
    expect(governing(report)[0]).toEqual(['twist']);
    expect(report.job.sizes).not.toBe('any');
  });

  it('control surface: envelope and strength govern, one alloy does not fit, the tube on the shelf does', async () => {
    const report = await sized('control-surface.wring.json');
    expect(governing(report).every((limits) => limits.includes('outer-diameter'))).toBe(true);
    const failing = report.candidates.filter(({ feasible }) => !feasible);
    expect(failing.map(({ material }) => material)).toEqual(['al-6061-t6']);
    expect(failing[0]?.noFit?.ease.map(({ path: key }) => key)).toContain('tube.outerDiameterMax');
    expect(report.held.map(({ feasible }) => feasible)).toEqual([true]);
  });
});
