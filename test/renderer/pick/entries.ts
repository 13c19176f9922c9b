import type { Design, LimitEntry } from '../../../src/report/report.js';

/** A limit half full, with whatever the test says otherwise. */
export function entry(own: Partial<LimitEntry> = {}): LimitEntry {
  return {
    limit: 'twist',
    load: 'jam',
    demand: 0.05,
    capacity: 0.1,
    unit: 'rad',
    utilisation: 0.5,
    margin: 1,
    governs: false,
    ...own,
  };
}

/** A tube of round numbers, with whatever the test says otherwise. */
export function design(own: Partial<Design> = {}): Design {
  return {
    outerDiameter: 0.09,
    wall: 0.002,
    bore: 0.086,
    meanRadius: 0.044,
    mass: 1.729,
    twist: 0.0523598775,
    torsionalStiffness: 17188.73,
    strainEnergy: 23.56,
    cost: null,
    layup: null,
    ...own,
  };
}
