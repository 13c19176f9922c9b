import type { Limit } from './check.js';
import { AtLeast, AtMost, SLIMNESS } from './geometric.js';

/** The range of D/t in which the rules of this engine hold. */
export const diameterToWall: Limit = {
  id: 'diameter-to-wall',
  label: 'diameter to wall',
  unit: '1',
  formula: 'U = the larger of (D/t)_min/(D/t) and (D/t)/(D/t)_max',
  source: 'Below 6 the tube is no longer a tube; above 600 no cited buckling rule holds (ours, unless the job says)',
  prepare: ({ tube }) => [
    new AtLeast('diameter-to-wall', SLIMNESS, tube.diameterToWallMin),
    new AtMost('diameter-to-wall', SLIMNESS, tube.diameterToWallMax),
  ],
};
