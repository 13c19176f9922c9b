import { keepOnce } from './keepOnce.js';
import type { StockRow } from './material.js';
import { joinPath, type Problem } from './problem.js';
import { newReading, refuseValue, type Reading } from './reading.js';
import { collectRow, type ReadRow } from './stockRow.js';

/** The rows of a stock list as read, with the unit of each value by key path; or every mistake in them. */
export type StockResult =
  | { readonly ok: true; readonly rows: readonly StockRow[]; readonly units: Readonly<Record<string, string>> }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** Most rows that a stock list may have. */
export const MOST_ROWS = 20_000;

const MOST_PROBLEMS = 20;
const EXPECTED = `a list of 1 to ${MOST_ROWS} sizes with outerDiameter and wall`;

/**
 * Reads the rows of a stock list into SI units. Sizes listed twice are kept once, at the lowest price.
 * @param path key path of the list, such as "sizes.stock"
 */
export function readStockRows(value: unknown, path: string): StockResult {
  const reading = newReading();
  const rows = collectStockRows(value, path, reading);
  const { problems, units } = reading;
  return problems.length === 0 ? { ok: true, rows, units } : { ok: false, problems };
}

/** As `readStockRows`, into a reading shared with others. */
export function collectStockRows(value: unknown, path: string, reading: Reading): readonly StockRow[] {
  const list = listOf(value, path, reading);
  const read = readEach(list, path, reading);
  // mandrels are for laminates, which this version cannot size
  if (read.length > 0 && read.every(({ row }) => 'bore' in row))
    refuseValue(reading, path, value, 'holds mandrels only', EXPECTED);
  return keepOnce(read, ({ row }) => row).map(({ row, units }, index) => {
    for (const [key, unit] of Object.entries(units)) reading.units[joinPath(joinPath(path, index), key)] = unit;
    return row;
  });
}

function listOf(value: unknown, path: string, reading: Reading): readonly unknown[] {
  const list: readonly unknown[] = Array.isArray(value) ? value : [];
  if (!Array.isArray(value)) refuseValue(reading, path, value, 'is not a stock list', EXPECTED);
  else if (list.length === 0) refuseValue(reading, path, value, 'holds no size', EXPECTED);
  else if (list.length > MOST_ROWS) refuseValue(reading, path, value, `holds ${list.length} rows`, EXPECTED);
  else return list;
  return [];
}

/** Reads row by row; a list broken throughout is told by its first twenty problems and how many more there are. */
function readEach(list: readonly unknown[], path: string, reading: Reading): readonly ReadRow[] {
  const problems: Problem[] = [];
  const read = list.flatMap((entry, index) => rowWithUnits(entry, joinPath(path, index), problems));
  reading.problems.push(...problems.slice(0, MOST_PROBLEMS));
  const rest = problems.length - MOST_PROBLEMS;
  if (rest > 0) refuseValue(reading, path, list, `holds ${rest} more mistakes`, EXPECTED);
  return read;
}

function rowWithUnits(entry: unknown, path: string, problems: Problem[]): readonly ReadRow[] {
  const reading: Reading = { problems, units: {} };
  const row = collectRow(entry, path, reading);
  const units = Object.entries(reading.units).map(([at, unit]) => [at.slice(path.length + 1), unit] as const);
  return row === null ? [] : [{ row, units: Object.fromEntries(units) }];
}
