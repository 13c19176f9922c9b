import { describe, expect, it } from 'vitest';
import { clip, joinPath, missingValue, saidProblem, showValue, wrongValue } from '../../../src/material/problem.js';

describe('a problem', () => {
  it('says path, value and expectation in one sentence', () => {
    expect(wrongValue('tube.length', '3 kg', 'is a mass', 'a length')).toEqual({
      path: 'tube.length',
      value: '3 kg',
      expected: 'a length',
      message: 'tube.length: "3 kg" is a mass; expected a length',
    });
  });

  it('says what is missing', () => {
    expect(missingValue('tube.length', 'a length')).toEqual({
      path: 'tube.length',
      value: '',
      expected: 'a length',
      message: 'tube.length: is missing; expected a length',
    });
  });

  it('has no path for the whole document', () => {
    expect(missingValue('', 'a job').message).toBe('is missing; expected a job');
  });

  it.each([
    [3, '3'],
    [null, 'null'],
    [true, 'true'],
    [[1], 'a list'],
    [{ a: 1 }, 'an object'],
    [Infinity, 'Infinity'],
  ])('shows %s as %s', (value, shown) => {
    expect(showValue(value)).toBe(shown);
    expect(saidProblem('a', value, 'said', 'else').value).toBe(shown);
  });

  it('clips long values and escapes what does not print', () => {
    const problem = wrongValue('a', `\u001b[31m${'x'.repeat(500)}`, 'is text', 'a number');
    expect(problem.value).toMatch(/^\\u\{1b\}\[31mx+…$/);
    expect(problem.value).toHaveLength(60);
    expect(clip('a\u202eb')).toBe('a\\u{202e}b');
  });

  it.each([
    ['', 'a', 'a'],
    ['loads', 0, 'loads.0'],
    ['loads.0', 'to\nrque', 'loads.0.to\\u{a}rque'],
  ])('joins "%s" and %j to %s', (path, key, joined) => {
    expect(joinPath(path, key)).toBe(joined);
  });
});
