import type { FrontAxis } from './job.js';

/** What a job means where it says nothing. The reader, the form and the handbook take it from here. */
export const JOB_DEFAULTS = Object.freeze({
  /** D/t: below it the tube is no longer a tube */
  diameterToWallMin: 6,
  /** D/t: above it no cited buckling rule holds */
  diameterToWallMax: 600,
  /** N·m */
  bending: 0,
  /** N */
  axial: 0,
  yieldFactor: 1,
  /** 14 CFR 25.303; the buckling factor follows it where none is given */
  ultimateFactor: 1.5,
  /** first whirl speed over greatest running speed */
  speedMargin: 1.25,
  /** γ^(3/4) of NASA SP-8007 for torsion */
  torsionKnockdown: 0.67,
  bucklingMethod: 'formula',
  sizes: 'any',
  frontAgainst: 'twist' satisfies FrontAxis,
} as const);
