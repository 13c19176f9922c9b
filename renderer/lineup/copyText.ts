import { conflictWords } from '../../src/report/noFit.js';
import type { LineUpRow } from './rows.js';

/** A row for the clipboard, its fields set apart by tabs, numbers with the minus that a spreadsheet reads. */
export function rowText({ rank, name, texts, noFit }: LineUpRow): string {
  const place = rank === null ? '' : String(rank);
  const plain = name.replaceAll(/[\t\r\n]+/g, ' ');
  if (texts === null) return [place, plain, noFit === null ? '' : conflictWords(noFit)].join('\t');
  const { outerDiameter, wall, mass, over, twist, governs, cost } = texts;
  const numbers = [outerDiameter, wall, mass, over?.mass ?? '', over?.percent ?? '', twist];
  return [place, plain, ...numbers.map((text) => text.replace('−', '-')), governs, cost].join('\t');
}

/**
 * Puts a text in place of what the copy key, just pressed, is about to copy. It goes by the copy event that follows the
 * key, which needs no permission; where none follows, the wait ends when the key is let go.
 */
export function copyInstead(text: string, on: Document): void {
  const put = (event: ClipboardEvent): void => {
    event.clipboardData?.setData('text/plain', text);
    event.preventDefault();
    end();
  };
  const end = (): void => {
    on.removeEventListener('copy', put, true);
    on.removeEventListener('keyup', end, true);
  };
  on.addEventListener('copy', put, true);
  on.addEventListener('keyup', end, true);
}
