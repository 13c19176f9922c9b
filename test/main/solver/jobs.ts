/** A job document of the tests: what a job file holds. */
export type JobDocument = Readonly<Record<string, unknown>>;

/** A sound job of three metals, with one load case. */
export function jobOf(own: JobDocument = {}, torque = '620 N·m'): JobDocument {
  return {
    format: 'wringwall-job',
    version: 1,
    title: 'Shaft of the tests',
    tube: { length: '1.8 m', outerDiameterMax: '110 mm' },
    loads: [{ name: 'only', torque, twistMax: '2 deg/m' }],
    materials: ['al-6061-t6', 'steel-4130-n', 'ti-6al-4v-annealed'],
    ...own,
  };
}

/** Metals that differ in strength, as inline records. */
export function metals(count: number): readonly JobDocument[] {
  return Array.from({ length: count }, (_, index) => ({
    id: `alloy-${String(index)}`,
    kind: 'metal',
    name: `Alloy ${String(index)}`,
    family: 'aluminium',
    density: `${String(2700 + 5 * index)} kg/m³`,
    youngsModulus: '69 GPa',
    shearModulus: '26 GPa',
    poissonRatio: 0.33,
    tensileYield: `${String(200 + 5 * index)} MPa`,
    tensileUltimate: `${String(260 + 5 * index)} MPa`,
    shearUltimate: `${String(160 + 3 * index)} MPa`,
    wallMin: '0.7 mm',
    wallTolerance: 0.1,
    pricePerKilogram: 6 + index,
    source: 'made up for a test',
  }));
}

/** Load cases that pull in different ways. */
export function loadCases(count: number): readonly JobDocument[] {
  return Array.from({ length: count }, (_, index) => ({
    name: `case ${String(index)}`,
    torque: `${String(300 + 20 * index)} N·m`,
    bending: `${String(5 * index)} N·m`,
    axial: `${String(-200 * (index % 7))} N`,
    twistMax: '4 deg/m',
  }));
}
