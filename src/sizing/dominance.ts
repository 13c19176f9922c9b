import type { FrontAxis } from '../job/job.js';
import type { FrontPoint } from '../report/report.js';

/** A point of one material's front, before it is compared with the others. */
export type OwnPoint = Omit<FrontPoint, 'dominated'>;

const KEYS = { twist: 'twist', outerDiameter: 'outerDiameter', cost: 'cost' } as const satisfies Record<
  FrontAxis,
  keyof OwnPoint
>;

/** What mass is traded against at a point: rad, m, or the job's currency; null where the material has no price. */
export function tradedOf(point: OwnPoint, against: FrontAxis): number | null {
  return point[KEYS[against]];
}

/** Marks every point that another beats: no heavier and no worse in the traded quantity, and better in one. */
export function withDominance(points: readonly OwnPoint[], against: FrontAxis): FrontPoint[] {
  const beaten = beatenPoints(points, against);
  return points.map((point) => ({ ...point, dominated: beaten.has(point) }));
}

/** The points that another beats. */
export function beatenPoints(points: readonly OwnPoint[], against: FrontAxis): ReadonlySet<OwnPoint> {
  const traded = (point: OwnPoint): number => tradedOf(point, against) ?? Number.POSITIVE_INFINITY;
  const beaten = new Set<OwnPoint>();
  let lightest: OwnPoint | null = null;
  for (const point of points.toSorted((a, b) => traded(a) - traded(b) || a.mass - b.mass)) {
    const same = lightest !== null && point.mass === lightest.mass && traded(point) === traded(lightest);
    if (lightest !== null && point.mass >= lightest.mass && !same) beaten.add(point);
    else lightest = point;
  }
  return beaten;
}
