import { formatQuantity } from '../quantity/format.js';
import { shownUnit } from '../quantity/register.js';
import type { Size } from '../sizing/stock.js';
import { Walked } from './along.js';
import { sizeTexts } from './decimals.js';
import type { Label } from './figure.js';
import { CAPTION_SIZE, dimensionLabel } from './label.js';
import { polyline } from './point.js';
import type { Drafting, Part } from './mapDrafting.js';

/** Radius of the ring about the optimum, how far its cross reaches, and the room that figures beside it leave, px. */
const RING = 6.5;
const REACH = 12;
const ROOM = 8;

/** Distance of the places that other labels avoid, px. */
const MARKS = 5;

/** Where the mass may stand about the ring, best first. */
const ABOUT = [
  { x: 13, y: -7, anchor: 'start' },
  { x: 13, y: 17, anchor: 'start' },
  { x: -13, y: -7, anchor: 'end' },
  { x: -13, y: 17, anchor: 'end' },
  { x: 13, y: -22, anchor: 'start' },
  { x: -13, y: -22, anchor: 'end' },
] as const;

/** A ring at the optimum with lines to both axes, its two figures there and its mass beside it. */
export function crossHair(optimum: Size | null, isPick: boolean, { sheet, system, placing }: Drafting): Part {
  if (optimum === null) return { shapes: [], labels: [] };
  const { x, y } = sheet.at(optimum);
  const { left, bottom } = sheet.plot;
  const tone = isPick ? 'copper' : 'ink';
  const [outer = ''] = sizeTexts([optimum.outerDiameter], 'outerDiameter', system);
  const [wall = ''] = sizeTexts([optimum.wall], 'wall', system);
  const figure = { size: CAPTION_SIZE, weight: 500, tone } as const;
  const figures = [
    dimensionLabel(outer, x, bottom + 15, figure),
    dimensionLabel(wall, left - 8, y + 3.7, { ...figure, anchor: 'end' }),
  ];
  placing.take(figures);
  placing.block({ left: x - REACH, top: y - REACH, right: x + REACH, bottom: y + REACH });
  placing.block({ left: x - 20, top: bottom + 4, right: x + 20, bottom: bottom + 18 });
  placing.block({ left: 0, top: y - ROOM, right: left - 5, bottom: y + ROOM });
  placing.avoid(
    new Walked([
      { x: left, y },
      { x, y },
      { x, y: bottom },
    ]).every(MARKS),
  );
  const lines =
    polyline([
      { x: left, y },
      { x: x - RING - 1.5, y },
    ]) +
    polyline([
      { x, y: y + RING + 1.5 },
      { x, y: bottom },
    ]);
  const cross =
    polyline([
      { x: x - REACH, y },
      { x: x + REACH, y },
    ]) +
    polyline([
      { x, y: y - REACH },
      { x, y: y + REACH },
    ]);
  const text = formatQuantity(optimum.mass, 'mass', shownUnit('mass', system), { decimals: 3 });
  return {
    shapes: [
      { kind: 'path', d: lines, line: tone, width: 0.9, stroke: 'crossed' },
      { kind: 'path', d: cross, line: tone, width: 0.9 },
      { kind: 'circle', x, y, r: RING, line: tone, width: 1.8 },
    ],
    labels: [...figures, ...massLabel(text, x, y, tone, placing)],
  };
}

function massLabel(
  text: string,
  x: number,
  y: number,
  tone: Label['tone'],
  placing: Drafting['placing'],
): readonly Label[] {
  const tried = ABOUT.map((about) =>
    dimensionLabel(text, x + about.x, y + about.y, { anchor: about.anchor, size: 11.5, tone }),
  )
    .filter((label) => placing.fits([label]))
    .map((label, i) => ({ label, cost: i + 2 * placing.covered([label]) }))
    .sort((a, b) => a.cost - b.cost);
  const best = tried[0]?.label;
  if (best === undefined) return [];
  placing.take([best]);
  return [best];
}
