/** One change of the engine: every occurrence of a piece of its source, replaced. */
export interface Mutant {
  readonly what: string;
  /** under src/ */
  readonly file: string;
  readonly find: string;
  readonly replace: string;
}

/** A limit's own demand or capacity off by one percent: two rows or more must notice. */
export const LIMIT_MUTANTS: readonly Mutant[] = [
  mutant('shear-yield', 'limit/shear-yield.ts', 'factor: load.yieldFactor', 'factor: 1.01 * load.yieldFactor'),
  mutant('shear-ultimate', 'limit/shear-ultimate.ts', 'load.ultimateFactor', '1.01 * load.ultimateFactor'),
  mutant('shear-allowable', 'limit/shear-allowable.ts', '= Math.abs(torque)', '= 1.01 * Math.abs(torque)'),
  mutant('twist', 'limit/twist.ts', '(Math.abs(torque) * length)', '(1.01 * Math.abs(torque) * length)'),
  mutant('wall-buckling', 'limit/wall-buckling.ts', '= loadCase.bucklingFactor', '= 1.01 * loadCase.bucklingFactor'),
  mutant('column', 'limit/column.ts', '= loadCase.bucklingFactor', '= 1.01 * loadCase.bucklingFactor'),
  mutant('whirl', 'limit/whirl.ts', 'margin * max', '1.01 * margin * max'),
  mutant('wall-min', 'limit/wall-min.ts', '= Math.max(', '= 1.01 * Math.max('),
  mutant('outer-diameter', 'limit/outer-diameter.ts', 'R, outerDiameterMax', 'R, 1.01 * outerDiameterMax'),
  mutant('bore', 'limit/geometric.ts', 'outerDiameter - 2 * wall', 'outerDiameter - 2.02 * wall'),
  mutant('diameter-to-wall', 'limit/geometric.ts', 'outerDiameter / wall', '(1.01 * outerDiameter) / wall'),
];

