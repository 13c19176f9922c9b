import type { Job, LoadCase } from '../../src/job/job.js';
import type { Metal } from '../../src/material/material.js';

/** A steel of round numbers, with whatever the test says otherwise. */
export function metal(own: Partial<Metal> = {}): Metal {
  return {
    id: 'a-steel',
    kind: 'metal',
    name: 'a steel',
    family: 'steel',
    density: 7850,
    youngsModulus: 210e9,
    shearModulus: 81e9,
    poissonRatio: 0.3,
    tensileYield: 600e6,
    tensileUltimate: 800e6,
    shearYield: 350e6,
    shearUltimate: 480e6,
    compressiveYield: 580e6,
    wallMin: 0.5e-3,
    wallMax: null,
    wallTolerance: 0,
    jointFactor: 1,
    pricePerKilogram: null,
    source: 'round numbers',
    sizes: null,
    ...own,
  };
}

/** A load case of torque alone, with whatever the test says otherwise. */
export function load(own: Partial<LoadCase> = {}): LoadCase {
  return {
    name: 'a load',
    torque: 1000,
    bending: 0,
    axial: 0,
    reversing: null,
    twistMax: null,
    shearStressMax: null,
    yieldFactor: 1,
    ultimateFactor: 1.5,
    bucklingFactor: 1.5,
    ...own,
  };
}

/** A job a metre long under one load, with whatever the test says otherwise. */
export function job(own: Partial<Job> = {}): Job {
  return {
    format: 'wringwall-job',
    version: 1,
    title: 'a job',
    number: null,
    revision: null,
    author: null,
    note: null,
    tube: {
      length: 1,
      supportSpacing: 1,
      outerDiameterMax: null,
      outerDiameterMin: null,
      boreMin: null,
      wallMin: null,
      diameterToWallMin: 6,
      diameterToWallMax: 600,
    },
    loads: [load()],
    speed: null,
    buckling: { torsionKnockdown: 0.67, method: 'formula' },
    materials: [],
    sizes: 'any',
    hold: [],
    pick: null,
    currency: null,
    front: { against: 'twist' },
    ...own,
  };
}
