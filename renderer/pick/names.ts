/** A material's name in its two parts: what it is, and the form it comes in ('' where the name says none). */
export interface NameParts {
  readonly name: string;
  readonly form: string;
}

/** "Aluminium 2024-T3, drawn tube": the form is what follows the first comma. */
export function nameParts(full: string): NameParts {
  const comma = full.indexOf(', ');
  return comma < 0 ? { name: full, form: '' } : { name: full.slice(0, comma), form: full.slice(comma + 2) };
}

const ORDINALS = [
  'first',
  'second',
  'third',
  'fourth',
  'fifth',
  'sixth',
  'seventh',
  'eighth',
  'ninth',
  'tenth',
  'eleventh',
  'twelfth',
];

const ENDINGS = new Map([
  ['one', 'st'],
  ['two', 'nd'],
  ['few', 'rd'],
]);

const rules = new Intl.PluralRules('en-GB', { type: 'ordinal' });

/** "second", "21st". */
export function ordinal(place: number): string {
  return ORDINALS[place - 1] ?? `${String(place)}${ENDINGS.get(rules.select(place)) ?? 'th'}`;
}
