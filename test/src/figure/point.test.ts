import { describe, expect, it } from 'vitest';
import { coordinate, polyline } from '../../../src/figure/point.js';

describe('coordinate', () => {
  it.each([
    [1, '1'],
    [1.005, '1'],
    [1.236, '1.24'],
    [-0.001, '0'],
    [1e-9, '0'],
  ])('writes %d as %j', (value, expected) => {
    expect(coordinate(value)).toBe(expected);
  });
});

describe('polyline', () => {
  it('goes from point to point, and back where it is closed', () => {
    const points = [
      { x: 0, y: 1 },
      { x: 2.5, y: -3 },
    ];
    expect(polyline(points)).toBe('M0 1L2.5 -3');
    expect(polyline(points, true)).toBe('M0 1L2.5 -3z');
    expect(polyline([])).toBe('');
  });
});
