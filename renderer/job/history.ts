/** States of a document that can be gone back to and forward to; never changed in place. */
export interface History<T> {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
  /** what the last edit belonged to: further edits of the same make one step with it */
  readonly group: string | null;
}

/** Steps kept; the oldest are forgotten. */
export const MOST_STEPS = 500;

/** A history that begins here. */
export function begun<T>(present: T): History<T> {
  return { past: [], present, future: [], group: null };
}

/**
 * The history after an edit. Edits of one group that follow one another, such as the letters typed into one field, are
 * one step; a group that ends where it began leaves no step.
 * @param same whether two states say the same
 */
export function edited<T>(
  history: History<T>,
  next: T,
  group: string | null,
  same: (one: T, other: T) => boolean,
): History<T> {
  const { past, present } = history;
  if (same(present, next)) return history;
  const before = past[past.length - 1];
  const joins = group !== null && group === history.group && before !== undefined;
  if (!joins) return { past: [...past, present].slice(-MOST_STEPS), present: next, future: [], group };
  if (same(before, next)) return { past: past.slice(0, -1), present: before, future: [], group: null };
  return { past, present: next, future: [], group };
}

/** One step back; the same history where there is none. */
export function undone<T>(history: History<T>): History<T> {
  const { past, present, future } = history;
  const before = past[past.length - 1];
  if (before === undefined) return history;
  return { past: past.slice(0, -1), present: before, future: [present, ...future], group: null };
}

/** One step forward again; the same history where there is none. */
export function redone<T>(history: History<T>): History<T> {
  const { past, present, future } = history;
  const [after, ...rest] = future;
  if (after === undefined) return history;
  return { past: [...past, present], present: after, future: rest, group: null };
}

/** The history with its last step closed: what is typed next is a step of its own. */
export function closed<T>(history: History<T>): History<T> {
  return history.group === null ? history : { ...history, group: null };
}
