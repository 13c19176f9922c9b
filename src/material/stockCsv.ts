import { isSilentLine, plainText, splitCsv, type CsvRecord, type CsvSeparator } from './csv.js';
import { readColumns, type Columns } from './csvColumns.js';
import { readCsvRow, type CsvRow, type StockEntry } from './csvRow.js';
import { keepOnce } from './keepOnce.js';
import type { StockTube } from './material.js';
import { saidProblem, type Problem } from './problem.js';
import { MOST_ROWS } from './stock.js';

/** The tubes of a user's own list, m, and the same rows as a job file writes them; or the mistakes in it. */
export type StockCsvResult =
  | { readonly ok: true; readonly rows: readonly StockTube[]; readonly entries: readonly StockEntry[] }
  | { readonly ok: false; readonly problems: readonly Problem[] };

const MOST_PROBLEMS = 20;

/**
 * Reads a user's own stock list from CSV text: a line of titles, then a size a line. Columns "outer diameter" and
 * "wall" are needed, "price per metre" may be there, others are passed over. The unit stands in the title or in the
 * cell; the cell's own wins. Columns part at commas, semicolons or tabs, whichever the titles show; a decimal comma is
 * read only where commas do not part columns. Sizes listed twice are kept once, at the lowest price.
 * @param path name of the list for messages, such as its file's name
 */
export function readStockCsv(text: string, path: string): StockCsvResult {
  const plain = plainText(text);
  const separator = separatorOf(plain);
  const split = splitCsv(plain, separator);
  if (!split.ok) return refused([at(path, split.line, `${split.wrong}; expected quotes in pairs`, 'quotes in pairs')]);
  const [titles, ...records] = split.records;
  if (titles === undefined) return refused([fileFault(path, 'is empty')]);
  const { columns, problems } = readColumns(titles.cells, `${path}, line ${titles.line}`);
  if (problems.length > 0) return refused(capped(problems, path));
  if (records.length === 0) return refused([fileFault(path, 'holds no size')]);
  if (records.length > MOST_ROWS) return refused([fileFault(path, `holds ${records.length} rows`)]);
  return readRecords(records, columns, titles.cells.length, separator, path);
}

function readRecords(
  records: readonly CsvRecord[],
  columns: Columns,
  width: number,
  separator: CsvSeparator,
  path: string,
): StockCsvResult {
  const problems: Problem[] = [];
  const read: CsvRow[] = [];
  for (const record of records) {
    const extra = record.cells.slice(width).some((cell) => cell !== '');
    if (extra) problems.push(tooWide(record, width, path));
    else read.push(readCsvRow(record, columns, separator !== ',', path, problems));
  }
  if (problems.length > 0) return refused(capped(problems, path));
  const kept = keepOnce(read, ({ row }) => row);
  return { ok: true, rows: kept.map(({ row }) => row), entries: kept.map(({ entry }) => entry) };
}

/** Tabs or semicolons in the line of titles part the columns; else commas do. */
function separatorOf(text: string): CsvSeparator {
  const titles = text.split('\n').find((line) => !isSilentLine(line)) ?? '';
  const open = titles.replace(/"[^"]*"/g, '');
  return open.includes('\t') ? '\t' : open.includes(';') ? ';' : ',';
}

function refused(problems: readonly Problem[]): StockCsvResult {
  return { ok: false, problems };
}

function at(path: string, line: number, clause: string, expected: string): Problem {
  return saidProblem(`${path}, line ${line}`, undefined, clause, expected);
}

function fileFault(path: string, wrong: string): Problem {
  const expected = `a line of titles and 1 to ${MOST_ROWS} sizes`;
  return saidProblem(path, undefined, `${wrong}; expected ${expected}`, expected);
}

function tooWide({ line, cells }: CsvRecord, width: number, path: string): Problem {
  const expected = `${width} as in the titles (a decimal comma needs semicolons or tabs between columns)`;
  return at(path, line, `has ${cells.length} cells; expected ${expected}`, expected);
}

/** The first twenty, and how many more there are. */
function capped(problems: readonly Problem[], path: string): readonly Problem[] {
  const rest = problems.length - MOST_PROBLEMS;
  if (rest <= 0) return problems;
  return [...problems.slice(0, MOST_PROBLEMS), saidProblem(path, undefined, `and ${rest} more mistakes`, 'none')];
}
