import { describe, expect, it } from 'vitest';
import { JOB_DEFAULTS } from '../../../src/job/defaults.js';
import { readJob, readJobText } from '../../../src/job/read.js';
import type { Brief } from '../../../src/job/job.js';
import { REFUSALS } from './refusals.js';
import { sampleJob, sampleLibrary, sampleRecord, sampleStock, sampleWith, type Doc } from './sample.js';

function messages(document: unknown): readonly string[] {
  const read = readJob(document, sampleLibrary(), sampleStock());
  return read.ok ? [] : read.problems.map((problem) => problem.message);
}

function briefOf(document: unknown): Brief {
  const read = readJob(document, sampleLibrary(), sampleStock());
  if (!read.ok) throw new Error(read.problems.map((problem) => problem.message).join('\n'));
  return read.brief;
}

describe('readJob refuses', () => {
  it.each(REFUSALS)('%s = %j', (path, value, expected) => {
    expect(messages(sampleWith(path, value))).toEqual(expected);
  });

  it.each([
    [undefined, 'is missing; expected a job such as { "format": "wringwall-job", "version": 1, … }'],
    [null, 'null is not an object; expected a job such as { "format": "wringwall-job", "version": 1, … }'],
    [5, '5 is not an object; expected a job such as { "format": "wringwall-job", "version": 1, … }'],
    ['job', '"job" is not an object; expected a job such as { "format": "wringwall-job", "version": 1, … }'],
    [[], 'a list is not an object; expected a job such as { "format": "wringwall-job", "version": 1, … }'],
    [{}, 'format: is missing; expected "wringwall-job"'],
  ])('the document %j', (document, message) => {
    expect(messages(document)).toEqual([message]);
  });

  it('a newer version with that sentence alone, whatever else it holds', () => {
    expect(messages({ format: 'wringwall-job', version: 2, shape: 'square', loads: 7 })).toEqual([
      'version: 2 was written by a newer version of Wringwall; expected version 1',
    ]);
  });

  it('a key "__proto__" by name', () => {
    const read = readJobText('{"format": "wringwall-job", "version": 1, "__proto__": {}}', new Map(), new Map());
    const said = read.ok ? [] : read.problems.map(({ message }) => message);
    expect(said.filter((message) => message.startsWith('__proto__: "__proto__" is not a key of a job'))).toHaveLength(
      1,
    );
  });

  it('all mistakes together, each with its path and value', () => {
    const document = sampleWith('tube.length', '-1 m');
    document['loads'] = [
      { name: 'a', torque: '900 mm' },
      { name: 'a', torque: '1 N·m', yieldFactor: 0 },
    ];
    document['materials'] = ['alloy-9', { kind: 'metal' }];
    document['speed'] = { max: '0 rpm' };
    const read = readJob(document, sampleLibrary(), sampleStock());
    const problems = read.ok ? [] : read.problems;
    expect(problems.map(({ path, value }) => [path, value]).slice(0, 6)).toEqual([
      ['tube.length', '-1 m'],
      ['loads.0.torque', '900 mm'],
      ['loads.1.yieldFactor', '0'],
      ['loads.1.name', 'a'],
      ['speed.max', '0 rpm'],
      ['materials.0', 'alloy-9'],
    ]);
    expect(problems.some(({ path }) => path === 'materials.1.density')).toBe(true);
  });

  it('a twist per length only over the range of the product', () => {
    const document = sampleWith('tube.length', '1 km');
    document['loads'] = [{ name: 'a', torque: '1 N·m', twistMax: '5 deg/m' }];
    expect(messages(document)).toEqual([
      'loads.0.twistMax: "5 deg/m" is out of range; expected a twist end to end from 0.000001 deg to 3600 deg, such as "3 deg"',
    ]);
  });
});

