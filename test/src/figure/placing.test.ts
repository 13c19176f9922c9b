import { describe, expect, it } from 'vitest';
import { captionLabel } from '../../../src/figure/label.js';
import { Placing } from '../../../src/figure/placing.js';

const AREA = { left: 0, top: 0, right: 200, bottom: 100 };

describe('placing', () => {
  it('refuses what leaves the area', () => {
    const placing = new Placing(AREA);
    expect(placing.fits([captionLabel('words', 100, 50)])).toBe(true);
    expect(placing.fits([captionLabel('words', 195, 50)])).toBe(false);
    expect(placing.fits([captionLabel('words', 100, 50)], { left: 0, top: 0, right: 200, bottom: 48 })).toBe(false);
  });

  it('refuses what lies on a label or a block, turned or not', () => {
    const placing = new Placing(AREA);
    placing.take([captionLabel('words', 100, 50)]);
    expect(placing.fits([captionLabel('words', 110, 52)])).toBe(false);
    expect(placing.fits([captionLabel('words', 100, 30)])).toBe(true);
    expect(placing.fits([captionLabel('long words on end', 100, 50, { turn: 90 })])).toBe(false);
    placing.block({ left: 20, top: 20, right: 40, bottom: 40 });
    expect(placing.fits([captionLabel('words', 30, 34)])).toBe(false);
  });

  it('counts the marks that are covered, and those that a line meets', () => {
    const placing = new Placing(AREA);
    placing.avoid([
      { x: 100, y: 47 },
      { x: 105, y: 47 },
      { x: 105, y: 80 },
      { x: 160, y: 80 },
    ]);
    expect(placing.covered([captionLabel('words', 100, 50)])).toBe(2);
    expect(placing.covered([captionLabel('words', 100, 20)])).toBe(0);
    expect(placing.crossed({ x: 80, y: 80 }, { x: 140, y: 81 })).toBe(1);
    expect(placing.crossed({ x: 100, y: 80 }, { x: 140, y: 80 })).toBe(0);
  });
});
