import { expect, it } from 'vitest';
import { checkArguments, noArguments, sizeArguments } from '../../../main/calls/arguments.js';

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

const TUBE = { job: {}, material: 'al', outerDiameter: 0.09, wall: 0.002 };

it('of a check are a job, a material and a tube that has a bore', () => {
  expect(checkArguments(TUBE)).toEqual(TUBE);
});

it.each([
  [null],
  [[]],
  [{}],
  [{ ...TUBE, more: 1 }],
  [{ ...TUBE, job: () => 1 }],
  [{ ...TUBE, material: 1 }],
  [{ ...TUBE, wall: '2 mm' }],
  [{ ...TUBE, wall: 0 }],
  [{ ...TUBE, wall: -1 }],
  [{ ...TUBE, wall: 0.045 }],
  [{ ...TUBE, wall: NaN }],
  [{ ...TUBE, outerDiameter: Infinity }],
])('of a check are refused where they are %j', (args) => {
  expect(() => checkArguments(args)).toThrow();
});
