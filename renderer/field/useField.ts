import { computed, ref } from 'vue';
import type { Edit } from '../job/keyPath.js';
import { useJob } from '../stores/job.js';
import { useSettings } from '../stores/settings.js';
import { shownText, stepped, valueOf, type FieldKind } from './kind.js';

/** What a field edits. */
export interface FieldSpec {
  /** key path of the value, and of its mistakes */
  readonly path: string;
  readonly kind: FieldKind;
  /** the edits that put a value in its place; by default the value at the path */
  readonly edits?: ((value: unknown) => readonly Edit[]) | undefined;
}

/** Counts the times that typing began in a field, so that each is a step of its own. */
let typings = 0;

/**
 * A text field of the job. What is typed goes into the job as soon as the engine can read it; a mistake only when the
 * user leaves the field or presses Enter. Escape puts back what stood there.
 */
export function useField(spec: () => FieldSpec) {
  const job = useJob();
  const settings = useSettings();
  const draft = ref<string | null>(null);
  let group = '';
  let before: unknown;

  const entered = computed(() => job.at(spec().path));
  const shown = computed(() => shownText(entered.value, spec().kind, settings.units));

  /** What a text means; the text that stood there before the typing means what was entered then. */
  function meant(text: string): unknown {
    const { kind } = spec();
    return text === shownText(before, kind, settings.units) ? before : valueOf(text, kind);
  }

  function put(value: unknown): void {
    const { path, edits } = spec();
    job.editAll(edits?.(value) ?? [{ path, value }], group);
  }

  /** Begins a typing, to which all is one step and which can be taken back, where none is going on. */
  function beginTyping(): void {
    if (draft.value !== null) return;
    typings += 1;
    group = `${spec().path} ${typings}`;
    before = entered.value;
  }

  function type(text: string): void {
    beginTyping();
    draft.value = text;
    const { path } = spec();
    const value = meant(text);
    if (value !== undefined && job.wouldRead(path, spec().edits?.(value) ?? [{ path, value }])) put(value);
  }

  /** Takes what was typed, right or wrong; what was only looked at stays as it was entered. */
  function commit(): void {
    const text = draft.value;
    draft.value = null;
    if (text !== null && text !== shown.value) put(meant(text));
    job.closeGroup();
  }

  /** Puts back what stood in the field before it was typed in. */
  function restore(): void {
    if (draft.value === null) return;
    draft.value = null;
    put(before);
  }

  /** Forgets what is typed and not yet in the job; false where there is nothing of the kind. */
  function forget(): boolean {
    const pending = draft.value !== null && draft.value !== shown.value;
    draft.value = null;
    return pending;
  }

  /** Moves the last digit by some steps. */
  function step(steps: number): void {
    const next = stepped(draft.value ?? shown.value, steps);
    if (next !== null) type(next);
  }

  const text = computed(() => draft.value ?? shown.value);
  const problem = computed(() => job.problemAt(spec().path));
  return { text, problem, type, commit, restore, forget, step };
}
