import { expect, it } from 'vitest';
import { crowdOf } from '../../../../src/figure/front/crowd.js';

const AREA = { left: 40, right: 440, top: 10, bottom: 210 };
const crowd = crowdOf(
  [
    [
      { x: 40, y: 110 },
      { x: 440, y: 110 },
    ],
    [
      { x: 240, y: -500 },
      { x: 240, y: 900 },
    ],
  ],
  AREA,
);

it('counts the cells of lines under a box', () => {
  expect(crowd({ left: 60, right: 100, top: 104, bottom: 118 })).toBe(10);
  expect(crowd({ left: 60, right: 100, top: 20, bottom: 80 })).toBe(0);
  expect(crowd({ left: 230, right: 250, top: 10, bottom: 50 })).toBe(10);
});

it('counts the whole area once, and nothing beyond it', () => {
  expect(crowd(AREA)).toBe(100 + 50 - 1);
  expect(crowd({ left: -100, right: 1000, top: -100, bottom: 1000 })).toBe(149);
  expect(crowd({ left: 500, right: 600, top: 10, bottom: 210 })).toBe(0);
});
