import type { StockPoint } from '../sizing/map.js';
import type { CircleShape, Label, Shape } from './figure.js';
import { captionLabel } from './label.js';
import { polyline } from './point.js';
import type { Drafting, MapDesign, Part } from './mapDrafting.js';

/** Radius of a listed size, and half the breadth of a design in hand, px. */
const STOCK = 2.2;
const HELD = 4;

/** Listed sizes as points, hollow where they do not pass; designs in hand as small squares on end, with their names. */
export function designMarks(
  stock: readonly StockPoint[],
  held: readonly MapDesign[],
  { sheet, placing }: Drafting,
): Part {
  const dots = stock.map((size): CircleShape => {
    const fill = size.fits ? 'ink2' : 'paper';
    return { kind: 'circle', ...sheet.at(size), r: STOCK, line: 'ink2', width: 0.8, fill };
  });
  placing.avoid(stock.map((size) => sheet.at(size)));
  const inside = held.filter((design) => sheet.holds(sheet.at(design)));
  const marks = inside.map((design): Shape => {
    const { x, y } = sheet.at(design);
    const corners = [
      { x: x - HELD, y },
      { x, y: y - HELD },
      { x: x + HELD, y },
      { x, y: y + HELD },
    ];
    return {
      kind: 'path',
      d: polyline(corners, true),
      line: toneOf(design),
      width: 1.2,
      fill: design.fits ? toneOf(design) : 'paper',
    };
  });
  for (const design of inside) {
    const { x, y } = sheet.at(design);
    placing.block({ left: x - HELD, top: y - HELD, right: x + HELD, bottom: y + HELD });
  }
  return { shapes: [...dots, ...marks], labels: inside.flatMap((design) => nameOf(design, sheet, placing)) };
}

function toneOf({ picked }: MapDesign): 'copper' | 'ink' {
  return picked ? 'copper' : 'ink';
}

function nameOf(design: MapDesign, sheet: Drafting['sheet'], placing: Drafting['placing']): readonly Label[] {
  const { x, y } = sheet.at(design);
  const away = HELD + 5;
  const own = design.picked ? ({ tone: 'copper' } as const) : {};
  const tried = [
    captionLabel(design.name, x + away, y - 5, { ...own, anchor: 'start' }),
    captionLabel(design.name, x + away, y + 12, { ...own, anchor: 'start' }),
    captionLabel(design.name, x - away, y - 5, { ...own, anchor: 'end' }),
    captionLabel(design.name, x - away, y + 12, { ...own, anchor: 'end' }),
    captionLabel(design.name, x, y - 12, own),
    captionLabel(design.name, x, y + 20, own),
  ].filter((label) => placing.fits([label]));
  const best = tried.sort((a, b) => placing.covered([a]) - placing.covered([b]))[0];
  if (best === undefined) return [];
  placing.take([best]);
  return [best];
}
