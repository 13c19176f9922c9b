import { describe, expect, it } from 'vitest';
import type { Brief } from '../../../src/job/job.js';
import { readJob } from '../../../src/job/read.js';
import type { Report } from '../../../src/report/report.js';
import { reportTable } from '../../../src/report/table.js';
import { CAUTION } from '../../../src/report/words.js';
import { sampleJob, sampleLibrary, sampleStock } from '../job/sample.js';
import { fitting, sampleDesign, sampleLimit, sampleReport } from './sampleReport.js';

function briefOf(changes: Record<string, unknown> = {}): Brief {
  const document = { ...sampleJob(), materials: ['alloy-1', 'alloy-2'], ...changes };
  const read = readJob(document, sampleLibrary(), sampleStock());
  if (!read.ok) throw new Error(read.problems.map(({ message }) => message).join('\n'));
  return read.brief;
}

function tableOf(report: Report): readonly string[] {
  return reportTable(report);
}

describe('reportTable', () => {
  it('sets title, line-up, pick, what stands in the way, and the caution', () => {
    const report = sampleReport(briefOf({ number: 'TS-1', revision: 'B' }), (index) => index === 0);
    expect(tableOf(report)).toEqual([
      'Sample, TS-1, revision B',
      '',
      'material  outer diameter × wall (mm)  mass (kg)  twist (deg)  governing limit  margin',
      '--------  --------------------------  ---------  -----------  ---------------  ------',
      'alloy-1                63.21 × 1.183     0.8322        2.803  twist              0.00',
      'alloy-2                 nothing fits',
      '',
      'Pick: alloy-1, 63.21 × 1.183 mm, 0.8322 kg, the lightest that fits.',
      'alloy-2: nothing fits: twist and outer diameter stand against each other. Something fits with ' +
        'tube.outerDiameterMax at 97.9 mm in place of 90 mm or loads.0.twistMax at 3.92 deg in place of 3 deg.',
      CAUTION,
    ]);
  });

  it('says that nothing fits', () => {
    const report = sampleReport(briefOf(), () => false);
    expect(tableOf(report)).toContain('Pick: none, nothing fits.');
  });

  it('names the load case where there are several', () => {
    const loads = [
      { name: 'jam torque', torque: '900 N·m' },
      { name: 'run', torque: '300 N·m' },
    ];
    const lines = tableOf(sampleReport(briefOf({ loads })));
    expect(lines.filter((line) => line.includes('twist (jam torque)'))).toHaveLength(2);
  });

  it('never rounds a margin up, and shows a hair under full as 0.00', () => {
    const margins = [-5e-10, 0.0099, -0.001, 0.6999, null];
    const shown = margins.map((margin) => {
      const limits = [sampleLimit({ margin, governs: true })];
      const report = { ...sampleReport(briefOf()), candidates: [fitting('alloy-1', { limits })] };
      return tableOf(report)[4]?.split(/\s+/).at(-1);
    });
    expect(shown).toEqual(['0.00', '0.00', '-0.01', '0.69', '-']);
  });

  it('lists designs in hand, and a pick among them with its notes', () => {
    const held = {
      name: 'shelf',
      material: 'alloy-1',
      feasible: false,
      design: sampleDesign({ mass: 1.5 }),
      limits: [sampleLimit({ limit: 'bore', load: null, margin: -0.2, governs: true })],
      flags: [{ code: 'short-tube', text: 'The tube is short.' }],
    };
    const lines = tableOf({ ...sampleReport(briefOf()), held: [held], pick: { held: 'shelf' } });
    expect(lines).toContain(
      'shelf (alloy-1)               63.21 × 1.183      1.500        2.803  bore              -0.20  fails',
    );
    expect(lines).toContain(
      'Pick: shelf, 63.21 × 1.183 mm, 1.500 kg, chosen in the job although it does not pass every limit.',
    );
    expect(lines).toContain('Note: The tube is short.');
  });

  it('rounds the factor on the loads down', () => {
    const noFit = { conflict: ['shear-ultimate'] as const, ease: [], torqueFactor: 0.62999 };
    const candidate = { ...fitting('alloy-1'), feasible: false, design: null, limits: [], noFit };
    const lines = tableOf({ ...sampleReport(briefOf()), candidates: [candidate], pick: null });
    expect(lines).toContain(
      'alloy-1: nothing fits: shear ultimate cannot be met. Something fits at 0.629 times the torque.',
    );
  });
});
