import { refuse, type Fields, type Reading } from '../material/reading.js';
import { openObject, type ObjectRule } from './openObject.js';

const FORMAT = 'wringwall-job';
const VERSION = 1;

const JOB: ObjectRule = {
  what: 'a job',
  example: '{ "format": "wringwall-job", "version": 1, … }',
  keys: [
    'format',
    'version',
    'title',
    'number',
    'revision',
    'author',
    'note',
    'tube',
    'loads',
    'speed',
    'buckling',
    'materials',
    'sizes',
    'hold',
    'pick',
    'currency',
    'front',
  ],
};

function checkVersion(fields: Fields): void {
  const version = fields.own.get('version');
  if (version === VERSION) return;
  const newer = typeof version === 'number' && Number.isInteger(version) && version > VERSION;
  if (newer) refuse(fields, 'version', 'was written by a newer version of Wringwall', `version ${VERSION}`);
  else refuse(fields, 'version', 'is not a version of the job format', String(VERSION));
}

/**
 * Opens a job after a look at its format and version: a document of another kind gets one sentence, not one for each
 * of its keys. Null where it is not a job of this version, with the problem noted.
 */
export function openJob(document: unknown, reading: Reading): Fields | null {
  const found: Reading = { problems: [], units: reading.units };
  const fields = openObject(document, '', JOB, found);
  const unknownKeys = found.problems.splice(0);
  if (fields === null) {
    reading.problems.push(...unknownKeys);
    return null;
  }
  if (fields.own.get('format') !== FORMAT) refuse(fields, 'format', 'is not the format of a job', `"${FORMAT}"`);
  else checkVersion(fields);
  const sound = found.problems.length === 0;
  reading.problems.push(...(sound ? unknownKeys : found.problems));
  return sound ? { ...fields, reading } : null;
}
