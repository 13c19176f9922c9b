/**
 * Measures of the tube that many limits are plain multiples of, by number. All are positive; D and t are nominal, I and
 * J the checked section's. Their values are `Section.multiple`'s, their enclosures `Box.multiple`'s.
 */
export const MEASURE = {
  /** ro/J, m⁻³: shear stress at the surface for a unit of torque */
  shearPerTorque: 0,
  /** 1/I, m⁻⁴ */
  perSecondMoment: 1,
  /** D, m */
  outerDiameter: 2,
  /** 1/D, m⁻¹ */
  perOuterDiameter: 3,
  /** 1/t, m⁻¹ */
  perWall: 4,
  /** D/t */
  slimness: 5,
  /** t/D */
  perSlimness: 6,
  /** 1/(D − 2t), m⁻¹ */
  perBore: 7,
} as const;

export type Measure = (typeof MEASURE)[keyof typeof MEASURE];

/** How many there are. */
export const MEASURES = 8;
