import type { Problem } from '../../src/material/problem.js';

/** Key paths whose mistakes stand beside a field of the brief. */
const BESIDE_A_FIELD = [
  /^loads$/,
  /^loads\.\d+\.(?:name|torque|bending|axial|twistMax|shearStressMax|yieldFactor|ultimateFactor|bucklingFactor)$/,
  /^tube(?:\.(?:length|supportSpacing|outerDiameterMax|outerDiameterMin|boreMin|wallMin|diameterToWallMin|diameterToWallMax))?$/,
  /^speed(?:\.(?:max|margin))?$/,
  /^materials(?:\.\d+(?:\..+)?)?$/,
  /^sizes(?:\.stock)?$/,
  /^hold\.\d+\.(?:name|material|outerDiameter|wall)$/,
  /^buckling(?:\.torsionKnockdown)?$/,
  /^(?:author|currency|note)$/,
];

/** The mistakes that no field of the brief shows: those of the head, and those of a file that was made by hand. */
export function problemsElsewhere(problems: readonly Problem[]): readonly Problem[] {
  return problems.filter(({ path }) => !BESIDE_A_FIELD.some((known) => known.test(path)));
}
