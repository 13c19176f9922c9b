import { shownText } from '../field/kind.js';
import { valueAt, type JobDocument } from '../job/keyPath.js';
import type { UnitSystem } from '../../src/quantity/register.js';
import { casesOf } from './loadCases.js';
import { entriesOf } from './materialRows.js';

function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
}

/** The brief in one line, for a window that has no room for more: "900 N·m and 1 more case, 1.4 m, 7 materials". */
export function summary(document: JobDocument, system: UnitSystem): string {
  const loads = casesOf(document['loads']);
  const torque = shownText(loads[0]?.['torque'], ['torque'], system);
  const more = loads.length > 1 ? ` and ${counted(loads.length - 1, 'more case')}` : '';
  const length = shownText(valueAt(document, 'tube.length'), ['length'], system);
  const most = shownText(valueAt(document, 'tube.outerDiameterMax'), ['length'], system);
  const materials = counted(entriesOf(document['materials']).length, 'material');
  return [torque + more, length, most === '' ? '' : `at most ${most}`, materials]
    .filter((part) => part !== '')
    .join(', ');
}
