import { describe, expect, it } from 'vitest';
import { readCall } from '../../../main/cli/args.js';

const NOTHING_ELSE = { json: null, csv: null, stock: null, quiet: false };

describe('readCall reads', () => {
  it.each([
    [['job.json'], { ...NOTHING_ELSE, job: 'job.json' }],
    [['--quiet', 'job.json'], { ...NOTHING_ELSE, job: 'job.json', quiet: true }],
    [['job.json', '--json', '-'], { ...NOTHING_ELSE, job: 'job.json', json: '-' }],
    [
      ['--json=out.json', 'job.json', '--csv', 'out.csv'],
      { ...NOTHING_ELSE, job: 'job.json', json: 'out.json', csv: 'out.csv' },
    ],
    [['--stock', 'own.csv', 'job.json'], { ...NOTHING_ELSE, job: 'job.json', stock: 'own.csv' }],
    [['--json=-odd.json', 'job.json'], { ...NOTHING_ELSE, job: 'job.json', json: '-odd.json' }],
    [['--', '--job.json'], { ...NOTHING_ELSE, job: '--job.json' }],
  ])('%j', (argv, call) => {
    expect(readCall(argv)).toEqual({ ok: true, call: { ask: 'size', ...call } });
  });

  it.each([['--help'], ['-h']])('%s, with no job', (option) => {
    expect(readCall([option])).toEqual({ ok: true, call: { ask: 'help' } });
  });

  it('--version', () => {
    expect(readCall(['--version'])).toEqual({ ok: true, call: { ask: 'version' } });
  });
});

describe('readCall refuses', () => {
  it.each([
    [[], 'the job file is missing; expected size JOB [options], or --help'],
    [[''], 'the job file is missing; expected size JOB [options], or --help'],
    [['a.json', 'b.json'], '2 job files are given; expected one'],
    [['a.json', '--jsno', 'x'], '--jsno is not an option; expected --json'],
    [
      ['a.json', '--frobnicate'],
      '--frobnicate is not an option; expected --json, --csv, --stock, --memo, --quiet, --help, --version',
    ],
    [['a.json', '-q'], '-q is not an option; expected --json, --csv, --stock, --memo, --quiet, --help, --version'],
    [['a.json', '--json'], '--json wants the name of a file after it'],
    [['a.json', '--json='], '--json wants the name of a file after it'],
    [['a.json', '--json', '--quiet'], '--json wants the name of a file after it'],
    [['a.json', '--csv', '-'], '--csv - is not possible; expected the name of a file'],
    [['a.json', '--stock', '-'], '--stock - is not possible; expected the name of a file'],
    [['a.json', '--quiet=yes'], '--quiet takes no value'],
    [['a.json', '--json', 'x', '--json', 'y'], '--json is given twice; expected it once'],
    [['a.json', '--memo', 'x.pdf'], '--memo: this version does not print memos yet'],
  ])('%j', (argv, message) => {
    expect(readCall(argv)).toEqual({ ok: false, message });
  });
});
