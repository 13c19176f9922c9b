import type { Metal, StockRow } from '../../../src/material/material.js';
import { readMetal } from '../../../src/material/metal.js';

/** Any object of a document, open to changes. */
export type Doc = Record<string, unknown>;

/** A material record as a job file holds it. */
export function sampleRecord(id = 'alloy-1'): Doc {
  return {
    id,
    kind: 'metal',
    name: 'Alloy 1',
    family: 'aluminium',
    density: '2700 kg/m³',
    youngsModulus: '70 GPa',
    shearModulus: '26.5 GPa',
    poissonRatio: 0.33,
    tensileYield: '260 MPa',
    tensileUltimate: '310 MPa',
    shearUltimate: '200 MPa',
    wallMin: '0.6 mm',
    wallTolerance: 0.05,
    source: 'invented for this test',
  };
}

/** A sound job document, fresh at every call. */
export function sampleJob(): Doc {
  return {
    format: 'wringwall-job',
    version: 1,
    title: 'Sample',
    tube: { length: '1.40 m', outerDiameterMax: '70 mm' },
    loads: [{ name: 'jam', torque: '900 N·m', twistMax: '3 deg' }],
    materials: ['alloy-1'],
  };
}

/** A library of two materials. */
export function sampleLibrary(): ReadonlyMap<string, Metal> {
  const entries = ['alloy-1', 'alloy-2'].map((id) => {
    const read = readMetal(sampleRecord(id), '');
    if (!read.ok) throw new Error(read.problems[0]?.message);
    return [id, read.metal] as const;
  });
  return new Map(entries);
}

/** One stock list of two tubes. */
export function sampleStock(): ReadonlyMap<string, readonly StockRow[]> {
  const rows = [
    { outerDiameter: 0.05, wall: 0.0015, pricePerMetre: null },
    { outerDiameter: 0.06, wall: 0.002, pricePerMetre: 9.5 },
  ];
  return new Map([['two-tubes', rows]]);
}

/** The sample job with the value at a key path replaced, or taken away where `value` is undefined. */
export function sampleWith(path: string, value: unknown): Doc {
  const document = sampleJob();
  const keys = path.split('.');
  const last = keys.pop() ?? '';
  let place: Doc = document;
  for (const key of keys) {
    if (!Object.hasOwn(place, key)) place[key] = {};
    place = place[key] as Doc;
  }
  if (value === undefined) Reflect.deleteProperty(place, last);
  else place[last] = value;
  return document;
}
