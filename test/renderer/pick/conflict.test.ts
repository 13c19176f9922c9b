import { describe, expect, it } from 'vitest';
import { easeLines, lastResort, requirementTerm } from '../../../renderer/pick/conflict.js';
import { conflictWords } from '../../../src/report/noFit.js';
import type { NoFit } from '../../../src/report/report.js';

const job = { loads: [{ name: 'jam' }, { name: 'cruise' }] };

function noFit(own: Partial<NoFit> = {}): NoFit {
  return { conflict: ['twist', 'outer-diameter'], ease: [], torqueFactor: null, ...own };
}

describe('requirementTerm', () => {
  it.each([
    ['tube.outerDiameterMax', 'outer diameter at most'],
    ['tube.boreMin', 'bore at least'],
    ['speed.max', 'running speed'],
    ['loads.1.twistMax', 'twist at most, cruise'],
    ['something.new', 'something.new'],
  ])('calls %s %j', (path, expected) => {
    expect(requirementTerm(path, job)).toBe(expected);
  });

  it('names no load case where there is but one', () => {
    expect(requirementTerm('loads.0.twistMax', { loads: [{ name: 'jam' }] })).toBe('twist at most');
  });
});

describe('conflictWords', () => {
  it('says what stands against what', () => {
    expect(conflictWords(noFit())).toBe('nothing fits: twist and outer diameter stand against each other');
    expect(conflictWords(noFit({ conflict: ['whirl'] }))).toBe('nothing fits: whirl cannot be met');
    expect(conflictWords(noFit({ conflict: [] }))).toBe('nothing fits');
  });
});

describe('lastResort', () => {
  it('is silent where a single change opens the way', () => {
    const ease = [{ path: 'tube.boreMin', from: '20 mm', to: '18 mm' }];
    expect(lastResort(noFit({ ease }))).toBeNull();
  });

  it('never promises more torque than fits', () => {
    expect(lastResort(noFit({ torqueFactor: 0.4567 }))).toBe('it fits at 0.456 times the torque');
    expect(lastResort(noFit({ torqueFactor: 0.456 }))).toBe('it fits at 0.456 times the torque');
    expect(lastResort(noFit())).toBe('no single change of the brief lets something fit');
  });
});

describe('easeLines', () => {
  it('says each change as the job file would write it', () => {
    const ease = [{ path: 'loads.0.twistMax', from: '3 deg', to: '3.92 deg' }];
    expect(easeLines(noFit({ ease }), job)).toEqual([
      {
        ease: ease[0],
        term: 'twist at most, jam',
        spoken: 'apply: twist at most, jam 3.92 deg in place of 3 deg',
      },
    ]);
  });
});
