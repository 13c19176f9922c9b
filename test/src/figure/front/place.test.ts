import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { holds, overlaps, type Box } from '../../../../src/figure/front/box.js';
import { crowdOf } from '../../../../src/figure/front/crowd.js';
import { LEADER_FROM, placeLabels, type Unplaced } from '../../../../src/figure/front/place.js';

const WITHIN: Box = { left: 40, right: 700, top: 8, bottom: 220 };
const empty = (): number => 0;

function label(key: string, x: number, y: number, more: Partial<Unplaced> = {}): Unplaced {
  return { key, at: { x, y }, width: 90, height: 14, gap: 9, prefers: 'right', reach: Infinity, ...more };
}

describe('labels', () => {
  it('stand at their points, without a leader, where there is room', () => {
    const [placed] = placeLabels([label('a', 100, 100)], [], WITHIN, empty);
    expect(placed).toEqual({ key: 'a', box: { left: 109, right: 199, top: 93, bottom: 107 }, leader: null });
  });

  it('stand on the other side where the drawing ends', () => {
    const [placed] = placeLabels([label('a', 680, 100)], [], WITHIN, empty);
    expect(placed?.box.right).toBe(671);
  });

  it('give way to those before them, with a leader where they move far', () => {
    const three = ['a', 'b', 'c', 'd'].map((key) => label(key, 100, 100));
    const placed = placeLabels(three, [], WITHIN, empty);
    expect(placed[0]?.leader).toBeNull();
    expect(placed.at(-1)?.leader).not.toBeNull();
  });

  it('keep clear of what is taken, and of lines where that is not far', () => {
    const taken = { left: 105, right: 210, top: 90, bottom: 110 };
    const [beside] = placeLabels([label('a', 100, 100)], [taken], WITHIN, empty);
    expect(beside !== undefined && overlaps(beside.box, taken)).toBe(false);
    const line = [
      { x: 105, y: 100 },
      { x: 220, y: 100 },
    ];
    const crowd = crowdOf([line], WITHIN);
    const [off] = placeLabels([label('a', 100, 100)], [], WITHIN, crowd);
    expect(off === undefined ? 1 : crowd(off.box)).toBe(0);
  });

  it('are left out where they would have to go too far', () => {
    const taken = { left: 40, right: 700, top: 70, bottom: 130 };
    expect(placeLabels([label('a', 100, 100, { reach: 30 })], [taken], WITHIN, empty)).toEqual([]);
    expect(placeLabels([label('a', 100, 100, { reach: 60 })], [taken], WITHIN, empty)).toHaveLength(1);
  });

  it('are left out where nothing is free', () => {
    expect(placeLabels([label('a', 100, 100)], [WITHIN], WITHIN, empty)).toEqual([]);
  });

  it('never overlap, never leave the drawing, and have a leader exactly where they moved far', () => {
    const any = fc.record({
      x: fc.integer({ min: 40, max: 700 }),
      y: fc.integer({ min: 8, max: 220 }),
      width: fc.integer({ min: 20, max: 180 }),
    });
    fc.assert(
      fc.property(fc.array(any, { maxLength: 40 }), (points) => {
        const labels = points.map(({ x, y, width }, i) => label(String(i), x, y, { width }));
        const placed = placeLabels(labels, [], WITHIN, empty);
        for (const [index, { key, box, leader }] of placed.entries()) {
          expect(holds(WITHIN, box)).toBe(true);
          for (const other of placed.slice(index + 1)) expect(overlaps(box, other.box)).toBe(false);
          const { at, gap } = labels[Number(key)]!;
          const aside = Math.min(Math.abs(box.left - at.x - gap), Math.abs(at.x - gap - box.right));
          const moved = Math.hypot(aside, (box.top + box.bottom) / 2 - at.y);
          expect(leader !== null).toBe(moved > LEADER_FROM);
        }
      }),
      { numRuns: 60 },
    );
  });
});