/** Leading constants off by one percent: some row must notice. */
export const CONSTANT_MUTANTS: readonly Mutant[] = [
  mutant('area', 'tube/section.ts', '2 * Math.PI * r * tc', '2.02 * Math.PI * r * tc'),
  mutant('½ of r² in I/A', 'tube/section.ts', 'r * r * 0.5', 'r * r * 0.505'),
  mutant('⅛ of tc² in I/A', 'tube/section.ts', 'tc * tc * 0.125', 'tc * tc * 0.12625'),
  mutant('J = 2I', 'tube/section.ts', '2 * secondMoment', '2.02 * secondMoment'),
  mutant('1/I', 'tube/section.ts', '1 / secondMoment', '1.01 / secondMoment'),
  mutant('ro/J', 'tube/section.ts', '0.5 * ro', '0.505 * ro'),
  mutant('wall tolerance', 'tube/section.ts', '1 - tolerance', '1 - 1.01 * tolerance'),
  mutant('strength’s scale', 'limit/strength.ts', 'factor / metal.jointFactor', '(1.01 * factor) / metal.jointFactor'),
  mutant('strength’s joint factor', 'limit/strength.ts', '/ metal.jointFactor', '/ metal.jointFactor ** 1.01'),
  mutant('σ in the circle', 'limit/strength.ts', 'this.perDirect = this.scale', 'this.perDirect = 1.01 * this.scale'),
  mutant('Fsy', 'limit/shear-yield.ts', 'shear: metal.shearYield', 'shear: 1.01 * metal.shearYield'),
  mutant('Fsu', 'limit/shear-ultimate.ts', 'shear: metal.shearUltimate', 'shear: 1.01 * metal.shearUltimate'),
  mutant('0.85 of τ_m', 'buckling/torsion.ts', 'knockdown * 0.85', 'knockdown * 0.8585'),
  mutant('⅝ of τ_m', 'buckling/torsion.ts', 'm ** 0.625', 'm ** 0.63125'),
  mutant('3√2 of τ_l', 'buckling/torsion.ts', '3 * Math.SQRT2', '3.03 * Math.SQRT2'),
  mutant('¾ of τ_l', 'buckling/torsion.ts', 'm ** 0.75', 'm ** 0.7575'),
  mutant('γ of τ_l', 'buckling/torsion.ts', 'knockdown ** (4 / 3)', 'knockdown ** (4.04 / 3)'),
  mutant('κ, not γ, in τ_l', 'buckling/torsion.ts', 'knockdown ** (4 / 3)', 'knockdown'),
  mutant('the smaller regime', 'buckling/torsion.ts', 'q * Math.max(', 'q * Math.min('),
  mutant('parabola’s ¼', 'buckling/parabola.ts', '? p * (1 - z)', '? p * (1 - z / 1.01)'),
  mutant('plateau 1.2', 'limit/wall-buckling.ts', 'PAST_YIELD = 1.2;', 'PAST_YIELD = 1.212;'),
  mutant('knock-down 0.901', 'buckling/knockdown.ts', '_LOSS = 0.901', '_LOSS = 0.91001'),
  mutant('knock-down 0.731', 'buckling/knockdown.ts', '_LOSS = 0.731', '_LOSS = 0.73831'),
  mutant('knock-down 1/16', 'buckling/knockdown.ts', '0.0625 /', '0.063125 /'),
  mutant('√3 of the classical stress', 'buckling/wall.ts', 'Math.sqrt(3 *', 'Math.sqrt(3.06 *'),
  mutant('critical torque', 'buckling/wall.ts', 'return r * at.area', 'return 1.01 * r * at.area'),
  mutant('2 of R_b', 'buckling/wall.ts', '2 * this.factor * bending.', '2.02 * this.factor * bending.'),
  mutant('R_c', 'buckling/wall.ts', 'ratio = thrust /', 'ratio = (1.01 * thrust) /'),
  mutant('½ of the interaction', 'buckling/interaction.ts', '0.5 * (c +', '0.505 * (c +'),
  mutant('4 of the interaction', 'buckling/interaction.ts', '4 * s * s', '4.04 * s * s'),
  mutant('π² of P_E in M*', 'buckling/thrust.ts', '(Math.PI * Math.PI', '(1.01 * Math.PI * Math.PI'),
  mutant('π² of P_E in the column', 'limit/column.ts', '= (Math.PI * Math.PI', '= (1.01 * Math.PI * Math.PI'),
  mutant('2π of Greenhill', 'limit/column.ts', '(2 * Math.PI * youngsModulus)', '(2.02 * Math.PI * youngsModulus)'),
  mutant('π² of ω₁', 'limit/whirl.ts', 'this.stiffness = wave', 'this.stiffness = 1.01 * wave'),
  mutant('Cowper’s coefficient', 'limit/whirl.ts', '(2 * (1 + poissonRatio))', '(2.02 * (1 + poissonRatio))'),
  mutant('P_E in ω₁', 'limit/whirl.ts', 'Math.max(0, -load.axial)', '(1.01 * Math.max(0, -load.axial))'),
  mutant('T_cr in ω₁', 'limit/whirl.ts', '(2 * Math.PI * youngsModulus)', '(2.02 * Math.PI * youngsModulus)'),
  mutant('least diameter', 'limit/outer-diameter.ts', 'R, outerDiameterMin', 'R, 1.01 * outerDiameterMin'),
  mutant('least D/t', 'limit/diameter-to-wall.ts', 'S, tube.diameterToWallMin', 'S, 1.01 * tube.diameterToWallMin'),
  mutant('greatest D/t', 'limit/diameter-to-wall.ts', 'S, tube.diameterToWallMax', 'S, 1.01 * tube.diameterToWallMax'),
  mutant('mass', 'sizing/mass.ts', 'Math.PI * density', '1.01 * Math.PI * density'),
  mutant('strain energy', 'sizing/design.ts', '(2 * torsionalStiffness)', '(2 * torsionalStiffness ** 1.01)'),
];

function mutant(what: string, file: string, find: string, replace: string): Mutant {
  return { what, file, find, replace };
}
