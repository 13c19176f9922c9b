import { describe, expect, it } from 'vitest';
import { reachable, readPlacement } from '../../../main/electron/bounds.js';

const AREA = { x: 0, y: 25, width: 1920, height: 1015 };

describe('a placement', () => {
  it('is read as it was kept', () => {
    const bounds = { x: -10, y: 30, width: 1200, height: 800 };
    expect(readPlacement({ bounds, maximized: true })).toEqual({ bounds, maximized: true });
  });

  it.each([
    null,
    1,
    [],
    {},
    { bounds: 1 },
    { bounds: { x: 1, y: 2, width: 3 } },
    { bounds: { x: 1.5, y: 2, width: 3, height: 4 }, maximized: 1 },
  ])('is nothing where it is %j', (value) => {
    expect(readPlacement(value)).toEqual({ bounds: null, maximized: false });
  });
});

describe('bounds', () => {
  it('on the display stay as they are', () => {
    const bounds = { x: 100, y: 100, width: 1200, height: 800 };
    expect(reachable(bounds, AREA)).toEqual(bounds);
  });

  it.each([
    ['left', { x: -1190, y: 100, width: 1200, height: 800 }],
    ['right', { x: 1900, y: 100, width: 1200, height: 800 }],
    ['above', { x: 100, y: 0, width: 1200, height: 800 }],
    ['below', { x: 100, y: 1020, width: 1200, height: 800 }],
  ])('out of reach to the %s keep their size alone', (_side, bounds) => {
    expect(reachable(bounds, AREA)).toEqual({ width: 1200, height: 800 });
  });

  it('larger than the display, or too small, are brought to size', () => {
    expect(reachable({ x: 0, y: 25, width: 5000, height: 4000 }, AREA)).toMatchObject({ width: 1920, height: 1015 });
    expect(reachable({ x: 0, y: 25, width: 1, height: 1 }, AREA)).toMatchObject({ width: 480, height: 360 });
  });
});
