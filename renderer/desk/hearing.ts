import type { StreamLine } from '../../main/contract.js';
import { DeskError, unanswered } from './deskError.js';

/** Listens to the lines of a stream until it ends. */
export interface Hearing<Update, End> {
  readonly done: Promise<End>;
  readonly line: (line: StreamLine<Update, End>) => void;
  /** ends it from this side; nothing is heard after it */
  readonly end: (end: End) => void;
  /** the stream broke off */
  readonly fail: (error?: DeskError) => void;
}

/** A hearing that hands updates on. */
export function hearing<Update, End>(onUpdate: (update: Update) => void): Hearing<Update, End> {
  let resolve: (end: End) => void = () => undefined;
  let reject: (error: DeskError) => void = () => undefined;
  const done = new Promise<End>((whole, broken) => {
    resolve = whole;
    reject = broken;
  });
  let open = true;
  const once =
    <A>(settle: (value: A) => void) =>
    (value: A): void => {
      if (open) settle(value);
      open = false;
    };
  const end = once(resolve);
  const refuse = once<DeskError>(reject);
  return {
    done,
    line: (line) => {
      if ('end' in line) end(line.end);
      else if ('refusal' in line) refuse(new DeskError(line.refusal.code, line.refusal.sentence));
      else if ('update' in line && open) onUpdate(line.update);
    },
    end,
    fail: (error = unanswered()) => {
      refuse(error);
    },
  };
}
