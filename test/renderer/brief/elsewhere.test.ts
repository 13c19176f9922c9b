import { expect, it } from 'vitest';
import { problemsElsewhere } from '../../../renderer/brief/elsewhere.js';
import { begin, smallJob } from '../window.js';

it('leaves no mistake without a place', () => {
  const job = begin(smallJob({ title: '', colour: 'red', loads: [{ name: 'a', torque: 'much', hue: 1 }] }));
  expect(problemsElsewhere(job.problems).map(({ path }) => path)).toEqual(['colour', 'title', 'loads.0.hue']);
});
