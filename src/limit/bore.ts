import type { Limit } from './check.js';
import { AtLeast, BORE } from './geometric.js';

/** What must pass through the tube, against its nominal bore D − 2t, m. */
export const bore: Limit = {
  id: 'bore',
  label: 'bore',
  unit: 'm',
  formula: 'U = bore_min/(D − 2t)',
  source: 'The job’s envelope',
  prepare: ({ tube: { boreMin } }) => (boreMin === null ? [] : [new AtLeast('bore', BORE, boreMin)]),
};
