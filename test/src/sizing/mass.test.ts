import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Mass } from '../../../src/sizing/mass.js';
import { Box } from '../../../src/tube/box.js';
import { OUTWARD, Span } from '../../../src/tube/span.js';
import { logReal, real } from './jobs.js';

describe('mass', () => {
  it('is that of the metal between two circles', () => {
    const outside = (Math.PI / 4) * 0.06 ** 2;
    const inside = (Math.PI / 4) * 0.052 ** 2;
    expect(new Mass(7850, 1.4).of(0.06, 0.004)).toBeCloseTo(7850 * 1.4 * (outside - inside), 12);
  });

  it('is enclosed over a box, and so are its slopes', () => {
    const mass = new Mass(2700, 2);
    const sides = fc.tuple(logReal(1e-3, 10), logReal(2.2, 500), logReal(1, 5), logReal(1, 5));
    const places = fc.array(fc.tuple(real(0, 1), real(0, 1)), { minLength: 2, maxLength: 2 });
    const enclosed = fc.property(sides, places, ([D0, slimness, growD, growT], inside) => {
      const t0 = D0 / slimness;
      const box = new Box(0.1, 2.1).set(D0, D0 * growD, t0, t0 * growT);
      const span = new Span();
      mass.bound(box, span);
      const sizes = inside.map(([u, v]) => {
        const D = D0 * growD ** u;
        return [D, Math.min(t0 * growT ** v, D / 2.1)] as const;
      });
      const [[Da, ta], [Db, tb]] = sizes as [readonly [number, number], readonly [number, number]];
      for (const [D, t] of sizes) {
        expect(mass.of(D, t)).toBeGreaterThanOrEqual(span.lo * (1 - OUTWARD));
        expect(mass.of(D, t)).toBeLessThanOrEqual(span.hi * (1 + OUTWARD));
      }
      const grown = Math.log(mass.of(Db, tb) / mass.of(Da, ta));
      const [x, y] = [Math.log(Db / Da), Math.log(tb / ta)];
      const least = Math.min(x * span.dLo, x * span.dHi) + Math.min(y * span.tLo, y * span.tHi);
      const most = Math.max(x * span.dLo, x * span.dHi) + Math.max(y * span.tLo, y * span.tHi);
      expect(grown).toBeGreaterThanOrEqual(least - 1e-9);
      expect(grown).toBeLessThanOrEqual(most + 1e-9);
    });
    fc.assert(enclosed, { numRuns: 1000, seed: 19, endOnFailure: true });
  });
});
