import { parseQuantity } from '../quantity/parse.js';
import type { CsvRecord } from './csv.js';
import type { Column, Columns } from './csvColumns.js';
import type { StockTube } from './material.js';
import { PRICE } from './metalKeys.js';
import { saidProblem, wrongValue, type Problem } from './problem.js';
import { isInside, rangeText } from './range.js';
import { STOCK_LENGTH } from './stockRow.js';

/** A row in the job file's own words, to stand in `sizes.stock`. */
export interface StockEntry {
  readonly outerDiameter: string;
  readonly wall: string;
  readonly pricePerMetre?: number;
}

/** A row of a CSV stock list: the tube, m, and the same in a job file's words. */
export interface CsvRow {
  readonly row: StockTube;
  readonly entry: StockEntry;
}

const LONGEST_NUMBER = 100;
const BARE_NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?$/i;

/** One cell to be read: its text with a decimal point, its column, where it stands, and where mistakes go. */
interface CellPlace {
  readonly text: string;
  readonly column: Column | undefined;
  readonly path: string;
  readonly problems: Problem[];
}

interface Length {
  readonly value: number;
  readonly text: string;
}

/** Reads one row; what fails reads as NaN, with a problem noted, and the caller drops the list. */
export function readCsvRow(
  record: CsvRecord,
  columns: Columns,
  decimalComma: boolean,
  path: string,
  problems: Problem[],
): CsvRow {
  const place = (column: Column | undefined): CellPlace => cellPlace(record, column, decimalComma, path, problems);
  const outerDiameter = readLength(place(columns.outerDiameter));
  const wall = readLength(place(columns.wall));
  const pricePerMetre = readPrice(place(columns.pricePerMetre));
  if (wall.value >= outerDiameter.value / 2)
    note(place(columns.wall), 'leaves no bore', 'a wall under half the diameter');
  const row = { outerDiameter: outerDiameter.value, wall: wall.value, pricePerMetre };
  const entry = { outerDiameter: outerDiameter.text, wall: wall.text };
  return { row, entry: pricePerMetre === null ? entry : { ...entry, pricePerMetre } };
}

function cellPlace(
  { line, cells }: CsvRecord,
  column: Column | undefined,
  decimalComma: boolean,
  path: string,
  problems: Problem[],
): CellPlace {
  const cell = column === undefined ? '' : (cells[column.index] ?? '');
  const text = decimalComma ? cell.replace(/^([+-]?\d+),(\d+)(?![\d.,])/, '$1.$2') : cell;
  return { text, column, path: `${path}, line ${line}, column "${column?.title ?? ''}"`, problems };
}

function note(place: CellPlace, wrong: string, expected: string): void {
  place.problems.push(wrongValue(place.path, place.text, wrong, expected));
}

function isBareNumber(text: string): boolean {
  return text.length <= LONGEST_NUMBER && BARE_NUMBER.test(text);
}

function readLength(place: CellPlace): Length {
  const isBare = isBareNumber(place.text);
  const unit = place.column?.unit ?? null;
  const text = isBare && unit !== null ? `${place.text} ${unit}` : place.text;
  const parsed = parseQuantity(text, 'length');
  if (isBare && unit === null) note(place, 'has no unit', 'a length such as "1.5 mm", or the unit in the title');
  else if (!parsed.ok) place.problems.push(saidProblem(place.path, place.text, parsed.message, STOCK_LENGTH.expected));
  else if (!isInside(parsed.value, STOCK_LENGTH.range)) note(place, 'is out of range', STOCK_LENGTH.expected);
  else return { value: parsed.value, text };
  return { value: NaN, text };
}

/** A price, or null where the column or the cell is empty. */
function readPrice(place: CellPlace): number | null {
  if (place.text === '') return null;
  const price = isBareNumber(place.text) ? Number(place.text) : NaN;
  if (!isInside(price, PRICE)) note(place, 'is not a price', `a number ${rangeText(PRICE)}`);
  return price;
}
