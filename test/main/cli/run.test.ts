import { mkdirSync, readFileSync, readdirSync, truncateSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import type { Desk, SizeJob } from '../../../main/cli/desk.js';
import { run } from '../../../main/cli/run.js';
import { programVersion } from '../../../main/files/assets.js';
import { sampleJob, sampleRecord, type Doc } from '../../src/job/sample.js';
import { sampleReport } from '../../src/report/sampleReport.js';
import { temporaryFolder } from '../temporary.js';
import { CAUTION } from '../../../src/report/words.js';

interface Told {
  readonly status: number;
  readonly out: string;
  readonly err: string;
}

const everyFits: SizeJob = (brief, onProgress) => {
  brief.job.materials.forEach(({ name }, index) => onProgress?.(index + 1, brief.job.materials.length, name));
  return sampleReport(brief);
};

/** Runs a command line in a folder against an engine that answers as told. */
async function told(
  folder: string,
  argv: readonly string[],
  engine: SizeJob = everyFits,
  terminal = false,
): Promise<Told> {
  let out = '';
  let err = '';
  const desk: Desk = {
    out: (text) => {
      out += text;
    },
    err: (text) => {
      err += text;
    },
    terminal,
    folder,
    engine: () => Promise.resolve(engine),
  };
  const status = await run(argv, desk);
  return { status, out, err };
}

/** A folder with a sound job "job.json" that brings its own material. */
function folderWith(changes: Doc = {}): string {
  const folder = temporaryFolder();
  const document = { ...sampleJob(), materials: [sampleRecord('own')], ...changes };
  writeFileSync(path.join(folder, 'job.json'), JSON.stringify(document));
  return folder;
}

function refusal(err: string): Told {
  return { status: 2, out: '', err: `${err}\n` };
}

describe('run sizes a job and', () => {
  it('prints the table, status 0', async () => {
    const { status, out, err } = await told(folderWith(), ['job.json']);
    expect(status).toBe(0);
    expect(out.split('\n').slice(0, 5).join('\n')).toMatch(/^Sample\n\nmaterial .*\n-+ .*\nown .*0\.00$/);
    expect(out.endsWith(`\n${CAUTION}\n`)).toBe(true);
    expect(err).toBe('');
  });

  it('exits with 3 where nothing fits, and still writes the report', async () => {
    const folder = folderWith();
    const { status } = await told(folder, ['job.json', '--json', 'r.json'], (brief) =>
      sampleReport(brief, () => false),
    );
    expect(status).toBe(3);
    expect(JSON.parse(readFileSync(path.join(folder, 'r.json'), 'utf8'))).toMatchObject({ pick: null });
  });

  it('exits with 0 where one of several materials fits', async () => {
    const folder = folderWith({ materials: [sampleRecord('a'), sampleRecord('b')] });
    const { status } = await told(folder, ['job.json'], (brief) => sampleReport(brief, (index) => index === 1));
    expect(status).toBe(0);
  });

  it('prints the report alone for --json -', async () => {
    const { status, out, err } = await told(folderWith(), ['job.json', '--json', '-', '--quiet']);
    expect(JSON.parse(out)).toMatchObject({ format: 'wringwall-report', job: { title: 'Sample' } });
    expect([status, err]).toEqual([0, '']);
  });

  it('writes report and line-up to files', async () => {
    const folder = folderWith();
    const { status, out } = await told(folder, ['job.json', '--json', 'r.json', '--csv', 'r.csv', '--quiet']);
    expect([status, out]).toEqual([0, '']);
    expect(readdirSync(folder).sort()).toEqual(['job.json', 'r.csv', 'r.json']);
    expect(readFileSync(path.join(folder, 'r.csv'), 'utf8').startsWith('material,name,fits,')).toBe(true);
    expect(JSON.parse(readFileSync(path.join(folder, 'r.json'), 'utf8'))).toMatchObject({ version: 1 });
  });

  it('takes the sizes from a CSV list', async () => {
    const folder = folderWith({ sizes: 'any' });
    writeFileSync(path.join(folder, 'own.csv'), 'outer diameter (mm),wall (mm)\n50,1.5\n60,2\n');
    const { status, out } = await told(folder, ['job.json', '--stock', 'own.csv', '--json', '-']);
    expect(status).toBe(0);
    const stock = [
      { outerDiameter: 0.05, wall: 0.0015, pricePerMetre: null },
      { outerDiameter: 0.06, wall: 0.002, pricePerMetre: null },
    ];
    expect(JSON.parse(out)).toMatchObject({ job: { sizes: { stock } } });
  });

  it('says where a record differs from the library, but not with --quiet', async () => {
    const folder = folderWith({ materials: [sampleRecord('al-6061-t6')] });
    const loud = await told(folder, ['job.json']);
    expect(loud.err).toMatch(/^job\.json: materials\.0: the record "al-6061-t6" differs from the library in density, /);
    expect((await told(folder, ['job.json', '--quiet'])).err).toBe('');
  });

  it('tells progress on a terminal alone, and clears it', async () => {
    const onTerminal = await told(folderWith(), ['job.json'], everyFits, true);
    expect(onTerminal.err).toBe('\r\u001b[2K1 of 1: Alloy 1\r\u001b[2K');
    expect((await told(folderWith(), ['job.json', '--quiet'], everyFits, true)).err).toBe('');
  });
});

describe('run tells', () => {
  it('help and version without a job', async () => {
    const folder = temporaryFolder();
    expect((await told(folder, ['--help'])).out).toContain('npm run size -- JOB');
    expect(await told(folder, ['--version'])).toMatchObject({ status: 0, out: `${programVersion()}\n` });
  });

  it('all mistakes of a job, one a line, with file, key path, value and what was expected', async () => {
    const folder = folderWith({ loads: [{ name: 'a', torque: '900 mm' }], speed: { max: '-1 rpm' } });
    expect(await told(folder, ['job.json'])).toEqual(
      refusal(
        'job.json: loads.0.torque: "900 mm" is a length; expected a torque such as "900 N·m"\n' +
          'job.json: speed.max: "-1 rpm" is out of range; expected a speed from 0.001 rpm to 10000000 rpm, such as "3000 rpm"',
      ),
    );
  });

  it.each([
    ['an empty file', '', 'the file is empty; expected a JSON document'],
    ['a binary file', '\u0000\u0001', 'this is a binary file; expected JSON text in UTF-8'],
    [
      '200,000 levels',
      '['.repeat(200_000),
      'line 1, column 33: the values are nested deeper than 32 levels; expected at most 32 levels',
    ],
    [
      'a key twice',
      '{"tube": {"length": "1 m", "length": "2 m"}}',
      'tube.length: this key stands twice in the same object (again at line 1, column 28); expected every key once',
    ],
    ['NaN', '{"a": NaN}', 'line 1, column 7: NaN is not a number that JSON can hold; expected a value'],
    ['1e400', '{"a": 1e400}', 'line 1, column 7: the number 1e400 is too large; expected a number below 1.8e308'],
    [
      'another document',
      '{"format": "wringwall-report"}',
      'format: "wringwall-report" is not the format of a job; expected "wringwall-job"',
    ],
  ])('%s in one sentence', async (_name, text, message) => {
    const folder = temporaryFolder();
    writeFileSync(path.join(folder, 'bad.json'), text);
    expect(await told(folder, ['bad.json'])).toEqual(refusal(`bad.json: ${message}`));
  });

  it('a file of 50 MB, one that is missing, a folder and a device', async () => {
    const folder = temporaryFolder();
    writeFileSync(path.join(folder, 'long.json'), '{');
    truncateSync(path.join(folder, 'long.json'), 50_000_000);
    mkdirSync(path.join(folder, 'sub'));
    const answers = await Promise.all(
      ['long.json', 'none.json', 'sub', '/dev/zero'].map((file) => told(folder, [file])),
    );
    expect(answers).toEqual([
      refusal('long.json: the file is longer than 2 MB; expected at most 2 MB'),
      refusal('none.json: there is no such file or folder'),
      refusal('sub: this is a folder, not a file'),
      refusal('/dev/zero: this is not a regular file'),
    ]);
  });

  it('a wrong call', async () => {
    expect(await told(temporaryFolder(), ['--memo', 'm.pdf', 'job.json'])).toEqual(
      refusal('--memo: this version does not print memos yet'),
    );
  });

  it('a stock list that is missing, and one without a row that can be read', async () => {
    const folder = folderWith();
    writeFileSync(path.join(folder, 'bad.csv'), 'outer diameter (mm),wall (mm)\n');
    expect(await told(folder, ['job.json', '--stock', 'none.csv'])).toEqual(
      refusal('none.csv: there is no such file or folder'),
    );
    const { status, out, err } = await told(folder, ['job.json', '--stock', 'bad.csv']);
    expect([status, out]).toEqual([2, '']);
    expect(err).toMatch(/^bad\.csv.*\n$/);
  });

  it('outputs that cannot be written, before it sizes', async () => {
    const folder = folderWith();
    const never: SizeJob = () => {
      throw new Error('sized');
    };
    expect(await told(folder, ['job.json', '--json', 'none/r.json'], never)).toEqual(
      refusal('none/r.json: there is no such file or folder'),
    );
    const taken = 'another file of this call has this name; expected one of its own';
    expect(await told(folder, ['job.json', '--json', './job.json'], never)).toEqual(refusal(`./job.json: ${taken}`));
    expect(await told(folder, ['job.json', '--json', 'r', '--csv', 'r'], never)).toEqual(refusal(`r: ${taken}`));
    expect(readdirSync(folder)).toEqual(['job.json']);
  });

  it('an unexpected error in one sentence, status 1, with nothing written', async () => {
    const folder = folderWith();
    const broken: SizeJob = () => {
      throw new TypeError('x is not a function\n    at somewhere');
    };
    expect(await told(folder, ['job.json', '--json', 'r.json'], broken)).toEqual({
      status: 1,
      out: '',
      err: 'wringwall: an unexpected error: x is not a function\n',
    });
    expect(readdirSync(folder)).toEqual(['job.json']);
  });
});
