/** What a material record means where it says nothing; the reader, the form and the handbook take it from here. */
export const MATERIAL_DEFAULTS = Object.freeze({
  /** j: nothing is lost at a joint */
  jointFactor: 1,
  /** Fsy over Fty: von Mises */
  shearYieldOverTensileYield: 1 / Math.sqrt(3),
  /** Fcy over Fty */
  compressiveOverTensileYield: 1,
});
