import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalText, jobDigest } from '../../../src/job/digest.js';
import type { Job } from '../../../src/job/job.js';
import { readJob } from '../../../src/job/read.js';
import { randomJob } from './randomJob.js';
import { sampleJob, sampleLibrary, sampleStock, sampleWith } from './sample.js';

function jobOf(document: unknown): Job {
  const read = readJob(document, sampleLibrary(), sampleStock());
  if (!read.ok) throw new Error(read.problems.map((problem) => problem.message).join('\n'));
  return read.brief.job;
}

/** Every object of a value with its keys the other way round. */
function reversed(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(reversed);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .reverse()
      .map(([key, own]) => [key, reversed(own)]),
  );
}

type Path = readonly (string | number)[];

/** Paths of all numbers in a value. */
function numberPaths(value: unknown, path: Path = []): readonly Path[] {
  if (typeof value === 'number') return [path];
  if (typeof value !== 'object' || value === null) return [];
  const entries: readonly (readonly [string, unknown])[] = Object.entries(value);
  return entries.flatMap(([key, own]) => numberPaths(own, [...path, key]));
}

/** The value with the number at a path moved by one in its last places. */
function nudged(value: unknown, [key, ...rest]: Path): unknown {
  if (key === undefined) return Number(value) + Math.max(1e-12, Math.abs(Number(value)) * 1e-12);
  const copy = (Array.isArray(value) ? [...(value as unknown[])] : { ...(value as object) }) as Record<string, unknown>;
  copy[key] = nudged(copy[key], rest);
  return copy;
}

describe('jobDigest', () => {
  it('is the SHA-256 of the canonical text, as an independent hash has it', () => {
    fc.assert(
      fc.property(randomJob, (document) => {
        const job = jobOf(document);
        const hash = createHash('sha256').update(canonicalText(job), 'utf8').digest('hex');
        expect(jobDigest(job)).toBe(`sha256:${hash}`);
      }),
      { numRuns: 50 },
    );
  });

  it('has the canonical text of RFC 8785: keys sorted, no space, numbers in shortest form', () => {
    const text = canonicalText(jobOf(sampleJob()));
    expect(
      text.startsWith('{"author":null,"buckling":{"method":"formula","torsionKnockdown":0.67},"currency":null'),
    ).toBe(true);
    expect(text).toContain('"twistMax":0.05235987755982988');
    expect(text).toContain('"youngsModulus":70000000000');
  });

  it('does not see the order of keys', () => {
    fc.assert(
      fc.property(randomJob, (document) => {
        expect(jobDigest(jobOf(reversed(document)))).toBe(jobDigest(jobOf(document)));
      }),
      { numRuns: 50 },
    );
  });

  it('does not see the unit where the value is the same', () => {
    const inMillimetres = sampleWith('tube.length', '1400 mm');
    expect(jobDigest(jobOf(inMillimetres))).toBe(jobDigest(jobOf(sampleJob())));
  });

  it('sees a change of any number of the job', () => {
    const job = jobOf({ ...sampleJob(), speed: { max: '3000 rpm' }, sizes: { stock: 'two-tubes' } });
    const paths = numberPaths(job);
    const digests = new Set(paths.map((path) => jobDigest(nudged(job, path) as Job)));
    expect(paths.length).toBeGreaterThan(25);
    expect(digests.size).toBe(paths.length);
    expect(digests.has(jobDigest(job))).toBe(false);
  });

  it('sees a change of a word', () => {
    expect(jobDigest(jobOf(sampleWith('title', 'Simple')))).not.toBe(jobDigest(jobOf(sampleJob())));
  });
});
