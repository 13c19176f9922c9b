import { defineStore } from 'pinia';
import { computed, shallowRef } from 'vue';
import type { Brief } from '../../src/job/job.js';
import { buildLibrary, buildStockLists, rowsById } from '../../src/material/library.js';
import type { Metal } from '../../src/material/material.js';
import type { Problem } from '../../src/material/problem.js';
import type { StockList } from '../../src/material/stockList.js';
import { begun, closed, edited, redone, undone } from '../job/history.js';
import { readDocument } from '../job/readDocument.js';
import { documentOf, sameValue, valueAt, withValue, type Edit, type JobDocument } from '../job/keyPath.js';

/** What ships with the app, as the job is read against it. */
interface Shipped {
  /** the material records as their files hold them, by id */
  readonly records: ReadonlyMap<string, JobDocument>;
  readonly library: ReadonlyMap<string, Metal>;
  readonly stockLists: ReadonlyMap<string, StockList>;
}

/** A document that can be sized, and what the engine reads in it. */
export interface Sound {
  readonly document: JobDocument;
  readonly brief: Brief;
}

const NOTHING: Shipped = { records: new Map(), library: new Map(), stockLists: new Map() };

/**
 * The job being edited: the document of a job file with every value as entered. The engine itself says whether it is
 * sound; while it is not, the last sound brief is kept for the results that are shown.
 */
export const useJob = defineStore('job', () => {
  const shipped = shallowRef(NOTHING);
  const history = shallowRef(begun<JobDocument>({}));
  const lastSound = shallowRef<Sound | null>(null);

  const document = computed(() => history.value.present);
  const stockRows = computed(() => rowsById(shipped.value.stockLists));
  const read = (candidate: JobDocument) => readDocument(candidate, shipped.value.library, stockRows.value);
  const result = computed(() => read(document.value));
  const problems = computed<readonly Problem[]>(() => (result.value.ok ? [] : result.value.problems));
  const byPath = computed(() => new Map(problems.value.toReversed().map((problem) => [problem.path, problem])));

  /** Takes the new state, and keeps its brief where it is sound. */
  function take(next: typeof history.value): void {
    history.value = next;
    if (result.value.ok && lastSound.value?.document !== next.present)
      lastSound.value = { document: next.present, brief: result.value.brief };
  }

  return {
    /** the shipped material records by id, as their files hold them */
    records: computed(() => shipped.value.records),
    /** the shipped materials by id, as the engine reads them */
    library: computed(() => shipped.value.library),
    /** the shipped stock lists by id */
    stockLists: computed(() => shipped.value.stockLists),
    /** the document as entered; a new object after each edit */
    document,
    /** every mistake in the document */
    problems,
    /** whether the document as it stands can be sized */
    sound: computed(() => result.value.ok),
    /** the last document that could be sized, with its brief; null before there was one; a new object after each sound edit */
    lastSound: computed(() => lastSound.value),
    canUndo: computed(() => history.value.past.length > 0),
    canRedo: computed(() => history.value.future.length > 0),

    /**
     * Takes what ships with the app, and the document to begin with; nothing can be undone after it.
     * @param sound the document whose results stand while the first is in error
     */
    begin(records: readonly unknown[], lists: readonly unknown[], first: JobDocument, sound = first): void {
      const stockLists = buildStockLists(lists);
      const library = buildLibrary(records, rowsById(stockLists));
      const raw = Array.from(library.keys(), (id, index) => [id, documentOf(records[index])] as const);
      shipped.value = { records: new Map(raw), library, stockLists };
      take(begun(sound));
      take(begun(first));
    },
    /** What stands at a key path, as entered; undefined where nothing does. */
    at: (path: string): unknown => valueAt(document.value, path),
    /** The first mistake at exactly this key path, or null. */
    problemAt: (path: string): Problem | null => byPath.value.get(path) ?? null,
    /** Whether the document would hold no mistake at the path after these edits. */
    wouldRead(path: string, edits: readonly Edit[]): boolean {
      const tried = read(edits.reduce(withValue, document.value));
      return tried.ok || tried.problems.every((problem) => problem.path !== path);
    },
    /**
     * One undoable edit; undefined takes the key, or the entry of a list, out.
     * @param group edits of one group that follow one another are undone as one
     */
    edit(path: string, value: unknown, group: string | null = null): void {
      take(edited(history.value, withValue(document.value, { path, value }), group, sameValue));
    },
    /** Several edits that are undone as one. */
    editAll(edits: readonly Edit[], group: string | null = null): void {
      take(edited(history.value, edits.reduce(withValue, document.value), group, sameValue));
    },
    /** Puts another document in place of this one, as one undoable edit. */
    open(next: JobDocument): void {
      take(edited(history.value, next, null, sameValue));
    },
    /** Ends a group of edits: what comes next is a step of its own. */
    closeGroup(): void {
      history.value = closed(history.value);
    },
    undo(): void {
      take(undone(history.value));
    },
    redo(): void {
      take(redone(history.value));
    },
  };
});
