import { describe, expect, it } from 'vitest';
import { ownLimit, strokesBeside } from '../../../../src/figure/front/limit.js';
import { jobOf } from './fronts.js';

const deg = Math.PI / 180;

describe('the job’s own limit', () => {
  it('is the twist of its only case', () => {
    const job = jobOf({ loads: [{ name: 'jam', torque: '900 N·m', twistMax: '3 deg' }] });
    const limit = ownLimit(job, 'twist', 'SI');
    expect(limit?.value).toBeCloseTo(3 * deg, 12);
    expect(limit?.words).toBe('twist at most 3 deg');
  });

  it('is the tightest of several, as the largest torque measures it, and says whose', () => {
    const job = jobOf({
      loads: [
        { name: 'jam', torque: '900 N·m', twistMax: '6 deg' },
        { name: 'cruise', torque: '-300 N·m', twistMax: '1 deg' },
        { name: 'free', torque: '2000 N·m' },
      ],
    });
    const limit = ownLimit(job, 'twist', 'SI');
    expect(limit?.value).toBeCloseTo(3 * deg, 12);
    expect(limit?.words).toBe('twist at most 1 deg, cruise');
  });

  it('is the greatest outer diameter, in the units that are shown', () => {
    const job = jobOf({ tube: { length: '1 m', outerDiameterMax: '3 in' } });
    expect(ownLimit(job, 'outerDiameter', 'SI')).toEqual({ value: 0.0762, words: 'outer diameter at most 76.2 mm' });
    expect(ownLimit(job, 'outerDiameter', 'US')?.words).toBe('outer diameter at most 3 in');
  });

  it('is none where the job sets none', () => {
    const job = jobOf({ tube: { length: '1 m' }, loads: [{ name: 'jam', torque: '900 N·m' }] });
    expect((['twist', 'outerDiameter', 'cost'] as const).map((against) => ownLimit(job, against, 'SI'))).toEqual([
      null,
      null,
      null,
    ]);
  });
});

it('has strokes on the side that is not allowed, at 45 degrees, within its length', () => {
  const strokes = [...strokesBeside(100, 10, 60).matchAll(/M([\d.]+) ([\d.]+)l([\d.-]+) ([\d.-]+)/g)].map((found) =>
    found.slice(1).map(Number),
  );
  expect(strokes.length).toBe(7);
  for (const [x = 0, y = 0, dx = 0, dy = 0] of strokes) {
    expect(x).toBe(100);
    expect(Math.hypot(dx, dy)).toBeCloseTo(5, 1);
    expect(dx).toBe(-dy);
    expect(dx).toBeGreaterThan(0);
    expect(y + dy).toBeGreaterThanOrEqual(10);
    expect(y).toBeLessThanOrEqual(60);
  }
});
