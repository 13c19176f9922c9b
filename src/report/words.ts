import { METAL_LIMITS } from '../limit/index.js';
import type { Design, LimitEntry, LimitId, Report } from './report.js';

/** What every view of a report says of itself. */
export const CAUTION =
  'Preliminary sizing of the plain tube. Confirm the allowables for the form that is bought. Joints, fatigue and damage ' +
  'are not covered unless stated. Check by a qualified engineer; local codes and licensed practice govern.';

/** A limit's name in the trade's words, as its file has it. */
export function limitLabel(id: LimitId): string {
  return METAL_LIMITS.find((limit) => limit.id === id)?.label ?? id;
}

/** "twist", "a and b", "a, b and c". */
export function joinWords(words: readonly string[], and = 'and'): string {
  const last = words[words.length - 1] ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} ${and} ${last}`;
}

/** The limits that govern, each with its load case where the job has several: "twist (jam) and bore". */
export function governingWords(limits: readonly LimitEntry[], severalLoads: boolean): string {
  const words = limits
    .filter((entry) => entry.governs)
    .map(({ limit, load }) => (severalLoads && load !== null ? `${limitLabel(limit)} (${load})` : limitLabel(limit)));
  return joinWords(words);
}

/** The least margin, null where no limit is used at all. */
export function leastMargin(limits: readonly LimitEntry[]): number | null {
  const margins = limits.flatMap(({ margin }) => (margin === null ? [] : [margin]));
  return margins.length === 0 ? null : Math.min(...margins);
}

/** What passing forgives: U ≤ 1 + 1e-9. */
const PASSING = 1e-9;

/** A margin to two decimals, never rounded up; what passes by a hair is 0.00. */
export function marginText(margin: number | null): string {
  if (margin === null) return '-';
  const floored = Math.floor((margin + PASSING) * 100 + PASSING) / 100;
  return floored.toFixed(2).replace(/^-0\.00$/, '0.00');
}

/** "63.21 × 1.183 mm": as near as a drawing says it; the report itself holds all figures. */
export function sizeText(design: Design): string {
  return `${(design.outerDiameter * 1e3).toFixed(2)} × ${(design.wall * 1e3).toFixed(3)}`;
}

/** A number to so many significant figures, without exponent or needless zeros for tubes of any sensible size. */
export function figures(value: number, significant: number): string {
  return String(Number(value.toPrecision(significant)));
}

/** A number to four significant figures with its zeros, so that a column lines up; without exponent up to 9999. */
export function figuresKept(value: number): string {
  const text = value.toPrecision(4);
  return text.includes('e') ? figures(value, 4) : text;
}

export function degrees(radians: number): number {
  return (radians * 180) / Math.PI;
}

export function hasSeveralLoads(report: Report): boolean {
  return report.job.loads.length > 1;
}
