import { expect, it } from 'vitest';
import { errorId, sentenceOf } from '../../../renderer/field/sentence.js';
import { missingValue, saidProblem } from '../../../src/material/problem.js';

it('tells a mistake as a sentence without its key path', () => {
  const problem = saidProblem('loads.0.torque', '9 mm', '"9 mm" is a length; expected a torque such as "9 N·m"', '');
  expect(sentenceOf(problem)).toBe('“9 mm” is a length; expected a torque such as “9 N·m”.');
});

it('tells what is missing', () => {
  expect(sentenceOf(missingValue('tube.length', 'a length'))).toBe('This is missing; expected a length.');
});

it('names the place of a mistake so that a page can point to it', () => {
  expect(errorId('loads.0.torque')).toBe('wrong-loads-0-torque');
});
