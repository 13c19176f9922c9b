import { watch } from 'vue';
import type { Desk } from '../main/contract.js';
import { documentOf } from './job/keyPath.js';
import { readRemembered, type Remembered } from './job/remembered.js';
import { useDemos } from './stores/demos.js';
import { useJob } from './stores/job.js';
import { useRun } from './stores/run.js';
import { useSettings } from './stores/settings.js';
import { useTrial } from './stores/trial.js';

/** How long changes gather before they are remembered, ms. */
export const REMEMBER_WAIT = 500;

/** Begins with what the desk holds: the job as it was left, or the first demo job; sizes it, and remembers what comes. */
export async function beginWith(desk: Desk): Promise<void> {
  const { records, stockLists, demos, remembered } = await desk.ask('begin', null);
  const kept = readRemembered(remembered);
  const jobs = demos.map(documentOf);
  const first = jobs[0] ?? {};
  useDemos().list = jobs;
  if (kept !== null) useSettings().restore(kept.settings);
  useJob().begin(records, stockLists, kept?.job ?? first, kept?.sound ?? first);
  keepRemembering(desk);
  useTrial().connect(desk);
  useRun().connect(desk);
}

/** Has the desk remember every change, at the latest when the window is hidden or closed. */
function keepRemembering(desk: Desk): void {
  const job = useJob();
  const settings = useSettings();
  let timer: ReturnType<typeof setTimeout> | undefined;

  function remember(): void {
    clearTimeout(timer);
    timer = undefined;
    const state: Remembered = {
      version: 1,
      job: job.document,
      sound: job.lastSound?.document ?? job.document,
      settings: { theme: settings.theme, units: settings.units },
    };
    // a desk that cannot remember says so in its own log; the window goes on
    void desk.ask('remember', state).catch(() => null);
  }

  watch([() => job.document, () => settings.theme, () => settings.units], () => {
    clearTimeout(timer);
    timer = setTimeout(remember, REMEMBER_WAIT);
  });
  window.addEventListener('pagehide', () => {
    if (timer !== undefined) remember();
  });
}
