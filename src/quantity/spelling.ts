/** Other words for a unit that stands alone or as a factor; the first word of a row is the register's. */
const WORDS: readonly string[] = [
  'm metre metres meter meters',
  'mm millimetre millimetres millimeter millimeters',
  'cm centimetre centimetres centimeter centimeters',
  'km kilometre kilometres kilometer kilometers',
  'µm um \u03bcm micron microns micrometre micrometres micrometer micrometers',
  'in inch inches " \u2033 \u201d',
  "ft foot feet ' \u2032 \u2019",
  'thou mil mils',
  'rad radian radians',
  'deg degs degree degrees °',
  'arcmin arcmins arcminute arcminutes',
  'rev revs revolution revolutions turn turns',
  'N newton newtons',
  'J joule joules',
  'Pa pascal pascals',
  'Hz hertz',
  'lb lbs pound pounds',
  'lbf lbsf',
  'kip kips',
  'kg kilogram kilograms kilogramme kilogrammes',
  'g gram grams gramme grammes',
  't tonne tonnes',
  'oz ounce ounces',
  's sec second seconds',
  'min minute minutes',
];

const WORD_OF: ReadonlyMap<string, string> = new Map(
  WORDS.flatMap((row) => {
    const words = row.split(' ');
    return words.map((word) => [word, words[0] ?? word] as const);
  }),
);

/** The other words for one factor: 'in' gives inch, inches, the double prime. */
export function otherWords(symbol: string): readonly string[] {
  return [...WORD_OF].filter(([word, first]) => first === symbol && word !== symbol).map(([word]) => word);
}

const RAISED: Readonly<Record<string, string>> = { '⁻': '-', '¹': '1', '²': '2', '³': '3', '⁴': '4' };

/** One sign for each way of joining, raising and dividing; the full stop of an abbreviation ('in.') goes. */
function plain(text: string): string {
  return text
    .replace(/\.$/, '')
    .replace(/[\u2010\u2011\u2212]/g, '-')
    .replace(/[⁻¹²³⁴]/g, (sign) => RAISED[sign] ?? sign)
    .replace(/\s+per\s+/g, '/')
    .replace(/[*.\u22c5\u2219\u2022\u00d7]/g, '·')
    .replace(/\s+/g, ' ')
    .replace(/ ?([·/^-]) ?/g, '$1');
}

interface Factor {
  readonly word: string;
  readonly exponent: number;
}

function factor(text: string): Factor | null {
  const match = /^([^\d^·/-]+)(?:\^?(-1|-?[2-4]))?$/.exec(text);
  if (match?.[1] === undefined) return null;
  return { word: WORD_OF.get(match[1]) ?? match[1], exponent: Number(match[2] ?? 1) };
}

/** A hyphen joins unless a digit follows: 'lbf-ft', but 'kg m-3'. */
const JOIN = /[· ]|-(?!\d)/;

/**
 * A unit's spelling without its accidents: 'ft-lb', 'lb ft' and 'lb·ft' give one key, 'kg/m^3', 'kg/m³' and 'kg·m-3'
 * another. Null where the text is no product with at most one divisor: 'N/mm·mm' can be read two ways and is not read.
 */
export function unitKey(text: string): string | null {
  const [top = '', bottom, ...more] = plain(text.trim()).split('/');
  if (more.length > 0) return null;
  const above = top === '1' && bottom !== undefined ? [] : top.split(JOIN).map(factor);
  const below = bottom === undefined ? [] : [factor(bottom)];
  const all = [...above, ...below.map((one) => one && { word: one.word, exponent: -one.exponent })];
  if (all.length === 0 || all.some((one) => one === null)) return null;
  return all
    .map((one) => `${one?.word ?? ''}^${one?.exponent ?? 0}`)
    .sort()
    .join(' ');
}
