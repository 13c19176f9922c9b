import { expect, it } from 'vitest';
import { summary } from '../../../renderer/brief/summary.js';
import { smallJob } from '../window.js';

it('says a brief in one line', () => {
  expect(summary(smallJob(), 'SI')).toBe('900 N·m, 1.4 m, at most 90 mm, 3 materials');
  expect(summary({}, 'SI')).toBe('0 materials');
});

it('counts the cases beyond the first', () => {
  const loads = [{ torque: '900 N·m' }, { torque: '1 N·m' }];
  expect(summary(smallJob({ loads }), 'US')).toBe(
    '7965.7 lbf·in and 1 more case, 55.118 in, at most 3.5433 in, 3 materials',
  );
});
