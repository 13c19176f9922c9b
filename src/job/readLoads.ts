import { listField, optionalBoolean, optionalQuantity, quantityField, textField } from '../material/field.js';
import { joinPath } from '../material/problem.js';
import { refuse, type Fields } from '../material/reading.js';
import { JOB_DEFAULTS } from './defaults.js';
import type { LoadCase } from './job.js';
import { openObject, type ObjectRule } from './openObject.js';
import { JOB_RANGES } from './ranges.js';
import { numberOr } from './readTube.js';
import { twistMaxOf } from './readTwist.js';
import { refuseRepeats } from './unique.js';

const LOAD: ObjectRule = {
  what: 'a load case',
  example: '{ "name": "jam", "torque": "900 N·m" }',
  keys: [
    'name',
    'torque',
    'bending',
    'axial',
    'reversing',
    'twistMax',
    'shearStressMax',
    'yieldFactor',
    'ultimateFactor',
    'bucklingFactor',
  ],
};

function loadOf(fields: Fields, length: number): LoadCase {
  const { factor, torque, bending, axial, shearStress, name } = JOB_RANGES;
  const ultimateFactor = numberOr(fields, 'ultimateFactor', factor, JOB_DEFAULTS.ultimateFactor);
  return {
    name: textField(fields, 'name', { longest: name }),
    torque: quantityField(fields, 'torque', torque),
    bending: optionalQuantity(fields, 'bending', bending) ?? JOB_DEFAULTS.bending,
    axial: optionalQuantity(fields, 'axial', axial) ?? JOB_DEFAULTS.axial,
    reversing: optionalBoolean(fields, 'reversing'),
    twistMax: twistMaxOf(fields, length),
    shearStressMax: optionalQuantity(fields, 'shearStressMax', shearStress),
    yieldFactor: numberOr(fields, 'yieldFactor', factor, JOB_DEFAULTS.yieldFactor),
    ultimateFactor,
    bucklingFactor: numberOr(fields, 'bucklingFactor', factor, ultimateFactor),
  };
}

/** A tube sized for no torque is no torsion tube, and its answer would be whatever else binds. */
function checkSomeTorque(job: Fields, opened: readonly (Fields | null)[], loads: readonly LoadCase[]): void {
  const least = JOB_RANGES.torqueLeast;
  const [first] = opened;
  if (loads.length < opened.length || !loads.every(({ torque }) => Math.abs(torque) < least)) return;
  const wanted = `at least ${least} N·m of torque`;
  if (opened.length > 1) refuse(job, 'loads', 'of load cases carries no torque', `${wanted} in one of them`);
  else if (first) refuse(first, 'torque', 'is no torque', wanted);
}

/** Reads `loads`. Meaningless where problems were noted. */
export function collectLoads(job: Fields, length: number): readonly LoadCase[] {
  const raw = listField(job, 'loads', 'load cases', 1, JOB_RANGES.loads);
  const opened = raw.map((entry, index) => openObject(entry, joinPath('loads', index), LOAD, job.reading));
  const loads = opened.flatMap((fields) => (fields === null ? [] : [loadOf(fields, length)]));
  const names = opened.map((fields) => fields?.own.get('name'));
  refuseRepeats(
    names.map((name) => (typeof name === 'string' ? name : '')),
    'loads',
    'name',
    job.reading,
  );
  checkSomeTorque(job, opened, loads);
  return loads;
}
