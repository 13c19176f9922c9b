import { describe, expect, it } from 'vitest';
import { column } from '../../../src/limit/column.js';
import { job, load, metal } from '../fixtures.js';
import { at, only, tube } from './prepared.js';

const span = 3;
const long = tube({ length: 9, supportSpacing: span });
const critical = (2 * Math.PI * 210e9 * at.secondMoment) / span;
const euler = (Math.PI ** 2 * 210e9 * at.secondMoment) / span ** 2;

describe('column', () => {
  it('is n_b·T over 2πEI/Ls in pure torsion', () => {
    const check = only(column, { ...long, loads: [load({ torque: -1000 })] });
    expect(check.utilisation(at)).toBeCloseTo(1500 / critical, 12);
    const { demand, capacity, interaction } = check.pair(at);
    expect([demand, interaction]).toEqual([1500, false]);
    expect(capacity / critical).toBeCloseTo(1, 12);
  });

  it('is n_b·P over P_cr in pure thrust, elastic where the span is long', () => {
    const check = only(column, { ...long, loads: [load({ torque: 0, axial: -10_000 })] });
    expect(euler / at.area).toBeLessThan(290e6);
    expect(check.utilisation(at)).toBeCloseTo(15_000 / euler, 12);
    expect(check.pair(at).demand).toBeCloseTo(15_000, 9);
    expect(check.pair(at).capacity / euler).toBeCloseTo(1, 12);
  });

  it('passes to Fcy by the parabola where the span is short', () => {
    const check = only(column, { ...tube({ supportSpacing: 0.5 }), loads: [load({ torque: 0, axial: -10_000 })] });
    const stress = (36 * euler) / at.area;
    expect(check.pair(at).capacity / (at.area * 580e6 * (1 - 580e6 / (4 * stress)))).toBeCloseTo(1, 12);
  });

  it('satisfies n_b·P/P_cr + (n_b·T/T_cr)² = 1 with both', () => {
    const check = only(column, { ...long, loads: [load({ torque: 50_000, axial: -10_000 })] });
    const u = check.utilisation(at);
    expect(15_000 / euler / u + (75_000 / critical / u) ** 2).toBeCloseTo(1, 12);
    expect(check.pair(at).interaction).toBe(true);
  });

  it('counts no tension, and is not there without torque or thrust', () => {
    const pulled = only(column, { ...long, loads: [load({ axial: 10_000 })] });
    expect(pulled.utilisation(at)).toBeCloseTo(1500 / critical, 12);
    expect(column.prepare(job({ loads: [load({ torque: 0, axial: 1, bending: 1 })] }), metal())).toEqual([]);
  });
});
