import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { Job, LoadCase } from '../../src/job/job.js';
import type { Metal } from '../../src/material/material.js';
import type { Batch, Pace } from './kernel.js';

const SOURCE = fileURLToPath(new URL('twin.c', import.meta.url));

/** The limits in C, compiled. */
export interface Twin {
  run(job: Job, metal: Metal, batch: Batch): { readonly point: Pace; readonly box: Pace };
  remove(): void;
}

/** Compiles the twin with gcc -O2; null where there is no gcc. */
export function compileTwin(): Twin | null {
  if (spawnSync('gcc', ['--version']).status !== 0) return null;
  const folder = mkdtempSync(join(tmpdir(), 'wringwall-twin-'));
  const program = join(folder, 'twin');
  execFileSync('gcc', ['-std=c11', '-O2', SOURCE, '-o', program, '-lm']);
  return {
    run(job, metal, batch) {
      const printed = execFileSync(program, { input: numbers(job, metal, batch).join(' '), encoding: 'utf8' });
      const [point, box] = printed.trim().split('\n').map(paceOf);
      if (point === undefined || box === undefined) throw new Error('the twin printed too little');
      return { point, box };
    },
    remove() {
      rmSync(folder, { recursive: true });
    },
  };
}

function paceOf(line: string): Pace {
  const [nanoseconds = Number.NaN, sum = Number.NaN] = line.split(' ').map(Number);
  return { nanoseconds, sum };
}

/** In the order in which `read_job` and `main` of the twin take them; 0 where there is no such limit. */
function numbers(job: Job, metal: Metal, { sizes, growth, rounds }: Batch): number[] {
  const { tube, speed } = job;
  const { youngsModulus, shearModulus, poissonRatio, density, compressiveYield, jointFactor } = metal;
  const { tensileYield, tensileUltimate, shearYield, shearUltimate } = metal;
  return [
    ...[1 - metal.wallTolerance, tube.diameterToWallMin],
    ...[Math.max(metal.wallMin, tube.wallMin ?? 0), tube.outerDiameterMax ?? 0, tube.boreMin ?? 0],
    ...[tube.diameterToWallMin, tube.diameterToWallMax],
    ...[youngsModulus, shearModulus, poissonRatio, density],
    ...[tensileYield, tensileUltimate, shearYield, shearUltimate, compressiveYield, jointFactor],
    ...[tube.length, tube.supportSpacing, job.buckling.torsionKnockdown, speed === null ? 0 : speed.margin * speed.max],
    ...[job.loads.length, ...job.loads.flatMap(loadNumbers)],
    ...[sizes.length, rounds, growth, ...sizes.flatMap(([outerDiameter, wall]) => [outerDiameter, wall])],
  ];
}

function loadNumbers(load: LoadCase): number[] {
  const { torque, bending, axial, twistMax, shearStressMax, yieldFactor, ultimateFactor, bucklingFactor } = load;
  return [torque, bending, axial, twistMax ?? 0, shearStressMax ?? 0, yieldFactor, ultimateFactor, bucklingFactor];
}
