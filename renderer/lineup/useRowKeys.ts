import { nextTick, ref, type Ref } from 'vue';
import { usePick } from '../stores/pick.js';
import { copyInstead, rowText } from './copyText.js';
import type { LineUpRow } from './rows.js';

/** Where a key leads from a place in a list; null where it leads nowhere. */
function placeAfter(key: string, at: number, count: number): number | null {
  if (key === 'ArrowDown') return Math.min(at + 1, count - 1);
  if (key === 'ArrowUp') return Math.max(at - 1, 0);
  if (key === 'Home') return 0;
  return key === 'End' ? count - 1 : null;
}

export interface RowKeys {
  /** whether a row is the one that Tab comes to */
  readonly isCurrent: (row: LineUpRow) => boolean;
  /** keeps a row's material in focus */
  readonly keep: (row: LineUpRow) => void;
  /** makes a row the pick, where it has a design */
  readonly choose: (row: LineUpRow) => void;
  readonly onKey: (event: KeyboardEvent, row: LineUpRow) => void;
  /** moves the keyboard to the current row */
  readonly enter: () => void;
}

/**
 * The keyboard in the line-up: one row of it is reached by Tab, Up and Down, Home and End walk from it, Enter picks,
 * Ctrl+C copies.
 * @param elementOf the row's element on the screen
 */
export function useRowKeys(
  rows: Readonly<Ref<readonly LineUpRow[]>>,
  elementOf: (key: string) => HTMLElement | null,
): RowKeys {
  const pick = usePick();
  const last = ref<string | null>(null);

  function current(): LineUpRow | undefined {
    const there = rows.value.find(({ key }) => key === last.value);
    return there ?? rows.value.find((row) => pick.isPick(row.pick)) ?? rows.value[0];
  }

  function keep(row: LineUpRow): void {
    last.value = row.key;
    pick.keep(row.material.id);
  }

  function choose(row: LineUpRow): void {
    if (row.design !== null && pick.available) pick.choose(row.pick);
  }

  function goTo(row: LineUpRow | undefined): void {
    if (row === undefined) return;
    keep(row);
    void nextTick(() => elementOf(row.key)?.focus());
  }

  function copies({ key, ctrlKey, metaKey, altKey }: KeyboardEvent): boolean {
    const selected = window.getSelection()?.toString() ?? '';
    return (ctrlKey || metaKey) && !altKey && key.toLowerCase() === 'c' && selected === '';
  }

  function onKey(event: KeyboardEvent, row: LineUpRow): void {
    if (event.target !== event.currentTarget) return;
    if (copies(event)) copyInstead(rowText(row), document);
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = placeAfter(event.key, rows.value.indexOf(row), rows.value.length);
    if (next !== null) goTo(rows.value[next]);
    else if (event.key === 'Enter') choose(row);
    else return;
    event.preventDefault();
  }

  return {
    isCurrent: (row) => current()?.key === row.key,
    keep,
    choose,
    onKey,
    enter: () => {
      goTo(current());
    },
  };
}
