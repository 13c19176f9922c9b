/** Share of the stretch at which a root is close enough. */
const CLOSE = 1e-13;
/** What counts as nought, of a logarithm. */
const NOUGHT = 2e-14;
const STEPS = 100;

/**
 * The share s in [0, 1] at which f(s) = 0, given f(0) and f(1) of opposite signs: false position with the weights of
 * Anderson & Björck 1973 (from memory), and a halving where that is slow.
 */
export function rootBetween(f: (s: number) => number, f0: number, f1: number): number {
  let [a, fa, b, fb] = [0, f0, 1, f1];
  for (let step = 0; step < STEPS && Math.abs(b - a) > CLOSE; step++) {
    if (Math.abs(fa) <= NOUGHT) return a;
    if (Math.abs(fb) <= NOUGHT) return b;
    const s = step % 8 === 7 ? (a + b) / 2 : (a * fb - b * fa) / (fb - fa);
    const fs = f(s);
    if (fs > 0 === fb > 0) {
      const kept = 1 - fs / fb;
      fa *= kept > 0 ? kept : 0.5;
    } else [a, fa] = [b, fb];
    [b, fb] = [s, fs];
  }
  return b;
}
