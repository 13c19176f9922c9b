import { defineStore } from 'pinia';
import { ref } from 'vue';
import type { UnitSystem } from '../../src/quantity/register.js';

export type Theme = 'paper' | 'blueprint';

/** What the window remembers beside the job. */
export interface RememberedSettings {
  readonly theme: Theme;
  readonly units: UnitSystem;
}

/** How the window shows things: its sheet and its units. */
export const useSettings = defineStore('settings', () => {
  const theme = ref<Theme>('paper');
  const units = ref<UnitSystem>('SI');
  return {
    theme,
    units,
    /** Takes what was remembered. */
    restore(settings: RememberedSettings): void {
      theme.value = settings.theme;
      units.value = settings.units;
    },
  };
});
