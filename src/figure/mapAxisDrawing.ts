import { shownUnit } from '../quantity/register.js';
import type { Label } from './figure.js';
import { CAPTION_SIZE, captionLabel, dimensionLabel } from './label.js';
import { polyline } from './point.js';
import type { Drafting, Part } from './mapDrafting.js';

/** Length of the marks on an axis, px. */
const MARK = 4;
const TITLE = 11;
const FIGURE = { size: CAPTION_SIZE, weight: 400, tone: 'ink2' } as const;

/** Both axes with marks outside, figures where there is room for them, and what they count. */
export function axisDrawing({ sheet, system, placing }: Drafting): Part {
  const { plot, axes, width } = sheet;
  const { left, top, right, bottom } = plot;
  const unit = shownUnit('length', system);
  const marks = [
    ...axes.outer.ticks.map(({ value }) => `M${String(sheet.x(value))} ${String(bottom)}v${String(MARK)}`),
    ...axes.wall.ticks.map(({ value }) => `M${String(left)} ${String(sheet.y(value))}h-${String(MARK)}`),
  ];
  const frame = polyline([
    { x: left, y: top - MARK },
    { x: left, y: bottom },
    { x: right, y: bottom },
  ]);
  const level = { size: TITLE, anchor: 'end' } as const;
  const titles = [
    ...firstThatFits([captionLabel(`wall, ${unit}`, left + 8, top + 4, { ...level, anchor: 'start' })], placing),
    ...firstThatFits(
      [`outer diameter, ${unit}`, unit].flatMap((text) =>
        [width - 1, right, (left + right) / 2, (2 * left + right) / 3].map((x) =>
          captionLabel(text, x, bottom + 15, level),
        ),
      ),
      placing,
    ),
  ];
  const figures: Label[] = [
    ...axes.outer.ticks.map(({ value, text }) => dimensionLabel(text, sheet.x(value), bottom + 15, FIGURE)),
    ...axes.wall.ticks.map(({ value, text }) =>
      dimensionLabel(text, left - 8, sheet.y(value) + 3.7, { ...FIGURE, anchor: 'end' }),
    ),
  ];
  const room = figures.filter((figure) => {
    if (!placing.fits([figure])) return false;
    placing.take([figure]);
    return true;
  });
  return {
    shapes: [{ kind: 'path', d: frame + marks.join(''), line: 'ink', width: 1 }],
    labels: [...titles, ...room],
  };
}

function firstThatFits(labels: readonly Label[], placing: Drafting['placing']): readonly Label[] {
  const first = labels.filter((label) => placing.fits([label])).slice(0, 1);
  placing.take(first);
  return first;
}
