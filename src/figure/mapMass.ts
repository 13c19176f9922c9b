import type { Metal } from '../material/material.js';
import { inUnit } from '../quantity/format.js';
import { shownUnit, type UnitSystem } from '../quantity/register.js';
import { isoMass } from '../sizing/isoMass.js';
import { Mass } from '../sizing/mass.js';
import { clipped } from './clip.js';
import { roundStep, stepDecimals } from './axis.js';
import { fixed } from './decimals.js';
import type { Label, Shape } from './figure.js';
import { CAPTION_SIZE, dimensionLabel } from './label.js';
import type { MapSheet } from './mapSheet.js';
import { type Point, polyline } from './point.js';

/** Least distance between the ends of two curves of equal mass, px. */
const PITCH = 20;

/** What masses on a map belong to. */
export interface MapMetal {
  readonly metal: Metal;
  /** m */
  readonly length: number;
}

/** A curve of equal mass and the name at its end. */
export interface MassCurve {
  readonly line: readonly Point[];
  readonly label: Label | null;
}

/** Curves of equal mass at round values, those that end at the right edge, with their masses there. */
export function massCurves({ metal, length }: MapMetal, sheet: MapSheet, system: UnitSystem): readonly MassCurve[] {
  const unit = shownUnit('mass', system);
  const perUnit = 1 / inUnit(1, 'mass', unit);
  const values = roundMasses(sheet, (wall) => massAt(metal, length, sheet, wall) / perUnit);
  const decimals = Math.max(...values.map(stepDecimals), 0);
  return values.map((value, i) => {
    const line = massLine({ metal, length }, value * perUnit, sheet);
    const end = line[line.length - 1];
    const text = `${fixed(value, decimals)}${i === values.length - 1 ? ` ${unit}` : ''}`;
    const own = { anchor: 'start', size: CAPTION_SIZE, weight: 400, tone: 'ink2' } as const;
    return { line, label: end === undefined ? null : dimensionLabel(text, end.x + 7, end.y + 3.7, own) };
  });
}

/** The curve of one mass, kg. */
export function massLine({ metal, length }: MapMetal, mass: number, sheet: MapSheet): readonly Point[] {
  const points = isoMass(metal, length, mass, sheet.axes.window).map((size) => sheet.at(size));
  return clipped(points, sheet.plot).flat();
}

/** How such a curve is drawn. */
export function massShape(line: readonly Point[], tone: 'ink2' | 'copper'): Shape {
  return { kind: 'path', d: polyline(line), line: tone, width: tone === 'copper' ? 0.9 : 0.7, stroke: 'dotted' };
}

function massAt(metal: Metal, length: number, sheet: MapSheet, wall: number): number {
  return new Mass(metal.density, length).of(sheet.axes.window.outerHi, wall);
}

/** Round masses, in the shown unit, that are far enough apart at the right edge. */
function roundMasses(sheet: MapSheet, at: (wall: number) => number): readonly number[] {
  const { window } = sheet.axes;
  const { top, bottom } = sheet.plot;
  const stoutest = Math.min(window.wallHi, window.outerHi / 2);
  const most = at(stoutest);
  if (window.log) return decadeMasses(at(window.wallLo), most);
  const step = roundStep((most * PITCH) / (bottom - top) / (stoutest / window.wallHi));
  const count = Math.floor(most / step - 1e-9);
  return Array.from({ length: count }, (_, i) => Number(((i + 1) * step).toPrecision(12)));
}

function decadeMasses(least: number, most: number): readonly number[] {
  const first = Math.floor(Math.log10(least));
  const decades = Array.from({ length: Math.ceil(Math.log10(most)) - first + 1 }, (_, i) => first + i);
  const all = decades.flatMap((power) => [1, 2, 5].map((times) => Number((times * 10 ** power).toPrecision(3))));
  return all.filter((value) => value > least && value < most);
}
