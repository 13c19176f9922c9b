import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { jobDigest } from '../../../src/job/digest.js';
import type { Brief } from '../../../src/job/job.js';
import { readJob, readJobText } from '../../../src/job/read.js';
import { writeJob, writeJobText } from '../../../src/job/write.js';
import { randomJob } from './randomJob.js';
import { sampleJob, sampleLibrary, sampleRecord, sampleStock, sampleWith } from './sample.js';

function briefOf(document: unknown): Brief {
  const read = readJob(document, sampleLibrary(), sampleStock());
  if (!read.ok) throw new Error(read.problems.map((problem) => problem.message).join('\n'));
  return read.brief;
}

describe('writeJob', () => {
  it('gives a document that reads back to the same job to the last bit, without library or stock lists', () => {
    fc.assert(
      fc.property(randomJob, (document) => {
        const brief = briefOf(document);
        const again = readJobText(writeJobText(brief), new Map(), new Map());
        if (!again.ok) throw new Error(again.problems.map((problem) => problem.message).join('\n'));
        expect(again.brief.job).toEqual(brief.job);
        expect(jobDigest(again.brief.job)).toBe(jobDigest(brief.job));
      }),
      { numRuns: 300 },
    );
  });

  it('writes a second time what it wrote the first', () => {
    fc.assert(
      fc.property(randomJob, (document) => {
        const once = writeJob(briefOf(document));
        expect(writeJob(briefOf(once))).toEqual(once);
      }),
      { numRuns: 100 },
    );
  });

  it('writes values in the unit in which they were entered, defaults and records in full', () => {
    const document = {
      ...sampleWith('tube.length', '55.2 in'),
      loads: [{ name: 'jam', torque: '-664 lbf·ft', axial: '-8 kN', twistMax: '1.5 deg/m' }],
      speed: { max: '3000 rpm' },
    };
    expect(writeJob(briefOf(document))).toEqual({
      format: 'wringwall-job',
      version: 1,
      title: 'Sample',
      tube: {
        length: '55.2 in',
        supportSpacing: '55.2 in',
        outerDiameterMax: '70 mm',
        diameterToWallMin: 6,
        diameterToWallMax: 600,
      },
      loads: [
        {
          name: 'jam',
          torque: '-664 lbf·ft',
          bending: '0 N·m',
          axial: '-8 kN',
          twistMax: '1.5 deg/m',
          yieldFactor: 1,
          ultimateFactor: 1.5,
          bucklingFactor: 1.5,
        },
      ],
      speed: { max: '3000 rpm', margin: 1.25 },
      buckling: { torsionKnockdown: 0.67, method: 'formula' },
      materials: [
        {
          ...sampleRecord('alloy-1'),
          shearYield: '150.11106998930273 MPa',
          compressiveYield: '260 MPa',
          jointFactor: 1,
        },
      ],
      sizes: 'any',
      hold: [],
      front: { against: 'twist' },
    });
  });

  it('writes the rows of a named stock list', () => {
    const { sizes } = writeJob(briefOf({ ...sampleJob(), sizes: { stock: 'two-tubes' } }));
    expect(sizes).toEqual({
      stock: [
        { outerDiameter: '50 mm', wall: '1.5 mm' },
        { outerDiameter: '60 mm', wall: '2 mm', pricePerMetre: 9.5 },
      ],
    });
  });
});
