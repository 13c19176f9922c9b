import { describe, expect, it } from 'vitest';
import type { Job } from '../../../src/job/job.js';
import { flagsOf } from '../../../src/sizing/flags.js';
import { job, load, metal } from '../fixtures.js';

const codes = (own: Job, D: number, t: number): string[] => flagsOf(own, metal(), D, t).map(({ code }) => code);
const long = (length: number): Job => job({ tube: { ...job().tube, length } });

describe('the flags of a size', () => {
  it('are none for an ordinary tube', () => {
    expect(codes(job(), 0.06, 0.002)).toEqual([]);
  });

  it('say where the tube is short: γZ under 50', () => {
    // γ = 0.67^(4/3) = 0.5863, Z = L²/(r·tc)·√(1 − ν²): 50 at L = 0.0720 m for r = 29 mm, tc = 2 mm
    expect(codes(long(0.0719), 0.06, 0.002)).toEqual(['short-tube']);
    expect(codes(long(0.0721), 0.06, 0.002)).toEqual([]);
  });

  it('say where the wall is thick, r/t under 10, or thinner than was tested, over 1500', () => {
    // r/t = (D/t − 1)/2
    expect(codes(job(), 0.0418, 0.002)).toContain('thick-wall');
    expect(codes(job(), 0.0422, 0.002)).not.toContain('thick-wall');
    expect(codes(long(20), 3.0013, 0.001)).toContain('thin-wall');
    expect(codes(long(20), 3.0007, 0.001)).not.toContain('thin-wall');
  });

  it('say where the wall is thicker than the record’s strengths are for', () => {
    const upTo4 = metal({ wallMax: 4e-3 });
    const past = (wall: number): string[] => flagsOf(job(), upTo4, 0.09, wall).map(({ code }) => code);
    expect(past(4e-3)).toEqual([]);
    expect(past(4.01e-3)).toEqual(['wall-past-record']);
  });

  it('say that fatigue is not covered only where a load is said to reverse without an allowable', () => {
    const reversing = (own: object): Job => job({ loads: [load({ reversing: true, ...own })] });
    expect(codes(reversing({}), 0.06, 0.002)).toEqual(['fatigue-not-covered']);
    expect(codes(reversing({ shearStressMax: 60e6 }), 0.06, 0.002)).toEqual([]);
    expect(codes(reversing({ reversing: null }), 0.06, 0.002)).toEqual([]);
  });

  it('say where the search came to its end', () => {
    expect(codes(long(1000), 99.95, 0.2)).toContain('search-ceiling');
    expect(codes(long(1000), 99, 0.2)).not.toContain('search-ceiling');
  });
});
