/** A caller's mistake with a quantity; values from outside are refused by parse, not by this. */
export class QuantityError extends Error {
  override readonly name = 'QuantityError';

  constructor(
    readonly code: 'unknown-unit' | 'not-finite' | 'bad-digits',
    message: string,
  ) {
    super(message);
  }
}
