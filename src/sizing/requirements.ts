import type { Job, LoadCase, TubeSpec } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { QuantityName } from '../quantity/register.js';

/** How a requirement is written: value/divisor in the unit. */
export interface Wording {
  readonly quantity: QuantityName;
  readonly unit: string;
  readonly divisor: number;
}

/** One requirement of the job that the user might ease; never a factor, a knock-down, or a property of the material. */
export interface Requirement {
  /** key path in the job file */
  readonly path: string;
  /** what it demands now, SI */
  readonly from: number;
  /** which way it gets easier */
  readonly eases: 'up' | 'down';
  /** the job with another value there */
  readonly put: (value: number) => Job;
  /** the job without it */
  readonly without: Job;
  /** how it is written, given the unit in which it was entered */
  readonly quantityIn: (entered: string | undefined) => Wording;
}

type TubeKey = 'outerDiameterMax' | 'outerDiameterMin' | 'boreMin' | 'wallMin';

const TUBE_KEYS: readonly { readonly key: TubeKey; readonly eases: 'up' | 'down' }[] = [
  { key: 'outerDiameterMax', eases: 'up' },
  { key: 'outerDiameterMin', eases: 'down' },
  { key: 'boreMin', eases: 'down' },
  { key: 'wallMin', eases: 'down' },
];

/** Every requirement of the job that could be eased alone. */
export function requirements(job: Job, metal: Metal): Requirement[] {
  return [...tubeRequirements(job, metal), ...twistRequirements(job), ...speedRequirement(job)];
}

function tubeRequirements(job: Job, metal: Metal): Requirement[] {
  return TUBE_KEYS.flatMap(({ key, eases }) => {
    const from = job.tube[key];
    if (from === null || (key === 'wallMin' && from <= metal.wallMin)) return [];
    const put = (value: number | null): Job => ({ ...job, tube: { ...job.tube, [key]: value } satisfies TubeSpec });
    const quantityIn = (entered = 'mm'): Wording => ({ quantity: 'length', unit: entered, divisor: 1 });
    return [{ path: `tube.${key}`, from, eases, put, without: put(null), quantityIn }];
  });
}

function twistRequirements(job: Job): Requirement[] {
  return job.loads.flatMap((load, index) => {
    if (load.twistMax === null) return [];
    const put = (twistMax: number | null): Job => withLoad(job, index, { ...load, twistMax });
    const quantityIn = (entered = 'deg'): Wording =>
      entered.includes('/')
        ? { quantity: 'twistRate', unit: entered, divisor: job.tube.length }
        : { quantity: 'angle', unit: entered, divisor: 1 };
    const path = `loads.${String(index)}.twistMax`;
    return [{ path, from: load.twistMax, eases: 'up' as const, put, without: put(null), quantityIn }];
  });
}

function speedRequirement(job: Job): Requirement[] {
  const { speed } = job;
  if (speed === null) return [];
  const put = (max: number): Job => ({ ...job, speed: { ...speed, max } });
  const quantityIn = (entered = 'rpm'): Wording => ({ quantity: 'rotationalSpeed', unit: entered, divisor: 1 });
  const without = { ...job, speed: null };
  return [{ path: 'speed.max', from: speed.max, eases: 'down', put, without, quantityIn }];
}

function withLoad(job: Job, index: number, load: LoadCase): Job {
  return { ...job, loads: job.loads.map((old, i) => (i === index ? load : old)) };
}
