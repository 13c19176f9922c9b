import { inUnit } from '../../src/quantity/format.js';
import { shownUnit, type UnitSystem } from '../../src/quantity/register.js';
import type { Design, LimitEntry } from '../../src/report/report.js';
import { figuresText, moneyText } from './values.js';

/** One line of what the tube is like. */
export interface Fact {
  readonly term: string;
  readonly value: string;
}

/** Stiffness is said for each degree, as twist is. */
const STIFFNESS_UNITS = { SI: 'N·m/deg', US: 'lbf·in/deg' } as const;

function quantityFact(term: string, number: number, significant: number, unit: string): Fact {
  return { term, value: `${figuresText(number, significant)} ${unit}` };
}

/** The least first whirl speed over the load cases; none where the job has no running speed. */
function whirlFact(limits: readonly LimitEntry[], system: UnitSystem): readonly Fact[] {
  const speeds = limits.filter(({ limit }) => limit === 'whirl').map(({ capacity }) => capacity);
  if (speeds.length === 0) return [];
  const unit = shownUnit('rotationalSpeed', system);
  return [{ term: 'first whirl', value: `${inUnit(Math.min(...speeds), 'rotationalSpeed', unit).toFixed(0)} ${unit}` }];
}

/** What the report says of a design beside its mass and size. */
export function facts(
  design: Design,
  limits: readonly LimitEntry[],
  currency: string | null,
  system: UnitSystem,
): readonly Fact[] {
  const { twist, torsionalStiffness, strainEnergy, cost } = design;
  const stiffnessUnit = STIFFNESS_UNITS[system];
  const energyUnit = shownUnit('energy', system);
  return [
    quantityFact('twist', inUnit(twist, 'angle', 'deg'), 3, 'deg'),
    quantityFact('stiffness', inUnit(torsionalStiffness, 'torsionalStiffness', stiffnessUnit), 3, stiffnessUnit),
    quantityFact('strain energy', inUnit(strainEnergy, 'energy', energyUnit), 3, energyUnit),
    ...whirlFact(limits, system),
    ...(cost === null ? [] : [{ term: 'cost', value: moneyText(cost, currency) }]),
  ];
}

/** The mass as the number and unit that stand large, and the mass of a metre or foot of tube in words. */
export function massTexts(
  { mass }: Design,
  length: number,
  system: UnitSystem,
): { readonly number: string; readonly unit: string; readonly perLength: string } {
  const unit = shownUnit('mass', system);
  const linear = inUnit(mass / length, 'linearMass', shownUnit('linearMass', system));
  return {
    number: figuresText(inUnit(mass, 'mass', unit), 4),
    unit,
    perLength: `${figuresText(linear, 4)} ${unit} per ${system === 'SI' ? 'metre' : 'foot'}`,
  };
}
