import type { Brief, Job } from '../job/job.js';
import type { Metal } from '../material/material.js';
import { formatQuantity, roundedDown, roundedUp } from '../quantity/format.js';
import type { Ease } from '../report/report.js';
import { type Requirement, requirements } from './requirements.js';
import { fits } from './solve.js';

/** Relative width at which the search for the least change stops; the answer lies on its safe side. */
const CLOSE = 1e-6;

/** Figures in which a change is offered: the fewest that overshoot by no more than this fraction. */
const OVERSHOOT = 0.003;

/** A change is not looked for past this factor. */
const FURTHEST = 1e9;

/** For every requirement that could be eased alone: the least change at which something fits, rounded to the safe side. */
export function eases({ job, units }: Brief, metal: Metal): Ease[] {
  return requirements(job, metal).flatMap((requirement) => {
    if (!fits(requirement.without, metal)) return [];
    const least = leastChange(requirement, metal);
    return least === null ? [] : [offer(requirement, least, units[requirement.path], metal)];
  });
}

/** The greatest factor on every torque at which something fits, to three figures on the safe side; null where none is. */
export function torqueFactor(job: Job, metal: Metal): number | null {
  const scaled = (factor: number): Job => ({
    ...job,
    loads: job.loads.map((load) => ({ ...load, torque: load.torque * factor })),
  });
  const factor = closest(1, 1 / FURTHEST, (value) => fits(scaled(value), metal));
  if (factor === null) return null;
  const step = 10 ** (Math.floor(Math.log10(factor)) - 2);
  const rounded = Number((Math.floor(factor / step + 1e-9) * step).toPrecision(3));
  return fits(scaled(rounded), metal) ? rounded : factor;
}

function leastChange({ from, eases: way, put }: Requirement, metal: Metal): number | null {
  return closest(from, way === 'up' ? from * FURTHEST : from / FURTHEST, (value) => fits(put(value), metal));
}

/** The value nearest to `from` on the way to `limit` at which the test holds, on the side where it does. */
function closest(from: number, limit: number, holds: (value: number) => boolean): number | null {
  let failing = from;
  let step = limit > from ? 1.5 : 1 / 1.5;
  let holding = from * step;
  while (!holds(holding)) {
    if (limit > from ? holding > limit : holding < limit) return null;
    failing = holding;
    step *= step;
    holding *= step;
  }
  while (Math.abs(holding / failing - 1) > CLOSE) {
    const middle = Math.sqrt(holding * failing);
    if (holds(middle)) holding = middle;
    else failing = middle;
  }
  return holding;
}

/** The change in the job file's own words. */
function offer(requirement: Requirement, least: number, entered: string | undefined, metal: Metal): Ease {
  const { path, from, quantityIn, eases: way, put } = requirement;
  const { quantity, unit, divisor } = quantityIn(entered);
  const [safe, bold] = way === 'up' ? [roundedUp, roundedDown] : [roundedDown, roundedUp];
  // the bold side comes first: it holds where the least change is a round number but for the last digits of the search
  for (const [figures, round] of [3, 4, 5, 6, 8].flatMap((n) => [[n, bold] as const, [n, safe] as const])) {
    const { value, text } = round(least / divisor, quantity, unit, figures);
    const close = Math.abs((value * divisor) / least - 1) <= OVERSHOOT;
    if (close && fits(put(value * divisor), metal)) {
      return { path, from: formatQuantity(from / divisor, quantity, unit, { significant: 10 }), to: text };
    }
  }
  const { text } = safe(least / divisor, quantity, unit, 12);
  return { path, from: formatQuantity(from / divisor, quantity, unit, { significant: 10 }), to: text };
}
