import { type Axis, partOf, type Tick } from './axis.js';

/** A tick where the drawing has it. */
export interface DrawnTick extends Tick {
  /** px */
  readonly at: number;
}

/** Clear room between two figures of an axis, px. */
const CLEAR = 10;

/** Where the ticks of an axis stand: the densest choice whose figures do not touch, thinned where none is clear. */
export function ticksOf(axis: Axis, from: number, to: number, breadth: (tick: Tick) => number): readonly DrawnTick[] {
  const drawn = axis.choices.map((ticks) =>
    ticks.map((tick) => ({ ...tick, at: from + partOf(axis, tick.value) * (to - from) })),
  );
  return drawn.find((ticks) => areClear(ticks, breadth)) ?? thinned(drawn.at(-1) ?? [], breadth);
}

function apart(a: DrawnTick, b: DrawnTick, breadth: (tick: Tick) => number): boolean {
  return Math.abs(b.at - a.at) >= (breadth(a) + breadth(b)) / 2 + CLEAR;
}

function areClear(ticks: readonly DrawnTick[], breadth: (tick: Tick) => number): boolean {
  return ticks.every((tick, index) => index === 0 || apart(ticks[index - 1]!, tick, breadth));
}

function thinned(ticks: readonly DrawnTick[], breadth: (tick: Tick) => number): readonly DrawnTick[] {
  const kept: DrawnTick[] = [];
  for (const tick of ticks) {
    const last = kept.at(-1);
    if (last === undefined || apart(last, tick, breadth)) kept.push(tick);
  }
  return kept;
}

/** The ticks without those that a figure of its own, at a place and of a breadth, would touch. */
export function without(
  ticks: readonly DrawnTick[],
  at: number,
  own: number,
  breadth: (tick: Tick) => number,
): readonly DrawnTick[] {
  return ticks.filter((tick) => Math.abs(tick.at - at) >= (breadth(tick) + own) / 2 + CLEAR / 2);
}
