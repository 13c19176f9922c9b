import { describe, expect, it } from 'vitest';
import { clipped } from '../../../src/figure/clip.js';

const AREA = { left: 0, top: 0, right: 10, bottom: 10 };

describe('a clipped line', () => {
  it('keeps what lies inside, in one piece', () => {
    const line = [
      { x: 1, y: 1 },
      { x: 5, y: 2 },
      { x: 9, y: 9 },
    ];
    expect(clipped(line, AREA)).toEqual([line]);
  });

  it('ends at the edge, and comes back as another piece', () => {
    const line = [
      { x: 5, y: 5 },
      { x: 15, y: 5 },
      { x: 15, y: 8 },
      { x: 5, y: 8 },
    ];
    expect(clipped(line, AREA)).toEqual([
      [
        { x: 5, y: 5 },
        { x: 10, y: 5 },
      ],
      [
        { x: 10, y: 8 },
        { x: 5, y: 8 },
      ],
    ]);
  });

  it('crosses from side to side where both ends lie outside, and is nothing where it misses', () => {
    expect(
      clipped(
        [
          { x: -5, y: 5 },
          { x: 15, y: 5 },
        ],
        AREA,
      ),
    ).toEqual([
      [
        { x: 0, y: 5 },
        { x: 10, y: 5 },
      ],
    ]);
    expect(
      clipped(
        [
          { x: -5, y: 12 },
          { x: 15, y: 12 },
        ],
        AREA,
      ),
    ).toEqual([]);
    expect(
      clipped(
        [
          { x: -5, y: 4 },
          { x: 4, y: -5 },
        ],
        AREA,
      ),
    ).toEqual([]);
  });
});
