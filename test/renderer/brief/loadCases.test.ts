import { expect, it } from 'vitest';
import { casesOf, withCopy, withNewCase } from '../../../renderer/brief/loadCases.js';
import { begin, smallJob } from '../window.js';

const LOADS = [
  { name: 'jam', torque: '900 N·m', twistMax: '3 deg' },
  { name: 'case 3', torque: '1 N·m' },
];

it('adds a case that can be sized, under a name of its own', () => {
  const loads = withNewCase(LOADS, 'SI');
  expect(loads[2]).toEqual({ name: 'case 3 2', torque: '0 N·m' });
  expect(withNewCase(LOADS, 'US')[2]?.['torque']).toBe('0 lbf·in');
  expect(begin(smallJob({ loads })).sound).toBe(true);
});

it('copies a case to the place beside it', () => {
  const once = withCopy(LOADS, 0);
  expect(once.map((load) => load['name'])).toEqual(['jam', 'jam copy', 'case 3']);
  expect(once[1]).toEqual({ ...LOADS[0], name: 'jam copy' });
  expect(withCopy(once, 0)[1]?.['name']).toBe('jam copy 2');
  expect(withCopy(LOADS, 7)).toBe(LOADS);
});

it('finds the cases of a document, whatever it holds', () => {
  expect(casesOf(undefined)).toEqual([]);
  expect(casesOf([3, { name: 'a' }])).toEqual([{}, { name: 'a' }]);
});
