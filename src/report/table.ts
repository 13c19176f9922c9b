import { setColumns } from './columns.js';
import { noFitText } from './noFit.js';
import type { Design, Flag, LimitEntry, Report } from './report.js';
import {
  CAUTION,
  degrees,
  governingWords,
  hasSeveralLoads,
  leastMargin,
  marginText,
  figuresKept,
  sizeText,
} from './words.js';

const HEAD = ['material', 'outer diameter × wall (mm)', 'mass (kg)', 'twist (deg)', 'governing limit', 'margin'];
const TO_RIGHT = [false, true, true, true, false, true];

function row(
  name: string,
  design: Design | null,
  limits: readonly LimitEntry[],
  severalLoads: boolean,
): readonly string[] {
  if (design === null) return [name, 'nothing fits', '', '', '', ''];
  const twist = figuresKept(degrees(design.twist));
  const governs = governingWords(limits, severalLoads);
  return [name, sizeText(design), figuresKept(design.mass), twist, governs, marginText(leastMargin(limits))];
}

function lineUp(report: Report): readonly string[] {
  const several = hasSeveralLoads(report);
  const rows = report.candidates.map(({ material, design, limits }) => row(material, design, limits, several));
  return setColumns([HEAD, ...rows], TO_RIGHT);
}

function inHand(report: Report): readonly string[] {
  if (report.held.length === 0) return [];
  const several = hasSeveralLoads(report);
  const rows = report.held.map(({ name, material, design, limits, feasible }) => [
    ...row(`${name} (${material})`, design, limits, several),
    feasible ? 'passes' : 'fails',
  ]);
  return ['', ...setColumns([['design in hand', ...HEAD.slice(1), ''], ...rows], [...TO_RIGHT, false])];
}

interface Picked {
  readonly name: string;
  readonly design: Design | null;
  readonly flags: readonly Flag[];
  readonly feasible: boolean;
}

function pickedOf({ pick, candidates, held }: Report): Picked | null {
  if (pick === null) return null;
  if ('held' in pick) return held.find(({ name }) => name === pick.held) ?? null;
  const found = candidates.find(({ material }) => material === pick.material);
  return found === undefined ? null : { ...found, name: found.material };
}

function pickLines(report: Report): readonly string[] {
  const picked = pickedOf(report);
  if (picked === null || picked.design === null) return ['Pick: none, nothing fits.'];
  const { name, design, flags, feasible } = picked;
  const first = report.candidates[0];
  const chosen = feasible ? ', chosen in the job' : ', chosen in the job although it does not pass every limit';
  const lightest = first?.feasible === true && first.design === design ? ', the lightest that fits' : chosen;
  const notes = flags.map(({ text }) => `Note: ${text}`);
  return [`Pick: ${name}, ${sizeText(design)} mm, ${figuresKept(design.mass)} kg${lightest}.`, ...notes];
}

function noFitLines({ candidates }: Report): readonly string[] {
  return candidates.flatMap(({ material, noFit }) => (noFit === null ? [] : [noFitText(material, noFit)]));
}

/**
 * The summary of a report for a terminal: title, line-up, designs in hand, the pick, what stands in the way where a
 * material does not fit, and the caution. Sizes are shown to 0.01 mm and the wall to 0.001 mm; the report holds them in full.
 * @returns lines without line ends
 */
export function reportTable(report: Report): readonly string[] {
  const { title, number, revision } = report.job;
  const head = [title, number, revision === null ? null : `revision ${revision}`].filter((part) => part !== null);
  return [
    head.join(', '),
    '',
    ...lineUp(report),
    ...inHand(report),
    '',
    ...pickLines(report),
    ...noFitLines(report),
    CAUTION,
  ];
}
