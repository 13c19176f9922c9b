import { power, product, quotient, ratio, type Ratio } from './ratio.js';

/** One unit of a quantity: SI value = number × times / over. */
export interface Unit extends Ratio {
  /** as it is printed and handed back: 'N·m' */
  readonly symbol: string;
  /** other spellings; the order of factors and the way they are joined need none */
  readonly aliases: readonly string[];
}

function unit(symbol: string, factor: Ratio, ...aliases: string[]): Unit {
  return Object.freeze({ symbol, times: factor.times, over: factor.over, aliases: Object.freeze(aliases) });
}

// Exact by definition, as listed in NIST SP 811, Appendix B.
const ONE = ratio(1);
const KILO = ratio(1e3);
const MEGA = ratio(1e6);
const GIGA = ratio(1e9);
const MILLI = ratio(1, 1e3);
/** 1 in = 0.0254 m */
const INCH = ratio(254, 10_000);
/** 1 ft = 12 in = 0.3048 m */
const FOOT = product(INCH, ratio(12));
/** 1 lb = 0.45359237 kg */
const POUND = ratio(45_359_237, 100_000_000);
/** standard gravity, 9.80665 m/s² */
const GRAVITY = ratio(980_665, 100_000);
/** 1 lbf = 0.45359237 kg × 9.80665 m/s² = 4.4482216152605 N */
const POUND_FORCE = product(POUND, GRAVITY);
/** 1 kip = 1000 lbf */
const KIP = product(POUND_FORCE, KILO);
const DEGREE = ratio(Math.PI, 180);

export const lengthUnits: readonly Unit[] = [
  unit('m', ONE),
  unit('mm', MILLI),
  unit('cm', ratio(1, 100)),
  unit('km', KILO),
  unit('µm', ratio(1, 1e6)),
  unit('in', INCH),
  unit('ft', FOOT),
  unit('thou', quotient(INCH, KILO)), // 0.001 in
];

export const angleUnits: readonly Unit[] = [
  unit('rad', ONE),
  unit('mrad', MILLI),
  unit('deg', DEGREE), // π/180 rad
  unit('arcmin', ratio(Math.PI, 10_800)), // 1/60 deg
  unit('rev', ratio(2 * Math.PI)),
];

/** Every angle over every length. */
export const twistRateUnits: readonly Unit[] = angleUnits.flatMap((angle) =>
  lengthUnits.map((length) => unit(`${angle.symbol}/${length.symbol}`, quotient(angle, length))),
);

export const torqueUnits: readonly Unit[] = [
  unit('N·m', ONE, 'Nm'),
  unit('kN·m', KILO, 'kNm'),
  unit('MN·m', MEGA, 'MNm'),
  unit('N·mm', MILLI, 'Nmm'),
  unit('lbf·in', product(POUND_FORCE, INCH), 'lb·in', 'lbfin', 'inlbf', 'lbin', 'inlb'),
  unit('lbf·ft', product(POUND_FORCE, FOOT), 'lb·ft', 'lbfft', 'ftlbf', 'lbft', 'ftlb'),
  unit('kip·in', product(KIP, INCH)),
  unit('kip·ft', product(KIP, FOOT)),
  unit('kgf·m', GRAVITY, 'kgfm'),
];

export const forceUnits: readonly Unit[] = [
  unit('N', ONE),
  unit('kN', KILO),
  unit('MN', MEGA),
  unit('lbf', POUND_FORCE),
  unit('kip', KIP),
  unit('kgf', GRAVITY), // 1 kg × 9.80665 m/s²
];

const PSI = quotient(POUND_FORCE, power(INCH, 2));

export const stressUnits: readonly Unit[] = [
  unit('Pa', ONE, 'N/m²'),
  unit('kPa', KILO, 'kN/m²'),
  unit('MPa', MEGA, 'MN/m²'),
  unit('GPa', GIGA, 'kN/mm²', 'GN/m²'),
  unit('N/mm²', MEGA),
  unit('psi', PSI, 'PSI', 'lbf/in²', 'lb/in²'), // 1 lbf/in² = 4.4482216152605 N / (0.0254 m)²
  unit('ksi', product(PSI, KILO), 'KSI', 'kip/in²'),
  unit('Msi', product(PSI, MEGA), 'MSI'),
  unit('bar', ratio(1e5)),
];

export const densityUnits: readonly Unit[] = [
  unit('kg/m³', ONE),
  unit('g/cm³', KILO, 'g/cc'),
  unit('lb/in³', quotient(POUND, power(INCH, 3))),
  unit('lb/ft³', quotient(POUND, power(FOOT, 3))),
];

export const rotationalSpeedUnits: readonly Unit[] = [
  unit('rad/s', ONE),
  unit('rpm', ratio(Math.PI, 30), 'RPM', '1/min', 'r/min', 'rev/min'), // 2π rad in 60 s
  unit('Hz', ratio(2 * Math.PI), 'rev/s', 'r/s'), // turns a second; 1/s alone could mean rad/s and is not read
];

export const massUnits: readonly Unit[] = [
  unit('kg', ONE),
  unit('g', MILLI),
  unit('t', KILO),
  unit('lb', POUND),
  unit('oz', quotient(POUND, ratio(16))), // 1/16 lb
];

export const linearMassUnits: readonly Unit[] = [
  unit('kg/m', ONE),
  unit('g/m', MILLI),
  unit('lb/ft', quotient(POUND, FOOT)),
  unit('lb/in', quotient(POUND, INCH)),
];

/** Every torque over a radian or a degree. */
export const torsionalStiffnessUnits: readonly Unit[] = torqueUnits.flatMap((torque) => [
  unit(`${torque.symbol}/rad`, torque, ...torque.aliases.map((alias) => `${alias}/rad`)),
  unit(`${torque.symbol}/deg`, quotient(torque, DEGREE), ...torque.aliases.map((alias) => `${alias}/deg`)),
]);

export const energyUnits: readonly Unit[] = [
  unit('J', ONE, 'N·m', 'Nm'),
  unit('kJ', KILO, 'kN·m', 'kNm'),
  unit('ft·lbf', product(FOOT, POUND_FORCE), 'ft·lb', 'ftlbf', 'ftlb'),
  unit('in·lbf', product(INCH, POUND_FORCE), 'in·lb', 'inlbf', 'inlb'),
];

export const areaUnits: readonly Unit[] = [
  unit('m²', ONE),
  unit('mm²', ratio(1, 1e6)),
  unit('cm²', ratio(1, 1e4)),
  unit('in²', power(INCH, 2)),
  unit('ft²', power(FOOT, 2)),
];

export const secondMomentUnits: readonly Unit[] = [
  unit('m⁴', ONE),
  unit('mm⁴', ratio(1, 1e12)),
  unit('cm⁴', ratio(1, 1e8)),
  unit('in⁴', power(INCH, 4)),
];
