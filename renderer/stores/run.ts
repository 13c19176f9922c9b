import { defineStore } from 'pinia';
import { computed, ref, shallowRef, watch } from 'vue';
import type { Desk, Followed, SizeEnd, SizeUpdate } from '../../main/contract.js';
import type { Candidate, Report } from '../../src/report/report.js';
import type { OwnPoint } from '../../src/sizing/dominance.js';
import { shownFront, type ShownFront } from '../job/shownFront.js';
import { shownResults, type Results } from '../job/shownResults.js';
import { useJob, type Sound } from './job.js';

/** How long an edit waits for the next one, ms. */
export const EDIT_WAIT = 150;
/** How long old results stay at full strength while new ones are awaited, ms. */
export const STALE_AFTER = 300;

/** idle: nothing asked yet; waiting: an edit waits for the next one; the rest as they say. */
export type RunStatus = 'idle' | 'waiting' | 'running' | 'done' | 'stopped' | 'failed';

export interface RunProgress {
  readonly done: number;
  readonly of: number;
  /** name of the material being sized */
  readonly material: string;
}

/**
 * Sizes the job anew after each sound edit, and keeps what came of it. A later run takes the place of the one in
 * flight; what an overtaken run still says is not heard.
 */
export const useRun = defineStore('run', () => {
  const job = useJob();
  const status = ref<RunStatus>('idle');
  const progress = shallowRef<RunProgress | null>(null);
  const elapsed = ref<number | null>(null);
  const sentence = ref<string | null>(null);
  const slow = ref(false);
  const report = shallowRef<Report | null>(null);
  const sized = shallowRef<Sound | null>(null);
  const asked = shallowRef<Sound | null>(null);
  const partial = shallowRef<readonly Candidate[]>([]);
  const fronts = shallowRef<ReadonlyMap<string, readonly OwnPoint[]>>(new Map());

  let desk: Desk | null = null;
  let followed: Followed<SizeEnd> | null = null;
  let latest = 0;
  let begun = 0;
  let waiting: ReturnType<typeof setTimeout> | undefined;
  let slowing: ReturnType<typeof setTimeout> | undefined;

  const outdated = computed(() => sized.value !== job.lastSound);
  const stale = computed(
    () => outdated.value && (slow.value || status.value === 'stopped' || status.value === 'failed'),
  );
  /** whether what has come of the run in flight is shown, and not the last report alone */
  const comingIn = computed(() => stale.value || report.value === null);
  const inFlight = computed(() => (comingIn.value ? (asked.value?.brief.job ?? null) : null));
  const shown = computed<Results | null>(() =>
    shownResults(report.value, comingIn.value ? partial.value : [], inFlight.value),
  );
  const front = computed<ShownFront | null>(() => shownFront(report.value, fronts.value, inFlight.value));

  function forget(): void {
    partial.value = [];
    fronts.value = new Map();
  }

  function hear(update: SizeUpdate): void {
    if (update.kind === 'progress') progress.value = { done: update.done, of: update.of, material: update.material };
    else if (update.kind === 'candidate') partial.value = [...partial.value, update.candidate];
    else if (update.kind === 'front') fronts.value = new Map(fronts.value).set(update.material, update.points);
    else {
      sentence.value = update.reason;
      forget();
    }
  }

  function settle(next: RunStatus, why: string | null): void {
    clearTimeout(slowing);
    followed = null;
    slow.value = false;
    progress.value = null;
    status.value = next;
    if (why !== null) sentence.value = why;
  }

  function take(end: SizeEnd): void {
    if (end.kind === 'report') {
      elapsed.value = (performance.now() - begun) / 1000;
      report.value = end.report;
      sized.value = asked.value;
      forget();
      settle('done', null);
    } else if (end.kind === 'refused') settle('failed', end.problems[0]?.message ?? 'The job was refused.');
    else if (end.kind === 'failed') settle('failed', end.sentence);
    else settle('stopped', null);
  }

  /** Follows a run; of one that was overtaken nothing more is heard, not even its end. */
  async function follow(from: Desk, sound: Sound): Promise<void> {
    const number = (latest += 1);
    const run = from.follow('size', { job: sound.document }, (update) => {
      if (number === latest) hear(update);
    });
    followed = run;
    const end = await run.done.catch((error: unknown): SizeEnd => ({ kind: 'failed', sentence: said(error) }));
    if (number === latest) take(end);
  }

  /** Sizes the last sound document at once. */
  function start(): void {
    clearTimeout(waiting);
    if (desk === null || job.lastSound === null) return;
    asked.value = job.lastSound;
    status.value = 'running';
    progress.value = null;
    forget();
    sentence.value = null;
    begun = performance.now();
    clearTimeout(slowing);
    slowing = setTimeout(() => (slow.value = true), STALE_AFTER);
    void follow(desk, job.lastSound);
  }

  watch(
    () => job.lastSound,
    () => {
      clearTimeout(waiting);
      if (status.value !== 'running') status.value = 'waiting';
      waiting = setTimeout(start, EDIT_WAIT);
    },
    { flush: 'sync' },
  );

  return {
    status,
    /** how far the run in flight is; null where none has said */
    progress,
    /** how long the last finished run took, s */
    elapsed,
    /** why the last run failed, or that the work had to be begun anew; null where all went well */
    sentence,
    /** the run in flight has taken longer than STALE_AFTER */
    slow,
    /** the last whole report */
    report,
    /** the results shown are not those of the job as it stands, and will not be in a moment: show them weak */
    stale,
    /** what the stations show: the report, or what has come of the run so far with old results in between */
    shown,
    /** every material's front, as far as it is known; null before there is a job */
    front,
    /** Takes the desk that sizes, and sizes what there is. */
    connect(from: Desk): void {
      desk = from;
      start();
    },
    start,
    /** Ends the run in flight; what it has found so far stays. */
    stop(): void {
      followed?.stop();
    },
  };
});

function said(error: unknown): string {
  return error instanceof Error ? error.message : 'The desk gave no answer.';
}
