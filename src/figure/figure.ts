/** The colours that a figure may ask for, by the names of the palette; a painter knows what they look like. */
export type Tone = 'paper' | 'ink' | 'ink2' | 'rule' | 'hair' | 'faintFill' | 'copper';

/** How a line is drawn: whole, long-short for axes, dashed for what is not there but must stay free, dotted for equal mass, crossed for a cross-hair. */
export type Stroke = 'solid' | 'centre' | 'dashed' | 'dotted' | 'crossed';

interface Drawn {
  /** colour of the line; none where left out */
  readonly line?: Tone;
  /** px */
  readonly width?: number;
  readonly stroke?: Stroke;
  /** colour of the inside; none where left out */
  readonly fill?: Tone;
}

export interface CircleShape extends Drawn {
  readonly kind: 'circle';
  readonly x: number;
  readonly y: number;
  readonly r: number;
}

export interface PathShape extends Drawn {
  readonly kind: 'path';
  /** path data as SVG has it */
  readonly d: string;
}

export type Shape = CircleShape | PathShape;

export type Anchor = 'start' | 'middle' | 'end';

/** A line of text; (x, y) is its anchor on the base line, about which it is turned. */
export interface Label {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly anchor: Anchor;
  /** px */
  readonly size: number;
  readonly face: 'sans' | 'mono';
  readonly weight: 400 | 500;
  readonly tone: Tone;
  /** degrees, clockwise */
  readonly turn: number;
}

/** A drawing: shapes from the back to the front, labels over them with a halo of paper; px, y down. */
export interface Figure {
  readonly width: number;
  readonly height: number;
  /** what it shows, in a sentence, for those who cannot see it */
  readonly description: string;
  readonly shapes: readonly Shape[];
  readonly labels: readonly Label[];
}
