import type { UnitSystem } from '../quantity/register.js';
import { joinWords, limitLabel } from '../report/words.js';
import type { DesignMap } from '../sizing/map.js';
import type { MapPoints } from '../sizing/mapPoints.js';
import { axisDrawing } from './mapAxisDrawing.js';
import { crossHair } from './mapCrossHair.js';
import { drawnCurves } from './mapCurves.js';
import { sizeTexts } from './decimals.js';
import type { Figure, Label } from './figure.js';
import { designMarks } from './mapDesigns.js';
import type { Drafting, MapDesign } from './mapDrafting.js';
import { massCurves, massLine, massShape, type MapMetal } from './mapMass.js';
import { notes, regionNote } from './mapNotes.js';
import { regionShapes, ringsOf } from './mapRegion.js';
import type { MapSheet } from './mapSheet.js';
import { withoutNote } from './mapWithout.js';
import { Placing } from './placing.js';

/** All that a wall map shows. */
export interface WallMap {
  readonly map: DesignMap;
  readonly points: MapPoints;
  readonly metal: MapMetal;
  readonly held: readonly MapDesign[];
  /** the cross-hair is the pick's: copper, else ink */
  readonly isPick: boolean;
  /** what is said where nothing fits, line by line */
  readonly notes: readonly string[];
}

/**
 * The wall map: outer diameter against wall of one metal, every limit's boundary with its name and strokes on the side
 * that is not allowed, the region where all hold, curves of equal mass, and the optimum. Parts that come first keep their
 * places; those that follow find theirs among them, so that no label covers another.
 */
export function wallMapFigure(content: WallMap, sheet: MapSheet, system: UnitSystem): Figure {
  const { map, points, metal, held, isPick } = content;
  const { width, height } = sheet;
  const drafting = { sheet, system, placing: new Placing({ left: 0, top: 0, right: width, bottom: height }) };
  const rings = ringsOf(map, sheet);
  const masses = massCurves(metal, sheet, system);
  const curves = drawnCurves(map, points, drafting);
  drafting.placing.avoid(curves.marks);
  const cross = crossHair(points.optimum, isPick, drafting);
  const axes = axisDrawing(drafting);
  const ends = masses.flatMap(({ label }) =>
    label !== null && drafting.placing.fits([label]) ? taken(label, drafting) : [],
  );
  const without = withoutNote(points.without, drafting);
  const designs = designMarks(map.stock ?? [], held, drafting);
  const said = points.optimum === null ? notes(content.notes, drafting) : [];
  const names = curves.names(drafting.placing);
  const region = regionNote(rings, drafting);
  const own =
    points.optimum === null ? [] : [massShape(massLine(metal, points.optimum.mass, sheet), isPick ? 'copper' : 'ink2')];
  return {
    width,
    height,
    description: describe(content, system),
    shapes: [
      ...regionShapes(rings),
      ...masses.map(({ line }) => massShape(line, 'ink2')),
      ...own,
      ...axes.shapes,
      ...curves.shapes,
      ...names.shapes,
      ...designs.shapes,
      ...without.shapes,
      ...cross.shapes,
    ],
    labels: [
      ...axes.labels,
      ...ends,
      ...names.labels,
      ...region,
      ...said,
      ...designs.labels,
      ...without.labels,
      ...cross.labels,
    ],
  };
}

function taken(label: Label, { placing }: Drafting): readonly Label[] {
  placing.take([label]);
  return [label];
}

function describe({ points, map }: WallMap, system: UnitSystem): string {
  const names = joinWords([
    ...new Set(map.curves.filter(({ branches }) => branches.length > 0).map(({ limit }) => limitLabel(limit))),
  ]);
  const drawn = `Outer diameter against wall, with the boundary of ${names}`;
  if (points.optimum === null) return `${drawn}; nothing fits: ${joinWords(points.conflict.map(limitLabel))}`;
  const [outer = ''] = sizeTexts([points.optimum.outerDiameter], 'outerDiameter', system);
  const [wall = ''] = sizeTexts([points.optimum.wall], 'wall', system);
  const full =
    points.full.length === 0
      ? 'where no limit is full'
      : `where ${joinWords(points.full.map(limitLabel))} ${points.full.length === 1 ? 'is' : 'are'} full`;
  return `${drawn}; the lightest is ${outer} × ${wall}, ${full}`;
}
