import type { Job } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { Flag } from '../report/report.js';
import { Section } from '../tube/section.js';
import { PASS, SEARCHED } from './problem.js';

/** γZ below which the moderately long form of torsional buckling is on the safe side. */
const SHORT = 50;

/** r/tc below which the wall is thick for a shell rule, and above which the compression knock-down was not measured. */
const THICK = 10;
const THIN = 1500;

/** What a reader of the numbers must know of their range: every flag that fires for a size. */
export function flagsOf(job: Job, metal: Metal, outerDiameter: number, wall: number): Flag[] {
  const { meanRadius, checkedWall } = new Section(metal.wallTolerance).set(outerDiameter, wall);
  const slenderness = meanRadius / checkedWall;
  const gamma = job.buckling.torsionKnockdown ** (4 / 3);
  const { length } = job.tube;
  const z = ((length * length) / (meanRadius * checkedWall)) * Math.sqrt(1 - metal.poissonRatio ** 2);
  const fires: readonly (Flag & { readonly when: boolean })[] = [
    {
      code: 'short-tube',
      text: 'The tube is short (γZ under 50): the wall-buckling rule is on the safe side here.',
      when: gamma * z < SHORT,
    },
    {
      code: 'thick-wall',
      text: 'The wall is thick (r/t under 10): the wall-buckling rule is a thin-shell rule and yield governs in practice.',
      when: slenderness < THICK,
    },
    {
      code: 'thin-wall',
      text: 'The wall is thinner than the tests behind the knock-downs for thrust and bending (r/t over 1500).',
      when: slenderness > THIN,
    },
    {
      code: 'wall-past-record',
      text: 'The wall is thicker than the material record’s strengths are for: use the record for thicker walls.',
      when: metal.wallMax !== null && wall > metal.wallMax * (1 + PASS),
    },
    {
      code: 'fatigue-not-covered',
      text: 'The load reverses and gives no shear allowable: fatigue is not covered.',
      when: job.loads.some(({ reversing, shearStressMax }) => reversing === true && shearStressMax === null),
    },
    {
      code: 'search-ceiling',
      text: 'The outer diameter lies at the end of the sizes that are searched; set the greatest outer diameter.',
      when: outerDiameter > SEARCHED.outerGreatest * 0.999,
    },
  ];
  return fires.filter(({ when }) => when).map(({ code, text }) => ({ code, text }));
}
