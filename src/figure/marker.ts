/** Shape that tells a family apart where colours do not. */
export type MarkerShape = 'circle' | 'square' | 'triangle' | 'diamond' | 'cross' | 'plus';

/** How members of one family differ: the first three as the drawing rules have them, the rest for longer lists. */
export const MARKER_FILLS = ['full', 'open', 'half', 'dot', 'left', 'right'] as const;
export type MarkerFill = (typeof MARKER_FILLS)[number];

/** How the lines of one family differ. */
export const LINE_STYLES = ['solid', 'dashed', 'dotted'] as const;
export type LineStyle = (typeof LINE_STYLES)[number];

/** Shape of each family that has a colour of its own; any other takes the plus. */
const SHAPES: ReadonlyMap<string, MarkerShape> = new Map([
  ['aluminium', 'circle'],
  ['steel', 'square'],
  ['titanium', 'triangle'],
  ['carbon/epoxy', 'diamond'],
  ['glass/epoxy', 'cross'],
]);

/** How a material is told apart wherever it is drawn. */
export interface Mark {
  /** family as the record names it: it gives the colour */
  readonly family: string;
  readonly shape: MarkerShape;
  readonly fill: MarkerFill;
  readonly line: LineStyle;
}

/** The shape of a family; the plus for one that nobody foresaw. */
export function markerShape(family: string): MarkerShape {
  return SHAPES.get(family) ?? 'plus';
}

/** The mark of the member of a family that stands at this place (0 first) in the job's list. */
export function markAt(family: string, place: number): Mark {
  const turn = Math.floor(place / LINE_STYLES.length);
  return {
    family,
    shape: markerShape(family),
    fill: MARKER_FILLS[place % MARKER_FILLS.length] ?? 'full',
    line: LINE_STYLES[(place + turn) % LINE_STYLES.length] ?? 'solid',
  };
}

/** The marks of a list of materials, by id: members of one family in the order of the list. */
export function marksOf(materials: readonly { readonly id: string; readonly family: string }[]): Map<string, Mark> {
  const places = new Map<string, number>();
  return new Map(
    materials.map(({ id, family }) => {
      const place = places.get(family) ?? 0;
      places.set(family, place + 1);
      return [id, markAt(family, place)];
    }),
  );
}
