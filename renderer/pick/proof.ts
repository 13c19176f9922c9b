import type { Optimality } from '../../src/report/report.js';
import { figuresText } from './values.js';

/** Below this, parts per million, a gap is said as "less than". */
const LEAST_SAID = 0.001;

/** Above this a gap is said in per cent. */
const MOST_PPM = 1000;

function gapText(gap: number): string {
  const ppm = gap * 1e6;
  if (ppm < LEAST_SAID) return `less than ${String(LEAST_SAID)} parts per million`;
  return ppm > MOST_PPM ? `${figuresText(gap * 100, 2)} %` : `${figuresText(ppm, 2)} parts per million`;
}

/** How surely nothing of this material is lighter, and how much was reckoned for it. */
export function proofText({ method, gap, evaluations }: Optimality): string {
  const reckoned = `${evaluations.toLocaleString('en-GB').replaceAll(',', ' ')} evaluations`;
  if (gap === 0) return `Lightest of this material: ${method}, ${reckoned}.`;
  return `Proved lightest of this material to within ${gapText(gap)}: ${method}, ${reckoned}.`;
}
