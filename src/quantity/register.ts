import * as units from './units.js';
import type { Unit } from './units.js';

/** The two ways in which values are shown. */
export type UnitSystem = 'SI' | 'US';

/** What the program knows of a quantity. */
export interface QuantityEntry {
  /** with its article, for messages: 'a length' */
  readonly noun: string;
  /** a value as a user would write it: '1.4 m' */
  readonly example: string;
  /** symbol of the SI unit in which the engine holds it */
  readonly si: string;
  /** symbol of the unit in which a view shows it */
  readonly shown: Readonly<Record<UnitSystem, string>>;
  readonly units: readonly Unit[];
}

function entry(noun: string, example: string, shown: readonly [string, string], list: readonly Unit[]): QuantityEntry {
  const si = list.find((unit) => unit.times === unit.over);
  if (si === undefined) throw new Error(`The register has no SI unit for ${noun}.`);
  return Object.freeze({
    noun,
    example,
    si: si.symbol,
    shown: Object.freeze({ SI: shown[0], US: shown[1] }),
    units: Object.freeze(list),
  });
}

/** The one register of quantities. Where a spelling fits two of them the earlier one names it in messages. */
export const quantities = Object.freeze({
  length: entry('a length', '1.4 m', ['mm', 'in'], units.lengthUnits),
  angle: entry('an angle', '3 deg', ['deg', 'deg'], units.angleUnits),
  twistRate: entry('a twist per length', '2 deg/m', ['deg/m', 'deg/ft'], units.twistRateUnits),
  torque: entry('a torque', '900 N·m', ['N·m', 'lbf·in'], units.torqueUnits),
  force: entry('a force', '2500 N', ['N', 'lbf'], units.forceUnits),
  stress: entry('a stress or modulus', '240 MPa', ['MPa', 'ksi'], units.stressUnits),
  density: entry('a density', '2710 kg/m³', ['kg/m³', 'lb/in³'], units.densityUnits),
  rotationalSpeed: entry('a rotational speed', '3000 rpm', ['rpm', 'rpm'], units.rotationalSpeedUnits),
  mass: entry('a mass', '0.85 kg', ['kg', 'lb'], units.massUnits),
  linearMass: entry('a mass per length', '0.6 kg/m', ['kg/m', 'lb/ft'], units.linearMassUnits),
  torsionalStiffness: entry(
    'a torsional stiffness',
    '18400 N·m/rad',
    ['N·m/rad', 'lbf·in/rad'],
    units.torsionalStiffnessUnits,
  ),
  energy: entry('an energy', '22 J', ['J', 'ft·lbf'], units.energyUnits),
  area: entry('an area', '230 mm²', ['mm²', 'in²'], units.areaUnits),
  secondMoment: entry('a second moment of area', '110000 mm⁴', ['mm⁴', 'in⁴'], units.secondMomentUnits),
} satisfies Record<string, QuantityEntry>);

export type QuantityName = keyof typeof quantities;

export const quantityNames = Object.freeze(Object.keys(quantities) as QuantityName[]);

/**
 * An SI number that knows its quantity. A plain number may stand for it, so the engine computes with plain numbers;
 * a length does not pass for a torque.
 */
export type Quantity<Q extends QuantityName> = number & { readonly quantity?: Q };

/** The unit's symbol in which a view shows the quantity. */
export function shownUnit(quantity: QuantityName, system: UnitSystem): string {
  return quantities[quantity].shown[system];
}
