import type { SizeEnd, SizeUpdate } from '../contract.js';

/** A run from its asking to its end, however often its worker is started again. */
export interface Run {
  readonly number: number;
  readonly job: unknown;
  readonly done: Promise<SizeEnd>;
  /** how often its worker died under it */
  deaths: number;
  /** passes an update on, unless the run has ended */
  tell(update: SizeUpdate): void;
  /** ends the run; only the first end counts */
  end(end: SizeEnd): void;
  hasEnded(): boolean;
}

/** A run of a job that nobody works on yet. */
export function newRun(number: number, job: unknown, onUpdate: (update: SizeUpdate) => void): Run {
  let ended = false;
  let resolve: (end: SizeEnd) => void = () => undefined;
  const done = new Promise<SizeEnd>((settle) => {
    resolve = settle;
  });
  return {
    number,
    job,
    done,
    deaths: 0,
    tell: (update) => {
      if (!ended) onUpdate(update);
    },
    end: (end) => {
      ended = true;
      resolve(end);
    },
    hasEnded: () => ended,
  };
}
