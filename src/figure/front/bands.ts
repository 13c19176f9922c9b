import type { Point } from '../point.js';
import type { Curve } from './curve.js';

/** A family's fronts folded into one: between its lightest and its heaviest member. */
export interface Band {
  readonly family: string;
  readonly count: number;
  /** from tight to loose */
  readonly lightest: readonly Point[];
  readonly heaviest: readonly Point[];
}

/** Families with more than one material, each folded into a band. */
export function bandsOf(curves: readonly Curve[]): readonly Band[] {
  const families = new Map<string, Curve[]>();
  for (const curve of curves) families.set(curve.mark.family, [...(families.get(curve.mark.family) ?? []), curve]);
  return Array.from(families).flatMap(([family, members]) => (members.length > 1 ? [bandOf(family, members)] : []));
}

/** At every x where a member has a point: the least and the greatest y of the members that reach it. */
function bandOf(family: string, members: readonly Curve[]): Band {
  const xs = Array.from(new Set(members.flatMap(({ points }) => points.map(({ x }) => x)))).sort((a, b) => a - b);
  const lightest: Point[] = [];
  const heaviest: Point[] = [];
  for (const x of xs) {
    const heights = members.flatMap(({ points }) => heightAt(points, x) ?? []);
    lightest.push({ x, y: Math.max(...heights) });
    heaviest.push({ x, y: Math.min(...heights) });
  }
  return { family, count: members.length, lightest, heaviest };
}

/** The y of a line at an x between its ends; null beyond them. */
export function heightAt(points: readonly Point[], x: number): number | null {
  const after = points.findIndex((point) => point.x >= x);
  const next = points[after];
  if (next === undefined) return null;
  const before = points[after - 1];
  if (before === undefined) return next.x === x ? next.y : null;
  return before.y + ((x - before.x) / (next.x - before.x)) * (next.y - before.y);
}
