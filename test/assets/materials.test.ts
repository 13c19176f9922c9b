import { describe, expect, it } from 'vitest';
import { buildLibrary } from '../../src/material/library.js';
import { readMetal } from '../../src/material/metal.js';
import { shipped } from './shipped.js';

const FILES = shipped('materials');
const LIBRARY = buildLibrary(FILES.map(({ content }) => content));
const METALS = Array.from(LIBRARY.values());

const KSI = 6894757.293168361;
const LB_PER_IN3 = 27679.90471020312;

/** Handbook values: id, Ftu, Fty, Fsu in ksi, E, G in Msi, ν, ρ in lb/in³ (MIL-HDBK-5J, from memory). */
const HANDBOOK: readonly (readonly [string, number, number, number, number, number, number, number])[] = [
  ['al-2024-t3', 64, 42, 39, 10.5, 4.0, 0.33, 0.1],
  ['al-6061-t6', 42, 35, 27, 9.9, 3.8, 0.33, 0.098],
  ['al-7075-t6', 77, 66, 46, 10.3, 3.9, 0.33, 0.101],
  ['steel-4130-n', 95, 75, 57, 29, 11, 0.32, 0.283],
  ['steel-4130-n-thick', 90, 70, 54, 29, 11, 0.32, 0.283],
  ['steel-4130-125', 125, 100, 75, 29, 11, 0.32, 0.283],
  ['steel-4130-150', 150, 132, 90, 29, 11, 0.32, 0.283],
  ['steel-4130-180', 180, 163, 108, 29, 11, 0.32, 0.283],
  ['stainless-17-4ph-h1025', 155, 145, 97, 28.5, 11.2, 0.27, 0.284],
  ['stainless-15-5ph-h1025', 155, 145, 97, 28.5, 11.2, 0.27, 0.283],
  ['stainless-304-annealed', 75, 30, 50, 29, 11.2, 0.27, 0.286],
  ['stainless-304-eighth-hard', 105, 75, 63, 29, 11.2, 0.27, 0.286],
  ['ti-6al-4v-annealed', 130, 120, 80, 16.9, 6.2, 0.31, 0.16],
  ['ti-3al-2.5v-cwsr', 125, 105, 75, 14.5, 5.8, 0.3, 0.162],
  ['mg-az31b-f', 32, 16, 17, 6.5, 2.4, 0.35, 0.0639],
  ['ni-718-sta', 170, 145, 105, 29.4, 11.4, 0.29, 0.297],
];

/** EN steels: id, ReH or Rp0.2 and least Rm in MPa; E 210 GPa, G 81 GPa, ν 0.30, ρ 7850 kg/m³ (from memory). */
const EN: readonly (readonly [string, number, number])[] = [
  ['steel-e235-n', 235, 340],
  ['steel-e255-n', 255, 440],
  ['steel-e255-sr', 375, 520],
  ['steel-e355-n', 355, 490],
  ['steel-e355-sr', 450, 580],
  ['steel-c45e-n', 340, 540],
  ['steel-s355j2h', 355, 470],
  ['steel-25crmo4-qt', 700, 900],
  ['steel-25crmo4-qt-thick', 600, 800],
  ['steel-34crmo4-qt', 800, 1000],
  ['steel-34crmo4-qt-thick', 650, 900],
  ['steel-42crmo4-qt', 900, 1100],
  ['steel-42crmo4-qt-thick', 750, 1000],
];

function metal(id: string): (typeof METALS)[number] {
  const found = LIBRARY.get(id);
  if (found === undefined) throw new Error(`no record ${id}`);
  return found;
}

