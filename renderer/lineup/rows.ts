import { fixed, sizeTexts } from '../../src/figure/decimals.js';
import { inUnit } from '../../src/quantity/format.js';
import { shownUnit, type UnitSystem } from '../../src/quantity/register.js';
import type { Design, LimitEntry } from '../../src/report/report.js';
import { limitLabel } from '../../src/report/words.js';
import { percentFull, worstOfEach } from '../pick/limitRows.js';
import type { Ranked, Ranking } from './ranking.js';

/** How much heavier than the lightest; both texts '' for the lightest itself. */
export interface Over {
  readonly mass: string;
  readonly percent: string;
}

/** A bar's two parts as fractions of the scale that all bars share: up to the lightest, and past it. */
export interface Bar {
  readonly base: number;
  readonly past: number;
}

/** What a row says of a design, every number a text whose decimals its column shares. */
export interface DesignTexts {
  readonly outerDiameter: string;
  readonly wall: string;
  readonly mass: string;
  readonly over: Over | null;
  readonly twist: string;
  readonly governs: string;
  /** '' where the material has no price */
  readonly cost: string;
  readonly bar: Bar | null;
}

/** One row of the line-up. */
export interface LineUpRow extends Ranked {
  /** null where nothing fits */
  readonly texts: DesignTexts | null;
}

/** Decimals at which the least of the numbers has so many significant figures, within bounds. */
function columnDecimals(numbers: readonly number[], significant: number, least: number, most: number): number {
  const smallest = Math.min(...numbers.filter((number) => number > 0));
  if (!Number.isFinite(smallest)) return least;
  return Math.min(Math.max(significant - 1 - Math.floor(Math.log10(smallest)), least), most);
}

function overOf(mass: number, lightest: number | null, text: (kilograms: number) => string): Over | null {
  if (lightest === null) return null;
  if (mass === lightest) return { mass: '', percent: '' };
  const percent = fixed((mass / lightest - 1) * 100, 0);
  return { mass: text(mass - lightest), percent: percent.startsWith('−') ? percent : `+${percent}` };
}

function barOf(mass: number, lightest: number | null, scale: number): Bar | null {
  if (lightest === null) return null;
  return { base: Math.min(mass, lightest) / scale, past: Math.max(0, mass - lightest) / scale };
}

/** What governs; of a design that fails, what it fails and by how much. */
function governsText(limits: readonly LimitEntry[], fits: boolean): string {
  const worst = worstOfEach(limits);
  if (fits) return worst.flatMap(({ governs, limit }) => (governs ? [limitLabel(limit)] : [])).join(', ');
  const failed = worst.filter(({ utilisation }) => percentFull(utilisation) > 100);
  failed.sort((a, b) => b.utilisation - a.utilisation);
  const words = failed.map(({ limit, utilisation }) => `${limitLabel(limit)} ${String(percentFull(utilisation))} %`);
  return `fails ${words.join(', ')}`;
}

/** The rows of a ranking in its order; the decimals of a column are those that all its rows need. */
export function lineUpRows({ entries, lightest }: Ranking, system: UnitSystem): readonly LineUpRow[] {
  const designs = entries.flatMap(({ design }) => (design === null ? [] : [design]));
  const column = (lengths: (design: Design) => number, kind: 'outerDiameter' | 'wall') =>
    new Map(sizeTexts(designs.map(lengths), kind, system).map((text, index) => [designs[index], text]));
  const outer = column(({ outerDiameter }) => outerDiameter, 'outerDiameter');
  const walls = column(({ wall }) => wall, 'wall');
  const massOf = (kilograms: number) => inUnit(kilograms, 'mass', shownUnit('mass', system));
  const twistOf = (radians: number) => inUnit(radians, 'angle', shownUnit('angle', system));
  const masses = columnDecimals(
    designs.map(({ mass }) => massOf(mass)),
    4,
    2,
    5,
  );
  const twists = columnDecimals(
    designs.map(({ twist }) => twistOf(twist)),
    3,
    2,
    4,
  );
  const massText = (kilograms: number) => fixed(massOf(kilograms), masses);
  const scale = Math.max(...entries.map(({ rank, design }) => (rank === null ? 0 : (design?.mass ?? 0))));
  const textsOf = (design: Design, { rank, limits }: Ranked): DesignTexts => ({
    outerDiameter: outer.get(design) ?? '',
    wall: walls.get(design) ?? '',
    mass: massText(design.mass),
    over: rank === null ? null : overOf(design.mass, lightest, massText),
    twist: fixed(twistOf(design.twist), twists),
    governs: governsText(limits, rank !== null),
    cost: design.cost === null ? '' : fixed(design.cost, 2),
    bar: rank === null ? null : barOf(design.mass, lightest, scale),
  });
  return entries.map((entry) => ({ ...entry, texts: entry.design === null ? null : textsOf(entry.design, entry) }));
}
