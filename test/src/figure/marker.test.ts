import { describe, expect, it } from 'vitest';
import { TOKENS } from '../../../renderer/theme/tokens.js';
import { markAt, MARKER_FILLS, markerShape, marksOf } from '../../../src/figure/marker.js';

describe('markerShape', () => {
  it.each(Object.keys(TOKENS.families))('gives %s, which has a colour of its own, a shape of its own', (family) => {
    expect(markerShape(family)).not.toBe('plus');
  });

  it.each(['magnesium', 'constructor', ''])('gives a family nobody foresaw (%j) the plus', (family) => {
    expect(markerShape(family)).toBe('plus');
  });
});

describe('markAt', () => {
  it('fills the first three full, open and half, with solid, dashed and dotted lines', () => {
    const marks = [0, 1, 2].map((place) => markAt('steel', place));
    expect(marks.map(({ fill }) => fill)).toEqual(['full', 'open', 'half']);
    expect(marks.map(({ line }) => line)).toEqual(['solid', 'dashed', 'dotted']);
  });

  it('tells as many members apart by fill as there are fills, and eighteen by fill and line', () => {
    const marks = Array.from({ length: 18 }, (_, place) => markAt('steel', place));
    expect(new Set(marks.slice(0, MARKER_FILLS.length).map(({ fill }) => fill)).size).toBe(MARKER_FILLS.length);
    expect(new Set(marks.map(({ fill, line }) => `${fill} ${line}`)).size).toBe(18);
  });
});

describe('marksOf', () => {
  it('counts each family by itself, in the order of the list', () => {
    const marks = marksOf([
      { id: 'a', family: 'steel' },
      { id: 'b', family: 'aluminium' },
      { id: 'c', family: 'steel' },
    ]);
    expect(marks.get('a')).toMatchObject({ shape: 'square', fill: 'full' });
    expect(marks.get('b')).toMatchObject({ shape: 'circle', fill: 'full' });
    expect(marks.get('c')).toMatchObject({ shape: 'square', fill: 'open' });
  });
});