describe('the shipped records', () => {
  it.each(FILES)('$name reads, under the id of its file', ({ name, content }) => {
    const result = readMetal(content, '');
    expect(result.ok ? [] : result.problems).toEqual([]);
    expect(result.ok && result.metal.id).toBe(name);
  });

  it('are those of the tables below, and no others', () => {
    const tables = [...HANDBOOK, ...EN].map(([id]) => id);
    expect(Array.from(LIBRARY.keys()).sort()).toEqual(tables.sort());
    expect(LIBRARY.size).toBeGreaterThanOrEqual(20);
  });

  it.each(HANDBOOK)('%s has the handbook values', (id, ftu, fty, fsu, e, g, nu, rho) => {
    const { tensileUltimate, tensileYield, shearUltimate, youngsModulus, shearModulus, ...rest } = metal(id);
    expect(tensileUltimate / KSI).toBeCloseTo(ftu, 9);
    expect(tensileYield / KSI).toBeCloseTo(fty, 9);
    expect(shearUltimate / KSI).toBeCloseTo(fsu, 9);
    expect(youngsModulus / KSI / 1000).toBeCloseTo(e, 9);
    expect(shearModulus / KSI / 1000).toBeCloseTo(g, 9);
    expect(rest.poissonRatio).toBe(nu);
    expect(rest.density / LB_PER_IN3).toBeCloseTo(rho, 9);
  });

  it.each(EN)('%s has the values of its EN standard', (id, yieldStrength, ultimate) => {
    const record = metal(id);
    expect(record.tensileYield / 1e6).toBeCloseTo(yieldStrength, 9);
    expect(record.tensileUltimate / 1e6).toBeCloseTo(ultimate, 9);
    expect(record.shearUltimate / record.tensileUltimate).toBeCloseTo(0.6, 9);
    expect(record).toMatchObject({ youngsModulus: 210e9, shearModulus: 81e9, poissonRatio: 0.3, density: 7850 });
    expect(record.source).toContain('Fsu: 0.6 Rm, common practice');
  });

  it.each(METALS)('$id is sound', (record) => {
    expect(record.shearUltimate).toBeLessThan(record.tensileUltimate);
    expect(record.shearYield).toBeLessThanOrEqual(1.05 * record.shearUltimate);
    const isotropic = record.youngsModulus / (2 * (1 + record.poissonRatio));
    expect(Math.abs(record.shearModulus / isotropic - 1)).toBeLessThan(0.1);
    expect(record.jointFactor).toBe(1);
    expect(record.pricePerKilogram).toBeNull();
    expect(record.sizes).toBeNull();
  });

  it.each(METALS)('$id names basis, gauge and tolerance, and owns to memory', ({ source, family }) => {
    expect(source).toMatch(/S or A basis|S basis/);
    expect(source).toContain('wallMin: ');
    expect(source).toContain('wallTolerance: ');
    expect(source).toContain('from memory');
    expect(['aluminium', 'steel', 'stainless steel', 'titanium', 'magnesium', 'nickel']).toContain(family);
  });

  it.each([
    ['al-7075-t6', 'Fsu'],
    ['stainless-17-4ph-h1025', 'Fsu'],
    ['stainless-15-5ph-h1025', 'Fsu'],
    ['stainless-304-annealed', 'Fsu'],
    ['stainless-304-eighth-hard', 'Fsu'],
    ['ni-718-sta', 'Fsu'],
    ['ti-3al-2.5v-cwsr', 'Fsu, E, G, ν and ρ'],
    ['mg-az31b-f', 'Ftu, Fty, Fsu, Fcy, E, G, ν and ρ'],
  ])('%s says that its %s is unsure', (id, values) => {
    const said = metal(id)
      .source.split(/\. (?=[A-Z])|\. (?=wall)/)
      .find((sentence) => sentence.startsWith(`${values}: `));
    expect(said).toContain('from memory, unsure, check');
  });

  it.each([
    ['al-6061-t6', 0.028 * 0.0254, 0.003 / 0.028],
    ['steel-4130-n', 0.028 * 0.0254, 0.1],
    ['stainless-304-annealed', 0.02 * 0.0254, 0.1],
    ['stainless-17-4ph-h1025', 0.0015, 0.1 / 1.5],
    ['mg-az31b-f', 0.0012, 0.2 / 1.2],
    ['steel-e235-n', 0.001, 0.1],
    ['steel-25crmo4-qt', 0.0032, 0.4 / 3.2],
    ['steel-s355j2h', 0.00165, 0.125],
  ])('%s covers the tolerance of its standard at its least gauge', (id, gauge, under) => {
    expect(metal(id).wallMin).toBeCloseTo(gauge, 12);
    expect(metal(id).wallTolerance).toBeGreaterThanOrEqual(under - 1e-12);
    expect(metal(id).wallTolerance).toBeLessThan(under + 0.01);
  });

  it('lowers the yield of magnesium to what it bears in compression', () => {
    const { compressiveYield, shearYield } = metal('mg-az31b-f');
    expect(compressiveYield / KSI).toBeCloseTo(10, 9);
    expect(shearYield).toBeLessThanOrEqual(compressiveYield / Math.sqrt(3));
    expect(shearYield).toBeGreaterThan(0.99 * (compressiveYield / Math.sqrt(3)));
  });
});
