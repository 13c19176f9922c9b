import * as interaction from '../../src/buckling/interaction.js';
import * as knockdown from '../../src/buckling/knockdown.js';
import * as parabola from '../../src/buckling/parabola.js';
import * as torsion from '../../src/buckling/torsion.js';
import * as mass from '../../src/sizing/mass.js';
import * as size from '../../src/sizing/size.js';
import * as section from '../../src/tube/section.js';

/** What the rows of the published tables call; held in one object so that they can be run on a changed copy. */
export const engine = {
  ...interaction,
  ...knockdown,
  ...parabola,
  ...torsion,
  ...mass,
  ...size,
  ...section,
};

export type Engine = typeof engine;
