import { optionalNumber, quantityField, quantitySpec, textField, type QuantitySpec } from './field.js';
import type { StockRow, StockTube } from './material.js';
import { PRICE } from './metalKeys.js';
import { hasField, openFields, refuse, type Fields, type Reading } from './reading.js';

/** An outer diameter, wall or bore as a stock list may hold it. */
export const STOCK_LENGTH: QuantitySpec = quantitySpec({
  quantity: 'length',
  what: 'a length',
  atLeast: '0.001 mm',
  atMost: '100 m',
  example: '50 mm',
});

const TUBE_KEYS = ['outerDiameter', 'wall', 'pricePerMetre', 'gauge'];
const MANDREL_KEYS = ['bore', 'gauge'];

/** A stock row as read, with the unit of each value by its key. */
export interface ReadRow {
  readonly row: StockRow;
  readonly units: Readonly<Record<string, string>>;
}

/**
 * Reads one row of a stock list: { "outerDiameter", "wall" } with an optional "pricePerMetre", or { "bore" } for a
 * mandrel; either may carry a "gauge", a name for the reader's eye that is checked and dropped. Null where it is no row.
 */
export function collectRow(entry: unknown, path: string, reading: Reading): StockRow | null {
  const isMandrel = typeof entry === 'object' && entry !== null && Object.hasOwn(entry, 'bore');
  const fields = isMandrel
    ? openFields(entry, path, 'a mandrel', MANDREL_KEYS, reading)
    : openFields(entry, path, 'a stock size', TUBE_KEYS, reading);
  if (fields === null) return null;
  if (hasField(fields, 'gauge')) textField(fields, 'gauge', { longest: 40 });
  return isMandrel ? { bore: quantityField(fields, 'bore', STOCK_LENGTH) } : tubeOf(fields);
}

function tubeOf(fields: Fields): StockTube {
  const outerDiameter = quantityField(fields, 'outerDiameter', STOCK_LENGTH);
  const wall = quantityField(fields, 'wall', STOCK_LENGTH);
  if (wall >= outerDiameter / 2) refuse(fields, 'wall', 'leaves no bore', 'a wall under half of outerDiameter');
  return { outerDiameter, wall, pricePerMetre: optionalNumber(fields, 'pricePerMetre', PRICE) };
}
