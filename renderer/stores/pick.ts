import { defineStore } from 'pinia';
import { computed, ref } from 'vue';
import type { Pick } from '../../src/job/job.js';
import type { Material } from '../../src/material/material.js';
import type { Candidate, Design, Ease, Flag, HeldResult, LimitEntry, NoFit, Relief } from '../../src/report/report.js';
import type { Results } from '../job/shownResults.js';
import { useJob } from './job.js';
import { useRun } from './run.js';

/** The chosen design, be it a material at its lightest or a design in hand. */
export interface Picked {
  readonly pick: Pick;
  /** the material's name, or the name of the design in hand */
  readonly name: string;
  readonly material: Material;
  readonly feasible: boolean;
  /** null where the material has no design */
  readonly design: Design | null;
  readonly limits: readonly LimitEntry[];
  /** empty for a design in hand */
  readonly relief: readonly Relief[];
  readonly flags: readonly Flag[];
  readonly noFit: NoFit | null;
}

function isText(value: unknown): value is string {
  return typeof value === 'string';
}

/** The choice that the document names, or null. */
function chosenBy(value: unknown): Pick | null {
  if (typeof value !== 'object' || value === null) return null;
  if ('material' in value && isText(value.material)) return { material: value.material };
  return 'held' in value && isText(value.held) ? { held: value.held } : null;
}

function ofCandidate(candidate: Candidate, { job }: Results): Picked | null {
  const material = job.materials.find(({ id }) => id === candidate.material);
  if (material === undefined) return null;
  return { ...candidate, pick: { material: material.id }, name: material.name, material };
}

function ofHeld(held: HeldResult, { job }: Results): Picked | null {
  const material = job.materials.find(({ id }) => id === held.material);
  return material === undefined ? null : { ...held, pick: { held: held.name }, material, relief: [], noFit: null };
}

function find(results: Results, pick: Pick): Picked | null {
  if ('held' in pick) {
    const held = results.held.find(({ name }) => name === pick.held);
    return held === undefined ? null : ofHeld(held, results);
  }
  const candidate = results.candidates.find(({ material }) => material === pick.material);
  return candidate === undefined ? null : ofCandidate(candidate, results);
}

/**
 * Two different things: the pick, which is part of the job, and the material in focus, which the eye is on. Hovering
 * previews the focus, a click keeps it, and choosing makes it the pick.
 */
export const usePick = defineStore('pick', () => {
  const job = useJob();
  const run = useRun();
  const hovered = ref<string | null>(null);
  const kept = ref<string | null>(null);

  const chosen = computed(() => chosenBy(job.document['pick']));
  const lightest = computed(() => run.shown?.candidates.find(({ feasible }) => feasible) ?? null);

  const picked = computed<Picked | null>(() => {
    const results = run.shown;
    if (results === null) return null;
    const byHand = chosen.value === null ? null : find(results, chosen.value);
    const first = lightest.value ?? results.candidates[0];
    return byHand ?? (first === undefined ? null : ofCandidate(first, results));
  });

  const focus = computed(() => {
    const known = run.shown?.job.materials.map(({ id }) => id) ?? [];
    const pointedAt = [hovered.value, kept.value].find((id) => id !== null && known.includes(id));
    return pointedAt ?? picked.value?.material.id ?? null;
  });

  return {
    /** the chosen design; where nothing fits and nothing was chosen, the first material with its conflict; null before results */
    picked,
    /** whether the pick was chosen, not taken because it is the lightest */
    byHand: computed(() => chosen.value !== null),
    /** the lightest design that fits; null where nothing does */
    lightest,
    /** id of the material in focus; the pick's where none was pointed at */
    focus,
    /** whether a pick can be made: not while the job is in error or nothing is sized */
    available: computed(() => job.sound && run.shown !== null),
    /** Whether this is the pick. */
    isPick(pick: Pick): boolean {
      const own = picked.value?.pick;
      if (own === undefined) return false;
      if ('held' in own) return 'held' in pick && pick.held === own.held;
      return 'material' in pick && pick.material === own.material;
    },
    /** The pointer is over a material, or over none (null). */
    hover(material: string | null): void {
      hovered.value = material;
    },
    /** Keeps a material in focus. */
    keep(material: string | null): void {
      kept.value = material;
    },
    /** Makes a design the pick: an undoable edit of the job. Nothing while the job is in error. */
    choose(pick: Pick): void {
      if (job.sound) job.edit('pick', pick);
    },
    /** Gives the choice up: the lightest is the pick. */
    takeLightest(): void {
      if (job.sound) job.edit('pick', undefined);
    },
    /** Applies a change that lets something fit: an undoable edit. */
    apply(ease: Ease): void {
      if (job.sound) job.edit(ease.path, ease.to);
    },
  };
});
