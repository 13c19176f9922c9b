import { readStockCsv, type StockCsvResult } from '../../src/material/stockCsv.js';

type Entries = Extract<StockCsvResult, { ok: true }>['entries'];

/** A user's own stock list, as a job file writes it, or what is wrong with it in sentences. */
export type OwnList =
  { readonly ok: true; readonly entries: Entries } | { readonly ok: false; readonly sentences: readonly string[] };

/** Bytes of a list that are read at most; a job file holds no more than 2 MB. */
const LARGEST = 2_000_000;
/** Mistakes that are told one by one. */
const MOST_SENTENCES = 4;

function refused(sentences: readonly string[]): OwnList {
  const rest = sentences.length - MOST_SENTENCES;
  const more = rest > 0 ? [`And ${rest} more.`] : [];
  return { ok: false, sentences: [...sentences.slice(0, MOST_SENTENCES), ...more] };
}

/** Reads a file as a stock list in CSV. */
export async function readOwnList(file: Pick<File, 'name' | 'size' | 'text'>): Promise<OwnList> {
  if (file.size > LARGEST) return refused([`${file.name} is larger than 2 MB; expected a list of sizes.`]);
  const read = readStockCsv(await file.text(), file.name);
  if (read.ok) return { ok: true, entries: read.entries };
  return refused(read.problems.map(({ message }) => `${message}.`));
}
