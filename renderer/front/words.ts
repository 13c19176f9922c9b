import { fixed, sizeTexts } from '../../src/figure/decimals.js';
import type { DrawnPoint } from '../../src/figure/front/curve.js';
import type { FrontFigure } from '../../src/figure/front/model.js';
import type { FrontAxis } from '../../src/job/job.js';
import type { Material } from '../../src/material/material.js';
import type { UnitSystem } from '../../src/quantity/register.js';
import { limitLabel } from '../../src/report/words.js';
import { nameParts } from '../pick/names.js';
import { figuresText } from '../pick/values.js';

/** What a front can be drawn against, and how it is said. */
export const AGAINST = [
  ['twist', 'twist'],
  ['outerDiameter', 'outer diameter'],
  ['cost', 'cost'],
] as const satisfies readonly (readonly [FrontAxis, string])[];

/** What the station shows, by what mass is traded against. */
export const SENTENCES: Readonly<Record<FrontAxis, string>> = {
  twist: 'the lightest tube at every twist; heavy where no other material beats it',
  outerDiameter: 'the lightest tube at every outer diameter; heavy where no other material beats it',
  cost: 'each material’s tubes at their cost; full where no other beats them',
};

/** What a material's line is called: its name without the form, where no other would bear the same. */
export function lineNames(materials: readonly Pick<Material, 'id' | 'name'>[]): ReadonlyMap<string, string> {
  const bearers = new Map<string, number>();
  for (const { name } of materials) {
    const short = nameParts(name).name;
    bearers.set(short, (bearers.get(short) ?? 0) + 1);
  }
  return new Map(
    materials.map(({ id, name }) => {
      const short = nameParts(name).name;
      return [id, bearers.get(short) === 1 ? short : name];
    }),
  );
}

/** "84.8 × 1.75, twist governs". */
export function tubeWords({ point }: DrawnPoint, system: UnitSystem): string {
  const [outer = ''] = sizeTexts([point.outerDiameter], 'outerDiameter', system);
  const [wall = ''] = sizeTexts([point.wall], 'wall', system);
  return `${outer} × ${wall}, ${limitLabel(point.governs)} governs`;
}

/** The values of a point as the axes would say them. */
export function pointFigures({ value, mass }: DrawnPoint): readonly [string, string] {
  return [figuresText(value, 3), fixed(mass, 3)];
}

/** A rung as it is read out: "Aluminium 2024-T3: twist 3.00 deg, 1.729 kg; 90.0 × 1.61, twist governs". */
export function rungWords(name: string, point: DrawnPoint, figure: FrontFigure, system: UnitSystem): string {
  const [value, mass] = pointFigures(point);
  const [term = '', unit = ''] = figure.xName.split(', ');
  const beaten = point.point.dominated ? '; another material is lighter' : '';
  return `${name}: ${`${term} ${value} ${unit}`.trim()}, ${mass} ${figure.yName}; ${tubeWords(point, system)}${beaten}`;
}

/** The drawing in words. */
export function frontSummary({ curves, limit, pick, xName }: FrontFigure): string {
  if (curves.length === 0) return `Mass against ${xName}: no material has a front yet.`;
  const lines = `Mass against ${xName}, for ${curves.map(({ name }) => name).join(', ')}.`;
  const held = limit === null ? '' : ` Limit: ${limit.words}.`;
  const chosen = pick === null ? '' : ` ${pick.texts.join(', ')}.`;
  return `${lines}${held}${chosen}`;
}
