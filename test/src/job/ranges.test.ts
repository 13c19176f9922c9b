import { describe, expect, it } from 'vitest';
import { JOB_DEFAULTS } from '../../../src/job/defaults.js';
import { JOB_RANGES } from '../../../src/job/ranges.js';
import { isInside, type Range } from '../../../src/material/range.js';
import { parseQuantity } from '../../../src/quantity/parse.js';

const rules = Object.entries(JOB_RANGES).filter(([, rule]) => typeof rule === 'object' && 'expected' in rule);

describe('JOB_RANGES', () => {
  it.each(rules)('gives an example of %s that it takes', (_name, rule) => {
    const spec = rule as typeof JOB_RANGES.length;
    const example = /such as "(.+)"$/.exec(spec.expected)?.[1] ?? '';
    const parsed = parseQuantity(example, spec.quantity);
    expect(parsed.ok && isInside(parsed.value, spec.range)).toBe(true);
  });

  it.each<readonly [keyof typeof JOB_DEFAULTS, Range<number>]>([
    ['diameterToWallMin', JOB_RANGES.diameterToWall],
    ['diameterToWallMax', JOB_RANGES.diameterToWall],
    ['yieldFactor', JOB_RANGES.factor],
    ['ultimateFactor', JOB_RANGES.factor],
    ['speedMargin', JOB_RANGES.speedMargin],
    ['torsionKnockdown', JOB_RANGES.torsionKnockdown],
    ['bending', JOB_RANGES.bending.range],
    ['axial', JOB_RANGES.axial.range],
  ])('takes the default of %s', (key, range) => {
    expect(isInside(Number(JOB_DEFAULTS[key]), range)).toBe(true);
  });

  it('holds the limits of the reader', () => {
    expect([JOB_RANGES.loads, JOB_RANGES.materials]).toEqual([200, 200]);
    expect(Object.isFrozen(JOB_RANGES)).toBe(true);
  });
});
