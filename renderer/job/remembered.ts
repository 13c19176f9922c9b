import type { RememberedSettings } from '../stores/settings.js';
import { isObject, type JobDocument } from './keyPath.js';

/** What the window asks the desk to remember, and finds again at the next start. */
export interface Remembered {
  readonly version: 1;
  /** the job as it stood, saved or not, right or wrong */
  readonly job: JobDocument;
  /** the last of it that could be sized */
  readonly sound: JobDocument;
  readonly settings: RememberedSettings;
}

function isJob(value: unknown): value is JobDocument {
  return isObject(value) && value['format'] === 'wringwall-job';
}

/** Reads what was remembered, as far as it makes sense; null where there is nothing of use. */
export function readRemembered(value: unknown): Remembered | null {
  if (!isObject(value) || value['version'] !== 1 || !isJob(value['job'])) return null;
  const settings = isObject(value['settings']) ? value['settings'] : {};
  return {
    version: 1,
    job: value['job'],
    sound: isJob(value['sound']) ? value['sound'] : value['job'],
    settings: {
      theme: settings['theme'] === 'blueprint' ? 'blueprint' : 'paper',
      units: settings['units'] === 'US' ? 'US' : 'SI',
    },
  };
}
