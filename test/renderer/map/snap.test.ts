import { describe, expect, it } from 'vitest';
import { snapped, stepped } from '../../../renderer/map/snap.js';
import { linearAxis } from '../../../src/figure/axis.js';

const outer = linearAxis(0.04, 0.11, 1e-3, 9);
const wall = linearAxis(0, 0.004, 1e-3, 9);
const axes = { outer, wall, window: { outerLo: outer.lo, outerHi: outer.hi, wallLo: 0, wallHi: wall.hi, log: false } };
const stock = [0.06, 0.07, 0.08].flatMap((outerDiameter) =>
  [0.002, 0.003].map((thick) => ({ outerDiameter, wall: thick, fits: true })),
);

describe('a tube to try', () => {
  it('has sizes of whole hundredths of the steps of the axes', () => {
    expect(snapped({ outerDiameter: 0.0647321, wall: 0.0017377 }, axes, null)).toEqual({
      outerDiameter: 0.0647,
      wall: 0.00174,
    });
  });

  it('is none where there would be no bore', () => {
    expect(snapped({ outerDiameter: 0.001, wall: 0.003 }, axes, null)).toBeNull();
  });

  it('is the nearest listed one where there is a list', () => {
    expect(snapped({ outerDiameter: 0.066, wall: 0.0021 }, axes, stock)).toEqual({ outerDiameter: 0.07, wall: 0.002 });
    expect(snapped({ outerDiameter: 0.066, wall: 0.0021 }, axes, [])).toBeNull();
  });
});

describe('a step', () => {
  it('leaves the other size as it is', () => {
    const from = { outerDiameter: 0.0647321, wall: 0.0017377 };
    expect(stepped(from, [1, 0], axes, null)).toEqual({ outerDiameter: 0.0648, wall: 0.0017377 });
    expect(stepped(from, [0, -1], axes, null)).toEqual({ outerDiameter: 0.0647321, wall: 0.001735 });
  });

  it('goes to the next listed tube that way, and stays where there is none', () => {
    const from = { outerDiameter: 0.07, wall: 0.002 };
    expect(stepped(from, [1, 0], axes, stock)).toEqual({ outerDiameter: 0.08, wall: 0.002 });
    expect(stepped(from, [0, 1], axes, stock)).toEqual({ outerDiameter: 0.07, wall: 0.003 });
    expect(stepped({ outerDiameter: 0.08, wall: 0.002 }, [1, 0], axes, stock)).toEqual({
      outerDiameter: 0.08,
      wall: 0.002,
    });
  });
});
