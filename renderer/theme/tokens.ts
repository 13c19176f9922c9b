/** Colours of one theme, as #RRGGBB, or #RRGGBBAA where the colour lets the sheet shine through. */
export interface Colours {
  /** The desk outside the frame line. */
  readonly sheet: string;
  /** The sheet itself; the halo behind labels. */
  readonly paper: string;
  /** Text, frame line, axes, limits that close the region. */
  readonly ink: string;
  /** Captions, units of axes, other limits, leaders; a family that has no colour of its own. */
  readonly ink2: string;
  /** Hairlines between stations and under headings. */
  readonly rule: string;
  /** Table rows, chart grid, hatching of the region. */
  readonly hair: string;
  /** The region where every limit holds, a row under the pointer, a field in focus. */
  readonly faintFill: string;
  /** Underline of a field, tick box. */
  readonly field: string;
  /** Bars that do not govern. */
  readonly bar: string;
  /** Only the chosen design and what governs it. */
  readonly copper: string;
  /** The row of the chosen design. */
  readonly copperFill: string;
  /** Only an error, always with the flag mark and a sentence. */
  readonly pencil: string;
}

/** The colour of a family of materials in each theme; its shape is the figure's. */
export interface Family {
  readonly paper: string;
  readonly blueprint: string;
}

/** Everything that colours the window: two themes, and the families of materials by the name in their records. */
export interface Tokens {
  /** Dark ink on cream; print is always this theme on white. */
  readonly paper: Colours;
  /** Light lines on blue. */
  readonly blueprint: Colours;
  readonly families: Readonly<Record<string, Family>>;
}

const paper: Colours = Object.freeze({
  sheet: '#EFE9DC',
  paper: '#FBF7EE',
  ink: '#14284B',
  ink2: '#4A5B7A',
  rule: '#14284B40',
  hair: '#14284B24',
  faintFill: '#14284B0A',
  field: '#14284B8C',
  bar: '#14284B85',
  copper: '#A84E12',
  copperFill: '#A84E1212',
  pencil: '#B3202F',
});

const blueprint: Colours = Object.freeze({
  sheet: '#081427',
  paper: '#0C1B33',
  ink: '#DCE7F5',
  ink2: '#9FB3CF',
  rule: '#B9D0EE4D',
  hair: '#B9D0EE2B',
  faintFill: '#B9D0EE0D',
  field: '#B9D0EE85',
  bar: '#B9D0EE80',
  copper: '#F0A468',
  copperFill: '#F0A46817',
  pencil: '#FF9A94',
});

const family = (onPaper: string, onBlueprint: string): Family =>
  Object.freeze({ paper: onPaper, blueprint: onBlueprint });

/** The palette, in one place: the window, its charts and the memo read it from here. */
export const TOKENS: Tokens = Object.freeze({
  paper,
  blueprint,
  families: Object.freeze({
    aluminium: family('#1A6EA6', '#8CC6EC'),
    steel: family('#2B3CA6', '#7A8CF5'),
    titanium: family('#8C1F64', '#E871A9'),
    'carbon/epoxy': family('#047A5A', '#54DDB2'),
    'glass/epoxy': family('#534A18', '#D0D65A'),
  }),
});
