/** A metal as the engine sees it: SI units throughout, every default written out. */
export interface Metal {
  readonly id: string;
  readonly kind: 'metal';
  readonly name: string;
  readonly family: string;
  /** kg/m³ */
  readonly density: number;
  /** E, Pa */
  readonly youngsModulus: number;
  /** G, Pa */
  readonly shearModulus: number;
  /** ν, dimensionless */
  readonly poissonRatio: number;
  /** Fty, Pa */
  readonly tensileYield: number;
  /** Ftu, Pa */
  readonly tensileUltimate: number;
  /** Fsy, Pa; Fty/√3 (von Mises) unless the record says otherwise */
  readonly shearYield: number;
  /** Fsu, Pa */
  readonly shearUltimate: number;
  /** Fcy, Pa; Fty unless the record says otherwise */
  readonly compressiveYield: number;
  /** minimum gauge of the process, m */
  readonly wallMin: number;
  /** thickest wall that the strengths are for, m; null where the record does not say */
  readonly wallMax: number | null;
  /** δ: the wall may be this fraction under nominal */
  readonly wallTolerance: number;
  /** j: strength left where the tube is welded or holed, 0 < j ≤ 1 */
  readonly jointFactor: number;
  /** in the job's currency */
  readonly pricePerKilogram: number | null;
  /** where each value comes from */
  readonly source: string;
  /** the material's own sizes, in place of the job's */
  readonly sizes: Sizes | null;
}

export type Material = Metal;

/** A tube of a stock list, m; the price in the job's currency. */
export interface StockTube {
  readonly outerDiameter: number;
  readonly wall: number;
  readonly pricePerMetre: number | null;
}

/** A mandrel of a stock list: the bore it gives, m (laminates only). */
export interface StockBore {
  readonly bore: number;
}

export type StockRow = StockTube | StockBore;

/** Any size at all, or the rows of a stock list. */
export type Sizes = 'any' | { readonly stock: readonly StockRow[] };
