import { choiceField, optionalText, textField } from '../material/field.js';
import type { Problem } from '../material/problem.js';
import { newReading, type Fields } from '../material/reading.js';
import { optionalSizes, type StockLists } from '../material/sizes.js';
import { JOB_DEFAULTS } from './defaults.js';
import type { Brief, FrontAxis, Job } from './job.js';
import { libraryNotes } from './libraryNotes.js';
import { openObject, type ObjectRule } from './openObject.js';
import { parseJson } from './parseJson.js';
import { JOB_RANGES } from './ranges.js';
import { collectBuckling } from './readBuckling.js';
import { openJob } from './readHeader.js';
import { collectHold } from './readHold.js';
import { collectLoads } from './readLoads.js';
import { collectMaterials, type Library } from './readMaterials.js';
import { collectPick } from './readPick.js';
import { collectSpeed } from './readSpeed.js';
import { collectTube } from './readTube.js';

/** A job as read, with a sentence for each record that differs from the library's; or every mistake in it. */
export type JobResult =
  | { readonly ok: true; readonly brief: Brief; readonly notes: readonly string[] }
  | { readonly ok: false; readonly problems: readonly Problem[] };

const FRONT: ObjectRule = { what: 'a front', example: '{ "against": "twist" }', keys: ['against'] };

type Head = Pick<Job, 'title' | 'number' | 'revision' | 'author' | 'note' | 'currency'>;

function frontAxis(job: Fields): FrontAxis {
  const value = job.own.get('front');
  if (value === undefined) return JOB_DEFAULTS.frontAgainst;
  const fields = openObject(value, 'front', FRONT, job.reading);
  return fields === null
    ? JOB_DEFAULTS.frontAgainst
    : choiceField<FrontAxis>(fields, 'against', ['twist', 'outerDiameter', 'cost']);
}

function headOf(job: Fields): Head {
  const name = { longest: JOB_RANGES.name };
  return {
    title: textField(job, 'title', { longest: JOB_RANGES.title }),
    number: optionalText(job, 'number', name),
    revision: optionalText(job, 'revision', name),
    author: optionalText(job, 'author', name),
    note: optionalText(job, 'note', { longest: JOB_RANGES.note, lines: true }),
    currency: optionalText(job, 'currency', { longest: JOB_RANGES.currency }),
  };
}

function jobOf(fields: Fields, library: Library, stock: StockLists): Job | null {
  const head = headOf(fields);
  const tube = collectTube(fields.own.get('tube'), fields.reading);
  const loads = collectLoads(fields, tube?.length ?? NaN);
  const speed = collectSpeed(fields);
  const buckling = collectBuckling(fields);
  const { materials, ids } = collectMaterials(fields, library, stock);
  const sizes = optionalSizes(fields, 'sizes', stock) ?? JOB_DEFAULTS.sizes;
  const hold = collectHold(fields, ids);
  const held = hold.map((design) => design.name);
  const pick = collectPick(fields, ids, held);
  const front = { against: frontAxis(fields) };
  const body = { loads, speed, buckling, materials, sizes, hold, pick, front };
  return tube === null ? null : { format: 'wringwall-job', version: 1, ...head, tube, ...body };
}

/**
 * Reads a job document into SI units with every default, record and stock row written out. Format and version come
 * first; then all mistakes are told together, each with its key path, the value and what was expected.
 * @param document what the JSON text of a job file holds
 * @param library the shipped material records by id
 * @param stockLists the rows of the shipped stock lists by id
 */
export function readJob(document: unknown, library: Library, stockLists: StockLists): JobResult {
  const reading = newReading();
  const fields = openJob(document, reading);
  const job = fields === null ? null : jobOf(fields, library, stockLists);
  const { problems, units } = reading;
  if (job === null || problems.length > 0) return { ok: false, problems };
  return { ok: true, brief: { job, units }, notes: libraryNotes(job.materials, library) };
}

/** `readJob` for the text of a job file. */
export function readJobText(text: string, library: Library, stockLists: StockLists): JobResult {
  const parsed = parseJson(text);
  return parsed.ok ? readJob(parsed.value, library, stockLists) : parsed;
}
