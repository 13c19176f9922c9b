import { describe, expect, it } from 'vitest';
import { isInside, rangeText } from '../../../src/material/range.js';

describe('a range', () => {
  it.each([
    [0, { atLeast: 0 }, true],
    [0, { above: 0 }, false],
    [1e-9, { above: 0 }, true],
    [1, { atMost: 1 }, true],
    [1, { below: 1 }, false],
    [2, { atLeast: 0, atMost: 1 }, false],
    [-1, { atLeast: 0, atMost: 1 }, false],
    [NaN, {}, false],
    [Infinity, {}, false],
    [5, {}, true],
  ])('tells whether %d lies in %j', (value, range, inside) => {
    expect(isInside(value, range)).toBe(inside);
  });

  it.each([
    [{ atLeast: '1 MPa', atMost: '10 GPa' }, 'from 1 MPa to 10 GPa'],
    [{ above: 0, below: 0.5 }, 'above 0 and below 0.5'],
    [{ above: 0, atMost: 1 }, 'above 0 and at most 1'],
    [{ atLeast: 2 }, 'at least 2'],
    [{}, ''],
  ])('says %j', (range, text) => {
    expect(rangeText(range)).toBe(text);
  });
});
