import { describe, expect, it } from 'vitest';
import { readNumber } from '../../../src/quantity/number-text.js';

describe('readNumber', () => {
  it.each([
    ['900 N', 900, ' N'],
    ['+1.40m', 1.4, 'm'],
    ['-.5 m', -0.5, ' m'],
    ['5. m', 5, ' m'],
    ['\u22122e\u22123 m', -0.002, ' m'],
    ['1E+3 m', 1000, ' m'],
    ['1em', 1, 'em'],
    ['0bar', 0, 'bar'],
    ['0e400 m', 0, ' m'],
    ['0e-400 m', 0, ' m'],
    ['3000 1/min', 3000, ' 1/min'],
    ['7', 7, ''],
  ])('%s: %f', (text, number, rest) => {
    expect(readNumber(text)).toEqual({ ok: true, number, rest });
  });
});
