import type { Limit } from './check.js';
import { AtLeast, AtMost, OUTER_DIAMETER } from './geometric.js';

/** The envelope. */
export const outerDiameter: Limit = {
  id: 'outer-diameter',
  label: 'outer diameter',
  unit: 'm',
  formula: 'U = the larger of D/D_max and D_min/D',
  source: 'The job’s envelope',
  prepare: ({ tube: { outerDiameterMax, outerDiameterMin } }) => [
    ...(outerDiameterMax === null ? [] : [new AtMost('outer-diameter', OUTER_DIAMETER, outerDiameterMax)]),
    ...(outerDiameterMin === null ? [] : [new AtLeast('outer-diameter', OUTER_DIAMETER, outerDiameterMin)]),
  ],
};
