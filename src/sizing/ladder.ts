/** Rungs of a front for each material, both ends included. */
export const RUNGS = 41;

/** The front ends at this fraction of its beginning where no envelope ends it sooner. */
export const OPEN_END = 1 / 20;

/** RUNGS values from `first` to `last` in geometric steps, both included. */
export function ladder(first: number, last: number): number[] {
  const step = (last / first) ** (1 / (RUNGS - 1));
  return Array.from({ length: RUNGS }, (_, i) => (i === RUNGS - 1 ? last : first * step ** i));
}
