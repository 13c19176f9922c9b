import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readMetal } from '../../../src/material/metal.js';
import { METAL_KEYS } from '../../../src/material/metalKeys.js';
import { messagesOf, SAMPLE, sampleWith, sampleWithout } from './sample.js';

describe('a metal record', () => {
  it('is read into SI units with every default written out', () => {
    expect(readMetal(SAMPLE, '')).toEqual({
      ok: true,
      metal: {
        id: 'alloy',
        kind: 'metal',
        name: 'Alloy',
        family: 'aluminium',
        density: 2700,
        youngsModulus: 70e9,
        shearModulus: 26e9,
        poissonRatio: 0.33,
        tensileYield: 260e6,
        tensileUltimate: 310e6,
        shearYield: 260e6 * (1 / Math.sqrt(3)),
        shearUltimate: 200e6,
        compressiveYield: 260e6,
        wallMin: 0.0006,
        wallMax: null,
        wallTolerance: 0.1,
        jointFactor: 1,
        pricePerKilogram: null,
        source: 'invented',
        sizes: null,
      },
      units: {
        density: 'kg/m³',
        youngsModulus: 'GPa',
        shearModulus: 'GPa',
        tensileYield: 'MPa',
        tensileUltimate: 'MPa',
        shearUltimate: 'MPa',
        wallMin: 'mm',
      },
    });
  });

  it('says more where it says more', () => {
    const record = sampleWith({
      shearYield: '20 ksi',
      compressiveYield: '240 MPa',
      jointFactor: 0.5,
      pricePerKilogram: 6.5,
      sizes: 'any',
    });
    const result = readMetal(record, 'materials.2');
    expect(result.ok && result.metal).toMatchObject({
      compressiveYield: 240e6,
      jointFactor: 0.5,
      pricePerKilogram: 6.5,
      sizes: 'any',
    });
    expect(result.ok && result.metal.shearYield).toBeCloseTo(20 * 6894757.293168361, 3);
    expect(result.ok && result.units['materials.2.shearYield']).toBe('ksi');
  });

  it('takes its own sizes from a shipped list or from rows', () => {
    const rows = [{ outerDiameter: 0.05, wall: 0.001, pricePerMetre: null }];
    const named = readMetal(sampleWith({ sizes: { stock: 'metric' } }), '', new Map([['metric', rows]]));
    expect(named.ok && named.metal.sizes).toEqual({ stock: rows });
    const written = readMetal(sampleWith({ sizes: { stock: [{ outerDiameter: '50 mm', wall: '1 mm' }] } }), '');
    expect(written.ok && written.metal.sizes).toEqual({ stock: rows });
  });
});

