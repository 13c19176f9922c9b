import { defineStore } from 'pinia';
import { computed, shallowRef, watch } from 'vue';
import type { Desk } from '../../main/contract.js';
import type { DesignCheck } from '../../src/report/report.js';
import { heldEntry, heldName, roundedSizes, type TubeSize } from '../job/held.js';
import { useJob } from './job.js';
import { usePick, type Picked } from './pick.js';
import { useRun } from './run.js';
import { useSettings } from './settings.js';

/** A tube that is tried: none of the job's own, m. */
export interface TriedTube extends TubeSize {
  /** id of a material of the job */
  readonly material: string;
}

/**
 * A tube on trial: shown beside the pick without being it, until it is let go, held, or the brief no longer has its
 * material. The desk checks it; of several that are tried in one breath the last one counts.
 */
export const useTrial = defineStore('trial', () => {
  const job = useJob();
  const run = useRun();
  const pick = usePick();
  const settings = useSettings();
  const tube = shallowRef<TriedTube | null>(null);
  const check = shallowRef<DesignCheck | null>(null);
  let desk: Desk | null = null;
  let latest = 0;

  /** How a tube fares in the last sound brief; null where the desk cannot say. */
  async function checked({ material, outerDiameter, wall }: TriedTube): Promise<DesignCheck | null> {
    const document = job.lastSound?.document;
    if (desk === null || document === undefined) return null;
    const answer = await desk.ask('check', { job: document, material, outerDiameter, wall }).catch(() => null);
    return answer?.kind === 'checked' ? answer.check : null;
  }

  function end(): void {
    latest += 1;
    tube.value = null;
    check.value = null;
  }

  async function attempt(next: TriedTube): Promise<void> {
    const number = (latest += 1);
    tube.value = next;
    const result = await checked(next);
    if (number === latest) check.value = result;
  }

  /** Sizes as short as they can be without another answer: rounded to the passing side, or as they are. */
  async function shortest(own: TriedTube): Promise<TubeSize> {
    const exact = await checked(own);
    for (const size of roundedSizes(own, settings.units)) {
      const rounded = await checked({ ...own, ...size });
      if (rounded !== null && rounded.feasible === exact?.feasible) return size;
    }
    return own;
  }

  /** Takes a tube in hand and makes it the pick: one undoable edit. Nothing while the job is in error. */
  async function hold(own: TriedTube): Promise<void> {
    if (!job.sound) return;
    const before = job.document;
    const size = await shortest(own);
    if (job.document !== before) return;
    const list: readonly unknown[] = Array.isArray(before['hold']) ? before['hold'] : [];
    const name = heldName(size, list, settings.units);
    const entry = heldEntry(name, own.material, size, settings.units);
    job.editAll([
      { path: 'hold', value: [...list, entry] },
      { path: 'pick', value: { held: name } },
    ]);
    end();
  }

  watch(
    () => job.lastSound,
    () => {
      const own = tube.value;
      if (own === null) return;
      const still = job.lastSound?.brief.job.materials.some(({ id }) => id === own.material) === true;
      if (still) void attempt(own);
      else end();
    },
  );

  const shown = computed<Omit<Picked, 'pick'> | null>(() => {
    const material = run.shown?.job.materials.find(({ id }) => id === check.value?.material);
    if (check.value === null || material === undefined) return null;
    return { ...check.value, name: material.name, material, relief: [], noFit: null };
  });

  return {
    /** the tube on trial; null where none is */
    tube: computed(() => tube.value),
    /** how it fares, as the pick is shown; null until the desk has said */
    shown,
    /** whether a tube can be held: not while the job is in error */
    available: computed(() => pick.available),
    /** Takes the desk that checks. */
    connect(from: Desk): void {
      desk = from;
    },
    /** Tries a tube. */
    attempt,
    hold,
    /** Lets the tube go. */
    end,
  };
});
