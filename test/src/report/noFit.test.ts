import { describe, expect, it } from 'vitest';
import { noFitText } from '../../../src/report/noFit.js';

const ease = (path: string): { path: string; from: string; to: string } => ({ path, from: '30 mm', to: '86.1 mm' });

describe('noFitText', () => {
  it('names what stands against each other and every single change that helps', () => {
    const eases = [ease('tube.outerDiameterMax'), ease('tube.boreMin')];
    expect(noFitText('alloy', { conflict: ['twist', 'outer-diameter'], ease: eases, torqueFactor: null })).toBe(
      'alloy: nothing fits: twist and outer diameter stand against each other. Something fits with ' +
        'tube.outerDiameterMax at 86.1 mm in place of 30 mm or tube.boreMin at 86.1 mm in place of 30 mm.',
    );
  });

  it('offers less torque, rounded down, where nothing else helps', () => {
    expect(noFitText('alloy', { conflict: ['shear-yield'], ease: [], torqueFactor: 0.62999 })).toBe(
      'alloy: nothing fits: shear yield cannot be met. Something fits at 0.629 times the torque.',
    );
  });

  it('says so where no single change helps', () => {
    expect(noFitText('alloy', { conflict: ['whirl'], ease: [], torqueFactor: null })).toBe(
      'alloy: nothing fits: whirl cannot be met. No single change of the job lets something fit.',
    );
  });
});