const TABLE: readonly (readonly [Readonly<Record<string, unknown>>, string])[] = [
  [{ densty: 1 }, 'm.densty: "densty" is not a key of a metal record; expected "density"'],
  [{ kind: 'wood' }, 'm.kind: "wood" is not a kind of material; expected "metal"'],
  [{ id: '' }, 'm.id: "" is empty; expected text of 1 to 80 characters'],
  [{ name: 4 }, 'm.name: 4 is not text; expected text of 1 to 200 characters'],
  [{ density: 2700 }, 'm.density: 2700 has no unit; expected a density such as "2710 kg/m³"'],
  [{ density: '2700 kg' }, 'm.density: "2700 kg" is a mass; expected a density such as "2710 kg/m³"'],
  [
    { density: '-1 kg/m³' },
    'm.density: "-1 kg/m³" is out of range; expected a density from 100 kg/m³ to 30000 kg/m³, such as "2710 kg/m³"',
  ],
  [
    { density: '99 kg/m³' },
    'm.density: "99 kg/m³" is out of range; expected a density from 100 kg/m³ to 30000 kg/m³, such as "2710 kg/m³"',
  ],
  [
    { youngsModulus: '2001 GPa', shearModulus: '760 GPa' },
    'm.youngsModulus: "2001 GPa" is out of range; expected a modulus from 0.1 GPa to 2000 GPa, such as "68.3 GPa"',
  ],
  [
    { shearModulus: '50 MPa' },
    'm.shearModulus: "50 MPa" is out of range; expected a modulus from 0.1 GPa to 2000 GPa, such as "68.3 GPa"',
  ],
  [
    { shearModulus: '70 GPa' },
    'm.shearModulus: "70 GPa" does not go with E and ν; expected a modulus within 25 % of E/(2(1 + ν))',
  ],
  [
    { shearModulus: '19 GPa' },
    'm.shearModulus: "19 GPa" does not go with E and ν; expected a modulus within 25 % of E/(2(1 + ν))',
  ],
  [{ poissonRatio: 0.5 }, 'm.poissonRatio: 0.5 is out of range; expected a number above 0 and below 0.5'],
  [{ poissonRatio: 0 }, 'm.poissonRatio: 0 is out of range; expected a number above 0 and below 0.5'],
  [{ poissonRatio: '0.3' }, 'm.poissonRatio: "0.3" is not a number; expected a number above 0 and below 0.5'],
  [
    { tensileYield: '0 MPa' },
    'm.tensileYield: "0 MPa" is out of range; expected a strength from 1 MPa to 10 GPa, such as "241 MPa"',
  ],
  [
    { tensileUltimate: '259 MPa' },
    'm.tensileUltimate: "259 MPa" is under the yield strength; expected an ultimate strength of at least tensileYield',
  ],
  [
    { shearUltimate: '11 GPa' },
    'm.shearUltimate: "11 GPa" is out of range; expected a strength from 1 MPa to 10 GPa, such as "241 MPa"',
  ],
  [
    { shearYield: '201 MPa' },
    'm.shearYield: "201 MPa" is over the ultimate shear strength; expected a shear yield of at most shearUltimate',
  ],
  [
    { compressiveYield: '0.2 GPaa' },
    'm.compressiveYield: "0.2 GPaa" has an unknown unit (did you mean "GPa"?); expected a stress or modulus such as "240 MPa"',
  ],
  [{ wallMin: '0 mm' }, 'm.wallMin: "0 mm" is out of range; expected a wall from 0.001 mm to 1 m, such as "0.7 mm"'],
  [{ wallTolerance: 0.51 }, 'm.wallTolerance: 0.51 is out of range; expected a number from 0 to 0.5'],
  [{ wallTolerance: -0.1 }, 'm.wallTolerance: -0.1 is out of range; expected a number from 0 to 0.5'],
  [{ jointFactor: 0 }, 'm.jointFactor: 0 is out of range; expected a number above 0 and at most 1'],
  [{ jointFactor: 1.1 }, 'm.jointFactor: 1.1 is out of range; expected a number above 0 and at most 1'],
  [{ pricePerKilogram: -1 }, 'm.pricePerKilogram: -1 is out of range; expected a number from 0 to 1000000000'],
  [{ source: ' ' }, 'm.source: " " is empty; expected text of 1 to 4000 characters'],
  [
    { sizes: 'some' },
    'm.sizes: "some" is not a choice of sizes; expected "any" or { "stock": … } with the id or the rows of a stock list',
  ],
  [{ kind: 'laminate' }, 'm.kind: "laminate" is a kind of material that this version cannot size; expected "metal"'],
];

describe('a faulty metal record', () => {
  it.each(TABLE)('is refused: %j', (change, message) => {
    expect(messagesOf(readMetal(sampleWith(change), 'm'))).toEqual([message]);
  });

  it.each(Object.keys(SAMPLE))('is refused without %s', (key) => {
    const messages = messagesOf(readMetal(sampleWithout(key), 'm'));
    expect(messages).toHaveLength(1);
    expect(messages[0]).toMatch(new RegExp(`^m\\.${key}: is missing; expected `));
  });

  it('tells all its mistakes together, in the order of its keys', () => {
    const record = sampleWith({ wallMin: '1 kg', density: 3, poissonRatio: 2, nam: 'x' });
    expect(messagesOf(readMetal(record, '')).map((message) => message.split(':')[0])).toEqual([
      'nam',
      'density',
      'poissonRatio',
      'wallMin',
    ]);
  });

  it.each([undefined, null, 3, 'metal', [], true])('is refused where it is %j', (record) => {
    expect(messagesOf(readMetal(record, 'm'))).toHaveLength(1);
  });
});

describe('any JSON at all', () => {
  const own = fc.dictionary(fc.constantFrom(...METAL_KEYS), fc.jsonValue());
  it('is read or refused, never thrown at', () => {
    fc.assert(
      fc.property(fc.oneof(fc.jsonValue(), own), own, (value, change) => {
        const result = readMetal(value, 'm');
        expect(result.ok).toBe(false);
        expect(messagesOf(result).length).toBeGreaterThan(0);
        const changed = readMetal(sampleWith(change), 'm');
        expect(changed.ok).toBe(messagesOf(changed).length === 0);
      }),
    );
  });
});
