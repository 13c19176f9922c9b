import type { Problem } from '../src/material/problem.js';
import type { Candidate, DesignCheck, Report } from '../src/report/report.js';
import type { OwnPoint } from '../src/sizing/dominance.js';

/** What the window needs to begin with. Documents are as their files hold them; the window reads them with the engine. */
export interface Beginning {
  /** version of the app */
  readonly version: string;
  /** the shipped metal records, by file name */
  readonly records: readonly unknown[];
  /** the shipped stock lists */
  readonly stockLists: readonly unknown[];
  /** the demo jobs, the one to show first leading */
  readonly demos: readonly unknown[];
  /** what the window last asked to be remembered, or null */
  readonly remembered: unknown;
}

/** Progress of a run. */
export type SizeUpdate =
  /** so many of so many materials are wholly done, their fronts too, and this one is at work */
  | { readonly kind: 'progress'; readonly done: number; readonly of: number; readonly material: string }
  /** a material is done; its candidate is final, its front is still to come */
  | { readonly kind: 'candidate'; readonly candidate: Candidate }
  /** a material's front is found; its points are not yet held against those of the others */
  | { readonly kind: 'front'; readonly material: string; readonly points: readonly OwnPoint[] }
  /** the worker died and was started again; the run begins anew */
  | { readonly kind: 'restarted'; readonly reason: string };

/** How a run ended. */
export type SizeEnd =
  | { readonly kind: 'report'; readonly report: Report }
  /** stopped by the user */
  | { readonly kind: 'stopped' }
  /** a later run of the same window took its place */
  | { readonly kind: 'superseded' }
  /** the job is wrong */
  | { readonly kind: 'refused'; readonly problems: readonly Problem[] }
  /** the worker died more often than it was worth starting again, or the host failed */
  | { readonly kind: 'failed'; readonly sentence: string };

/** A tube of any size to be checked against a job document. */
export interface CheckArguments {
  readonly job: unknown;
  /** id of a material of the job */
  readonly material: string;
  /** m */
  readonly outerDiameter: number;
  /** m; less than half of the outer diameter */
  readonly wall: number;
}

/** What a check gives: how the tube fares, or why the job cannot be read. */
export type CheckAnswer =
  | { readonly kind: 'checked'; readonly check: DesignCheck }
  | { readonly kind: 'refused'; readonly problems: readonly Problem[] };

/** Calls that answer once. */
export interface Asks {
  begin: (args: null) => Beginning;
  /** keeps the window's state through a restart: any JSON value of at most 4 MB */
  remember: (state: unknown) => null;
  /** checks one tube of one material of a job, as a design in hand is checked; a run in flight is not disturbed */
  check: (args: CheckArguments) => CheckAnswer;
}

/** Calls that stream updates until they end, and can be stopped. */
export interface Follows {
  /** sizes a job document; a new run supersedes the one in flight */
  size: { readonly args: { readonly job: unknown }; readonly update: SizeUpdate; readonly end: SizeEnd };
}

export type AskName = keyof Asks;
export type FollowName = keyof Follows;

/** A run that is being followed. */
export interface Followed<End> {
  readonly done: Promise<End>;
  readonly stop: () => void;
}

/** The one contract between the window and the desk, whoever hosts it. */
export interface Desk {
  ask<N extends AskName>(name: N, args: Parameters<Asks[N]>[0]): Promise<ReturnType<Asks[N]>>;
  follow<N extends FollowName>(
    name: N,
    args: Follows[N]['args'],
    onUpdate: (update: Follows[N]['update']) => void,
  ): Followed<Follows[N]['end']>;
}

/** Names of all calls, for a host to check what it is asked. */
export const ASKS = ['begin', 'remember', 'check'] as const satisfies readonly AskName[];
export const FOLLOWS = ['size'] as const satisfies readonly FollowName[];

/** A host's refusal, as it crosses to the window: a stable code and a sentence. */
export interface Refusal {
  readonly code: 'unknown-call' | 'bad-arguments' | 'too-large' | 'not-allowed' | 'failed';
  readonly sentence: string;
}

/** The outcome of an ask as it crosses between host and window: data either way, since an error would lose its code. */
export type Reply<Answer> = { readonly answer: Answer } | { readonly refusal: Refusal };

/** One line of a stream as it crosses between host and window; `end` or `refusal` is the last, `alive` means nothing. */
export type StreamLine<Update, End> =
  { readonly update: Update } | { readonly end: End } | { readonly refusal: Refusal } | { readonly alive: true };

/**
 * What Electron's preload puts into the window as `window.wringwall`: a function for each call and nothing generic. An
 * ask gives its reply; a follow gives the lines of its stream to `onLine` and returns the function that stops it, after
 * which the stream still ends with its own last line.
 */
export type Exposed = {
  readonly [N in AskName]: (args: Parameters<Asks[N]>[0]) => Promise<Reply<ReturnType<Asks[N]>>>;
} & {
  readonly [N in FollowName]: (
    args: Follows[N]['args'],
    onLine: (line: StreamLine<Follows[N]['update'], Follows[N]['end']>) => void,
  ) => () => void;
};
