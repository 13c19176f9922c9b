import type { Metal } from '../material/material.js';
import { Mass } from './mass.js';
import type { MapPoint, MapWindow } from './mapScale.js';

const POINTS = 40;

/**
 * The tubes of one mass in a window, from the stoutest on; none where no tube of it lies there. With
 * a = m/(ρπL) = t(D − t) the diameter is D = t + a/t, and the wall of a diameter the lesser root of t² − Dt + a.
 * @param length L, m
 * @param mass m, kg
 */
export function isoMass(metal: Metal, length: number, mass: number, window: MapWindow): readonly MapPoint[] {
  const a = mass / new Mass(metal.density, length).perArea;
  const { outerLo, outerHi, wallLo, wallHi } = window;
  const stoutest = Math.min(wallHi, Math.sqrt(a));
  const from = Math.max(outerLo, stoutest + a / stoutest);
  const to = wallLo > 0 ? Math.min(outerHi, wallLo + a / wallLo) : outerHi;
  if (!(from < to)) return [];
  return Array.from({ length: POINTS + 1 }, (_, i) => {
    const outerDiameter = i === POINTS ? to : from * (to / from) ** (i / POINTS);
    // 2a over the greater root, so that a thin wall keeps its digits
    const wall = (2 * a) / (outerDiameter + Math.sqrt(Math.max(outerDiameter * outerDiameter - 4 * a, 0)));
    return { outerDiameter, wall };
  });
}
