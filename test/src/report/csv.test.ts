import { describe, expect, it } from 'vitest';
import { readJob } from '../../../src/job/read.js';
import { reportCsv } from '../../../src/report/csv.js';
import type { Report } from '../../../src/report/report.js';
import { sampleJob, sampleLibrary, sampleRecord, sampleStock } from '../job/sample.js';
import { sampleReport } from './sampleReport.js';

function reportOf(changes: Record<string, unknown>): Report {
  const read = readJob({ ...sampleJob(), ...changes }, sampleLibrary(), sampleStock());
  if (!read.ok) throw new Error(read.problems.map(({ message }) => message).join('\n'));
  return sampleReport(read.brief, (index) => index === 0);
}

describe('reportCsv', () => {
  it('has a line of titles with units and a line a material, ended by CR LF', () => {
    const csv = reportCsv(reportOf({ materials: ['alloy-1', 'alloy-2'], currency: 'EUR' }));
    expect(csv.split('\r\n')).toEqual([
      'material,name,fits,outer diameter (mm),wall (mm),bore (mm),mass (kg),twist (deg),torsional stiffness (N·m/rad),' +
        'strain energy (J),cost (EUR),governing limit,least margin',
      'alloy-1,Alloy 1,yes,63.214,1.1834,60.8472,0.83217,2.80348249,18400,22,5.4,twist,0',
      'alloy-2,Alloy 1,no,,,,,,,,,,',
      '',
    ]);
  });

  it.each([
    ['=1+1', "'=1+1"],
    ['+a', "'+a"],
    ['-a', "'-a"],
    ['@a', "'@a"],
    ['a=b', 'a=b'],
    ['a,b', '"a,b"'],
    ['say "a"', '"say ""a"""'],
    ['="a,b"', '"\'=""a,b"""'],
  ])('writes the name %s as %s', (name, field) => {
    const csv = reportCsv(reportOf({ materials: [{ ...sampleRecord('own'), name }] }));
    expect(csv.split('\r\n')[1]?.startsWith(`own,${field},yes,`)).toBe(true);
  });
});
