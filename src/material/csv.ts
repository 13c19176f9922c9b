/** One record of a CSV text: the line on which it begins, counted from 1, and its cells without quotes or outer blanks. */
export interface CsvRecord {
  readonly line: number;
  readonly cells: readonly string[];
}

/** The records of a CSV text, or the line of the quote that is never closed or is followed by more text. */
export type CsvResult =
  | { readonly ok: true; readonly records: readonly CsvRecord[] }
  | { readonly ok: false; readonly line: number; readonly wrong: string };

export type CsvSeparator = ',' | ';' | '\t';

interface Cell {
  readonly text: string;
  /** index of the separator or line end after the cell */
  readonly end: number;
  readonly wrong: string | null;
}

/** A quoted cell (RFC 4180: a quote inside is written twice), from the index of its opening quote. */
function quotedCell(text: string, start: number, separator: CsvSeparator): Cell {
  let close = text.indexOf('"', start + 1);
  while (close >= 0 && text[close + 1] === '"') close = text.indexOf('"', close + 2);
  if (close < 0) return { text: '', end: text.length, wrong: 'opens a quote that is never closed' };
  const after = bareCell(text, close + 1, separator);
  const wrong = after.text === '' ? null : 'goes on after a closing quote';
  return {
    text: text
      .slice(start + 1, close)
      .replaceAll('""', '"')
      .trim(),
    end: after.end,
    wrong,
  };
}

function bareCell(text: string, start: number, separator: CsvSeparator): Cell {
  let end = start;
  while (end < text.length && text[end] !== separator && text[end] !== '\n') end++;
  return { text: text.slice(start, end).trim(), end, wrong: null };
}

function nextCell(text: string, start: number, separator: CsvSeparator): Cell {
  let from = start;
  while (text[from] === ' ') from++;
  return text[from] === '"' ? quotedCell(text, from, separator) : bareCell(text, start, separator);
}

function countLines(text: string, from: number, to: number): number {
  let count = 0;
  for (let at = text.indexOf('\n', from); at >= 0 && at < to; at = text.indexOf('\n', at + 1)) count++;
  return count;
}

/** The cells from `start` to the end of the record. */
function nextRecord(
  text: string,
  start: number,
  separator: CsvSeparator,
): { cells: string[]; end: number; wrong: string | null } {
  const cells: string[] = [];
  let cell: Cell;
  let from = start;
  do {
    cell = nextCell(text, from, separator);
    cells.push(cell.text);
    from = cell.end + 1;
  } while (cell.wrong === null && text[cell.end] === separator);
  return { cells, end: cell.end, wrong: cell.wrong };
}

function lineEnd(text: string, start: number): number {
  const end = text.indexOf('\n', start);
  return end < 0 ? text.length : end;
}

/** Text with LF line ends and no byte order mark, as the functions below want it. */
export function plainText(text: string): string {
  return text.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n');
}

/** Whether a line says nothing: blank, empty cells alone, or a comment that begins with "#". */
export function isSilentLine(line: string): boolean {
  return /^[\s,;]*$/.test(line) || line.trimStart().startsWith('#');
}

/**
 * Splits a CSV text after RFC 4180: quoted cells may hold separators, line breaks and doubled quotes. Blank lines and
 * lines that begin with "#" are left out. Written here since the packages for it bring Node's types into the engine.
 * @param text as `plainText` gives it
 */
export function splitCsv(text: string, separator: CsvSeparator): CsvResult {
  const records: CsvRecord[] = [];
  let line = 1;
  let start = 0;
  while (start < text.length) {
    const silentEnd = lineEnd(text, start);
    const silent = isSilentLine(text.slice(start, silentEnd));
    const { cells, end, wrong } = silent
      ? { cells: [], end: silentEnd, wrong: null }
      : nextRecord(text, start, separator);
    if (wrong !== null) return { ok: false, line, wrong };
    if (!silent) records.push({ line, cells });
    line += countLines(text, start, end + 1);
    start = end + 1;
  }
  return { ok: true, records };
}
