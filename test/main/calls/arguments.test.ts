import { expect, it } from 'vitest';
import { noArguments, sizeArguments } from '../../../main/calls/arguments.js';

it('none are null', () => {
  expect(noArguments(null)).toBeNull();
  expect(() => noArguments(undefined)).toThrow('This call takes no arguments; expected null.');
});

it('of a run are a job of any kind, which the engine judges', () => {
  expect(sizeArguments({ job: 'anything' })).toEqual({ job: 'anything' });
});

it.each([[null], [[]], [1], [{}], [{ job: 1, run: 2 }], [{ job: undefined }], [{ job: () => 1 }], [{ Job: 1 }]])(
  'of a run are refused where they are %j',
  (args) => {
    expect(() => sizeArguments(args)).toThrow();
  },
);
