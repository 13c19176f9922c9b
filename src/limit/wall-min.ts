import type { Limit } from './check.js';
import { AtLeast, WALL } from './geometric.js';

/** Minimum gauge, the record's or the job's. */
export const wallMin: Limit = {
  id: 'wall-min',
  label: 'minimum wall',
  unit: 'm',
  formula: 'U = t_min/t, t_min the larger of the material’s and the job’s, t nominal',
  source: 'The process’s minimum gauge and the job’s own',
  prepare: ({ tube }, metal) => {
    const least = Math.max(metal.wallMin, tube.wallMin ?? 0);
    return least > 0 ? [new AtLeast('wall-min', WALL, least)] : [];
  },
};
