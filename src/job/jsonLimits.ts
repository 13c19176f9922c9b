/** What the readers of JSON text take at most: bytes of UTF-8, and levels of nesting. */
export const JSON_LIMITS = Object.freeze({ bytes: 2_000_000, levels: 32 });

/** Bytes that a character outside ASCII takes in UTF-8, per UTF-16 unit: a surrogate pair is 2 × 2 = 4 bytes. */
function bytesOf(unit: number): number {
  if (unit < 0x80) return 1;
  return unit < 0x800 || (unit >= 0xd800 && unit < 0xe000) ? 2 : 3;
}

/** Length of a text in UTF-8, bytes. */
export function utf8Length(text: string): number {
  let bytes = 0;
  for (let i = 0; i < text.length; i++) bytes += bytesOf(text.charCodeAt(i));
  return bytes;
}
