import { expect, it } from 'vitest';
import { keepOnce } from '../../../src/material/keepOnce.js';
import type { StockRow } from '../../../src/material/material.js';

const tube = (outerDiameter: number, wall: number, pricePerMetre: number | null = null): StockRow => ({
  outerDiameter,
  wall,
  pricePerMetre,
});

function kept(...rows: readonly StockRow[]): readonly StockRow[] {
  return keepOnce(rows, (row) => row);
}

it('keeps a size once, where it first stood, at the lowest price', () => {
  const rows = kept(tube(0.05, 0.001, 9), tube(0.04, 0.001), tube(0.05, 0.001, 7), tube(0.05, 0.001, 8));
  expect(rows).toEqual([tube(0.05, 0.001, 7), tube(0.04, 0.001)]);
});

it('prefers any price to none, and none to nothing', () => {
  expect(kept(tube(0.05, 0.001), tube(0.05, 0.001, 7))).toEqual([tube(0.05, 0.001, 7)]);
  expect(kept(tube(0.05, 0.001, 7), tube(0.05, 0.001))).toEqual([tube(0.05, 0.001, 7)]);
});

it('takes sizes that agree to a nanometre for one, and no others', () => {
  expect(kept(tube(0.0254, 0.001), tube(25.4 / 1000 + 1e-12, 0.001))).toHaveLength(1);
  expect(kept(tube(0.0254, 0.001), tube(0.0254, 0.001002), tube(0.025402, 0.001))).toHaveLength(3);
});

it('does not mistake a mandrel for a tube', () => {
  expect(kept({ bore: 0.05 }, tube(0.05, 0.001), { bore: 0.05 })).toEqual([{ bore: 0.05 }, tube(0.05, 0.001)]);
});
