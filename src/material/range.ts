/** Ends of a range, closed (`atLeast`, `atMost`) or open (`above`, `below`); an end left out is unbounded. */
export interface Range<B> {
  readonly atLeast?: B;
  readonly above?: B;
  readonly atMost?: B;
  readonly below?: B;
}

/** Whether a finite value lies in the range; NaN and infinities never do. */
export function isInside(value: number, range: Range<number>): boolean {
  const { atLeast = -Infinity, above = -Infinity, atMost = Infinity, below = Infinity } = range;
  return Number.isFinite(value) && value >= atLeast && value > above && value <= atMost && value < below;
}

/** The range in words: "from 1 MPa to 10 GPa", "above 0 and below 0.5", or empty where it has no end. */
export function rangeText(range: Range<string | number>): string {
  if (range.atLeast !== undefined && range.atMost !== undefined) return `from ${range.atLeast} to ${range.atMost}`;
  const ends = [
    ['above', range.above],
    ['at least', range.atLeast],
    ['below', range.below],
    ['at most', range.atMost],
  ].filter(([, end]) => end !== undefined);
  return ends.map(([word, end]) => `${word} ${end}`).join(' and ');
}
