import { leastMass, strainEnergy } from './closed-forms.js';
import { columnAndWhirl } from './column-and-whirl.js';
import { driveShaft } from './drive-shaft.js';
import { knockdowns } from './knockdowns.js';
import { otherFormulas } from './other-formulas.js';
import { sectionAndStress } from './section-and-stress.js';
import { strength } from './strength.js';
import { tolerancesAndSizes } from './tolerances-and-sizes.js';
import { torsionBuckling } from './torsion-buckling.js';
import type { Row } from './row.js';

/** Published values of a tube that is given. */
export const CHECKED: readonly Row[] = [
  ...sectionAndStress,
  ...torsionBuckling,
  ...otherFormulas,
  ...driveShaft,
  ...knockdowns,
  ...columnAndWhirl,
  ...strength,
  ...tolerancesAndSizes,
  ...strainEnergy,
];

/** Every published value that the engine is held to. */
export const ROWS: readonly Row[] = [...CHECKED, ...leastMass];

/** The documents that the rows are from, by a name that stands in their sources. */
export const DOCUMENTS: readonly string[] = [
  'Hibbeler',
  'Beer and Johnston',
  'Gere, Mechanics of Materials',
  'Theory of Elastic Stability',
  'NASA SP-8007',
  'NACA Report 479',
  'NACA Report 887',
  'Roark',
  'EN 1993-1-6',
  'Rangaswamy',
  'Southwell and Gough',
  'Cowper',
  'MIL-HDBK-5',
  'MIL-T-6845',
  'EN 10083',
  'EN 10305-1',
  'ISO 1129',
  '14 CFR 25.303',
  'AWS B2.1',
  'Birmingham gauge',
];

/** Published values that the engine rightly does not give, and why. */
export const KNOWN_FAILURES: ReadonlyMap<string, string> = new Map([
  ['textbook-steel-lumped', 'all the mass at midspan; spread along the shaft it gives 8262 rpm'],
  ['textbook-aluminium-lumped', 'all the mass at midspan; spread along the shaft it gives 8255 rpm'],
]);
