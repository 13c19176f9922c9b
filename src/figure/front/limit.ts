import type { FrontAxis, Job, LoadCase } from '../../job/job.js';
import { formatQuantity } from '../../quantity/format.js';
import { shownUnit, type UnitSystem } from '../../quantity/register.js';

/** The job's own limit on what mass is traded against. */
export interface OwnLimit {
  /** rad or m */
  readonly value: number;
  /** "twist at most 3 deg, start-up jam" */
  readonly words: string;
}

/** The job's limit on the quantity of a front, as its points measure it; null where it sets none. */
export function ownLimit(job: Job, against: FrontAxis, system: UnitSystem): OwnLimit | null {
  if (against === 'twist') return twistLimit(job, system);
  const { outerDiameterMax } = job.tube;
  if (against === 'cost' || outerDiameterMax === null) return null;
  const text = formatQuantity(outerDiameterMax, 'length', shownUnit('length', system), { significant: 4 });
  return { value: outerDiameterMax, words: `outer diameter at most ${text}` };
}

type Limited = LoadCase & { readonly twistMax: number };

/**
 * A point's twist is that of the largest torque among the cases whose twist is limited; a case of less torque holds it
 * to as much more as its own torque is less.
 */
function twistLimit({ loads }: Job, system: UnitSystem): OwnLimit | null {
  const limited = loads.filter((load): load is Limited => load.torque !== 0 && load.twistMax !== null);
  const worst = Math.max(...limited.map(({ torque }) => Math.abs(torque)));
  const scaled = limited.map((load) => ({ load, value: load.twistMax * (worst / Math.abs(load.torque)) }));
  const tightest = scaled.sort((a, b) => a.value - b.value)[0];
  if (tightest === undefined) return null;
  const text = formatQuantity(tightest.load.twistMax, 'angle', shownUnit('angle', system), { significant: 4 });
  const whose = loads.length > 1 ? `, ${tightest.load.name}` : '';
  return { value: tightest.value, words: `twist at most ${text}${whose}` };
}

/** What is written beside a limit, and its sizes, px. */
export const BEYOND_LIMIT = 'to the right: what easing this limit would buy';
export const LIMIT_SIZE = 11.5;
export const LIMIT_SIZE_BELOW = 11;

/** Strokes on the forbidden side of a limit: so long, so far apart along the line, px, at 45 degrees. */
export const STROKE = { length: 5, apart: 7 } as const;

/** Path data of the strokes beside an upright limit, to its right. */
export function strokesBeside(x: number, top: number, bottom: number): string {
  const side = STROKE.length * Math.SQRT1_2;
  const count = Math.max(0, Math.floor((bottom - top - side) / STROKE.apart) + 1);
  const strokes = Array.from({ length: count }, (_, i) => top + side + i * STROKE.apart);
  return strokes.map((y) => `M${x.toFixed(2)} ${y.toFixed(2)}l${side.toFixed(2)} ${(-side).toFixed(2)}`).join('');
}