describe('readJob reads', () => {
  it('the least job with every default written out', () => {
    const { job } = briefOf(sampleWith('loads', [{ name: 'only', torque: '-0.9 kN·m' }]));
    expect(job.tube).toEqual({
      length: 1.4,
      supportSpacing: 1.4,
      outerDiameterMax: 0.07,
      outerDiameterMin: null,
      boreMin: null,
      wallMin: null,
      diameterToWallMin: JOB_DEFAULTS.diameterToWallMin,
      diameterToWallMax: JOB_DEFAULTS.diameterToWallMax,
    });
    expect(job.loads).toEqual([
      {
        name: 'only',
        torque: -900,
        bending: 0,
        axial: 0,
        reversing: null,
        twistMax: null,
        shearStressMax: null,
        yieldFactor: 1,
        ultimateFactor: 1.5,
        bucklingFactor: 1.5,
      },
    ]);
    expect(job.speed).toBeNull();
    expect(job.buckling).toEqual({ torsionKnockdown: 0.67, method: 'formula' });
    expect(job.sizes).toBe('any');
    expect(job.hold).toEqual([]);
    expect(job.pick).toBeNull();
    expect(job.front).toEqual({ against: 'twist' });
  });

  it('a buckling factor that follows the ultimate factor', () => {
    const { job } = briefOf(sampleWith('loads', [{ name: 'a', torque: '1 N·m', ultimateFactor: 2 }]));
    expect(job.loads[0]?.bucklingFactor).toBe(2);
  });

  it('a twist per length as the product with the length, and remembers its unit', () => {
    const { job, units } = briefOf(sampleWith('loads', [{ name: 'a', torque: '1 N·m', twistMax: '2 deg/m' }]));
    expect(job.loads[0]?.twistMax).toBeCloseTo((2.8 * Math.PI) / 180, 15);
    expect(units['loads.0.twistMax']).toBe('deg/m');
    expect(units['tube.length']).toBe('m');
    expect(units['tube.outerDiameterMax']).toBe('mm');
  });

  it('a load case without torque beside one that has some', () => {
    const loads = [
      { name: 'pull', torque: '0 N·m', axial: '15 kN' },
      { name: 'twist', torque: '1 lbf·in' },
    ];
    expect(briefOf(sampleWith('loads', loads)).job.loads[0]?.torque).toBe(0);
  });

  it('a stock list by name and by rows, a record inline, a design in hand and a pick', () => {
    const document: Doc = {
      ...sampleJob(),
      sizes: { stock: 'two-tubes' },
      materials: [
        'alloy-2',
        { ...sampleRecord('own'), sizes: { stock: [{ outerDiameter: '2 in', wall: '0.065 in' }] } },
      ],
      hold: [{ name: 'shelf', material: 'own', outerDiameter: '63.5 mm', wall: '1.65 mm' }],
      pick: { held: 'shelf' },
      speed: { max: '50 Hz' },
      front: { against: 'cost' },
      currency: 'EUR',
    };
    const { job, units } = briefOf(document);
    expect(job.sizes).toEqual({ stock: sampleStock().get('two-tubes') });
    expect(job.materials[1]?.sizes).toEqual({
      stock: [{ outerDiameter: 0.0508, wall: (0.065 * 254) / 10_000, pricePerMetre: null }],
    });
    expect(units['materials.1.sizes.stock.0.wall']).toBe('in');
    expect(job.hold[0]?.material).toBe('own');
    expect(job.pick).toEqual({ held: 'shelf' });
    expect(job.speed).toEqual({ max: 100 * Math.PI, margin: 1.25 });
  });

  it('a record that differs from the library with a note, and one that does not without', () => {
    const changed = { ...sampleRecord('alloy-1'), density: '2710 kg/m³' };
    const document = sampleWith('materials', [changed, sampleRecord('alloy-2'), sampleRecord('own')]);
    const read = readJob(document, sampleLibrary(), sampleStock());
    expect(read.ok && read.notes).toEqual(['materials.0: the record "alloy-1" differs from the library in density']);
  });
});

describe('readJobText', () => {
  it('reads text', () => {
    expect(readJobText(JSON.stringify(sampleJob()), sampleLibrary(), sampleStock()).ok).toBe(true);
  });

  it('refuses what is no JSON', () => {
    const read = readJobText('{', sampleLibrary(), sampleStock());
    expect(read.ok ? [] : read.problems.map(({ message }) => message)).toEqual([
      'line 1, column 2: the text ends too early; expected a key in double quotes',
    ]);
  });
});
