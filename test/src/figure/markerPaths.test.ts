import { describe, expect, it } from 'vitest';
import { MARKER_FILLS, type MarkerShape } from '../../../src/figure/marker.js';
import { markerPaths } from '../../../src/figure/markerPaths.js';

const SHAPES: readonly MarkerShape[] = ['circle', 'square', 'triangle', 'diamond', 'cross', 'plus'];

/** The corners that straight path data names, px. */
function corners(path: string): [number, number][] {
  return Array.from(path.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g), ([, x, y]) => [Number(x), Number(y)]);
}

describe.each(SHAPES)('the %s', (shape) => {
  it('stays within its 14 px, line and all, however it is filled', () => {
    for (const fill of MARKER_FILLS) {
      const { outline, strokeWidth } = markerPaths({ shape, fill });
      const reach = Math.max(...corners(outline).flat().map(Math.abs)) + strokeWidth / 2;
      expect(reach, fill).toBeLessThan(7);
    }
  });

  it('looks different in every fill', () => {
    const drawn = MARKER_FILLS.map((fill) => JSON.stringify(markerPaths({ shape, fill })));
    expect(new Set(drawn).size).toBe(MARKER_FILLS.length);
  });

  it('fills the lower half alone, the left alone, the right alone', () => {
    const filled = (fill: 'half' | 'left' | 'right') => corners(markerPaths({ shape, fill }).filled);
    expect(Math.min(...filled('half').map(([, y]) => y))).toBeCloseTo(0, 6);
    expect(Math.max(...filled('left').map(([x]) => x))).toBeCloseTo(0, 6);
    expect(Math.min(...filled('right').map(([x]) => x))).toBeCloseTo(0, 6);
  });

  it('fills nothing where it is open', () => {
    expect(markerPaths({ shape, fill: 'open' }).filled).toBe('');
  });
});

describe('a full cross or plus', () => {
  it.each(['cross', 'plus'] as const)('is two strokes: %s', (shape) => {
    expect(markerPaths({ shape, fill: 'full' }).outline).toMatch(/^M[^Mz]+M[^Mz]+$/);
  });
});
