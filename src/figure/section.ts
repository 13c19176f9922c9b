import type { UnitSystem } from '../quantity/register.js';
import { boreDimension, boreFits, boreLabel } from './boreDimension.js';
import { detailFactor, wallDetail, wallFaces, type WallDetail } from './detail.js';
import { arrowhead, brokenDimension, dimensionLine, extensionLine, GAP_MARGIN } from './dimension.js';
import type { Figure, Label, Shape } from './figure.js';
import { captionLabel, dimensionLabel, FIGURE_SIZE, textWidth } from './label.js';
import { type Point, polyline } from './point.js';
import {
  boreText,
  diameterText,
  type DrawnTube,
  outerText,
  type Scaled,
  scaled,
  type SheetSize,
  wallText,
} from './sectionSheet.js';

/** How far the centre lines reach past the outline, and how far an extension line keeps clear of it. */
const OVERHANG = 9;
const CLEARANCE = 2.5;

/** What lengths are in, as a drawing says it. */
const LENGTHS = { SI: 'mm', US: 'inches' } as const;

/** The thinnest line that is still seen, px. */
const HAIRLINE = 0.75;

/** The section of a tube to scale, dimensioned, its wall seen again under a glass. */
export function sectionFigure(tube: DrawnTube, system: UnitSystem, size: SheetSize = 'small'): Figure {
  const drawing = scaled(tube, system, size);
  const { width, height, radius } = drawing.sheet;
  const factor = detailFactor(drawing.wall);
  const detail = { glass: drawing.sheet.glass, wall: drawing.wall * factor, outerRadius: radius * factor };
  return {
    width,
    height,
    description: describe(drawing, factor),
    shapes: [
      ...outline(drawing),
      ...outerDimension(drawing),
      ...boreDimension(drawing),
      ...glass(drawing, detail, factor),
    ],
    labels: [...sizeLabels(drawing), ...boreLabel(drawing), wallLabel(drawing), ...captions(drawing, factor)],
  };
}

function outline({ sheet: { middle, radius }, tube: { boreMin }, scale, wall }: Scaled): readonly Shape[] {
  const { x, y } = middle;
  const reach = radius + OVERHANG;
  const breadth = Math.max(wall, HAIRLINE);
  const axes = polyline([
    { x: x - reach, y },
    { x: x + reach, y },
  ]).concat(
    polyline([
      { x, y: y - reach },
      { x, y: y + reach },
    ]),
  );
  const free: readonly Shape[] =
    boreMin === null ? [] : [circle(middle, (boreMin / 2) * scale, { line: 'ink2', width: 0.8, stroke: 'dashed' })];
  return [
    circle(middle, radius - breadth / 2, { line: 'copper', width: breadth }),
    { kind: 'path', d: axes, line: 'ink2', width: 0.7, stroke: 'centre' },
    ...free,
  ];
}

function circle(middle: Point, r: number, drawn: Pick<Shape, 'line' | 'width' | 'stroke'>): Shape {
  return { kind: 'circle', ...middle, r: Math.max(r, 0), ...drawn };
}

/** Below the section, between two extension lines that start where the round outline has fallen clear of them. */
function outerDimension(drawing: Scaled): readonly Shape[] {
  const { middle, radius, outerDimensionY: y } = drawing.sheet;
  const clear = middle.y + Math.sqrt(radius * radius - (radius - CLEARANCE) ** 2);
  const ends = [-1, 1].map((side) => middle.x + side * radius);
  const [left = 0, right = 0] = ends;
  const gap = textWidth(outerText(drawing), FIGURE_SIZE, 'mono') + 2 * GAP_MARGIN;
  return [
    ...ends.map((x) => extensionLine({ x, y: clear }, { x, y: y + 4 })),
    ...brokenDimension({ x: left, y }, { x: right, y }, 0.5, gap),
  ];
}

function sizeLabels(drawing: Scaled): readonly Label[] {
  return [dimensionLabel(outerText(drawing), drawing.sheet.middle.x, drawing.sheet.outerDimensionY + 4)];
}

/** The enlarged wall, where it was taken from, and its dimension set from outside. */
function glass({ sheet }: Scaled, detail: WallDetail, factor: number): readonly Shape[] {
  const { middle, radius, glass: rim } = sheet;
  const angle = (-20 * Math.PI) / 180;
  const r = Math.min(Math.max(rim.r / factor, 5), 12);
  const taken = { x: middle.x + radius * Math.cos(angle), y: middle.y + radius * Math.sin(angle) };
  const { inner, outer } = wallFaces(detail);
  const from = { x: inner.x - 22, y: inner.y };
  return [
    { kind: 'circle', ...taken, r, line: 'ink2', width: 0.9 },
    extensionLine({ x: taken.x + r, y: taken.y }, { x: rim.x - rim.r, y: rim.y - 6 }),
    ...wallDetail(detail),
    dimensionLine(from, inner),
    arrowhead(inner, from),
    dimensionLine({ x: rim.x + rim.r + 8, y: outer.y }, outer),
    arrowhead(outer, { x: outer.x + 20, y: outer.y }),
  ];
}

function wallLabel(drawing: Scaled): Label {
  const { glass: rim } = drawing.sheet;
  return dimensionLabel(wallText(drawing), rim.x + rim.r + 11, rim.y + 4, { anchor: 'start' });
}

function captions(drawing: Scaled, factor: number): readonly Label[] {
  const { tube, system, sheet } = drawing;
  const lines = [
    detailCaption(factor),
    ...(tube.boreMin === null ? [] : [`dashed: ${diameterText(tube.boreMin, system)} stays free`]),
    ...(boreFits(drawing) ? [] : [`bore ${boreText(drawing)}`]),
    `all in ${LENGTHS[system]}`,
  ];
  return lines.map((text, line) => captionLabel(text, sheet.glass.x, sheet.captionsY + 13 * line));
}

function detailCaption(factor: number): string {
  return factor === 1 ? 'wall, same scale' : `wall, drawn ${String(factor)} times as large`;
}

function describe(drawing: Scaled, factor: number): string {
  const unit = LENGTHS[drawing.system];
  const size = `${outerText(drawing)} outside, ${boreText(drawing)} bore, wall ${wallText(drawing)}, in ${unit}`;
  return `Section of the tube to scale: ${size}; ${detailCaption(factor)}`;
}
