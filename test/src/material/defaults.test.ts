import { expect, it } from 'vitest';
import { MATERIAL_DEFAULTS } from '../../../src/material/defaults.js';

it('holds the defaults of the record format, for good', () => {
  const { jointFactor, shearYieldOverTensileYield, compressiveOverTensileYield } = MATERIAL_DEFAULTS;
  expect(jointFactor).toBe(1);
  // von Mises: σ² + 3τ² = Fty², at σ = 0
  expect(3 * shearYieldOverTensileYield ** 2).toBeCloseTo(1, 15);
  expect(compressiveOverTensileYield).toBe(1);
  expect(Object.isFrozen(MATERIAL_DEFAULTS)).toBe(true);
});
