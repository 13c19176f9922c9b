import { readdir } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { rootFolder } from '../../main/files/assets.js';
import { loadLibrary } from '../../main/files/library.js';
import { readText } from '../../main/files/readText.js';
import { readJobText } from '../../src/job/read.js';
import { frontOf } from '../../src/sizing/front.js';
import { RUNGS } from '../../src/sizing/ladder.js';
import { least } from '../../src/sizing/least.js';
import { Problem } from '../../src/sizing/problem.js';
import { sizeJob } from '../../src/sizing/size.js';
import { FOUR_CASES, FRONT_JOBS, KERNEL_JOBS, twelveMetals, type BenchJob } from './jobs.js';
import { batch, pace, type Pace } from './kernel.js';
import { maps } from './map.js';
import { minimise, ready, type Method } from './minimiser.js';
import { atLeast, atMost, shown, table } from './table.js';
import { medianTime } from './time.js';
import { compileTwin, type Twin } from './twin.js';
import { windowTimes } from './window.js';

const KERNEL_TARGET = 0.65;
const FRONTS_TARGET = 60;
/** Turns that the two kernels take, so that a machine that slows down slows down both. */
const TURNS = 5;

const say = (text: string): void => void process.stdout.write(`${text}\n`);

/** The quickest of several medians: what else runs on the machine can only slow a kernel down. */
function quickest(paces: readonly Pace[]): Pace {
  return paces.reduce((a, b) => (b.nanoseconds < a.nanoseconds ? b : a));
}

function kernels(twin: Twin | null): string {
  const sizes = batch(40, 101);
  const rows = KERNEL_JOBS.flatMap(({ name, job, metal }) => {
    for (let i = 0; i < 3; i++) pace(job, metal, sizes);
    const turns = Array.from({ length: TURNS }, () => ({
      mine: pace(job, metal, sizes),
      its: twin?.run(job, metal, sizes) ?? null,
    }));
    return (['point', 'box'] as const).map((kind) => {
      const mine = quickest(turns.map((turn) => turn.mine[kind]));
      const its = turns.flatMap((turn) => (turn.its === null ? [] : [turn.its[kind]]));
      return [`${name}, one ${kind}`, ...paceCells(mine, its.length > 0 ? quickest(its) : null)];
    });
  });
  const heading = 'Limit evaluations, all limits and loads at one point or over one box';
  return table(heading, [['job', 'ns', 'a second', 'C, ns', 'C time / ours', 'sums agree to', 'target'], ...rows]);
}

function paceCells(mine: Pace, its: Pace | null): string[] {
  const own = [shown(mine.nanoseconds), shown(1e9 / mine.nanoseconds)];
  if (its === null) return [...own, '-', '-', '-', 'no gcc to compare with'];
  const ratio = its.nanoseconds / mine.nanoseconds;
  const apart = Math.abs(mine.sum / its.sum - 1);
  return [...own, shown(its.nanoseconds), ratio.toFixed(2), apart.toExponential(0), atLeast(ratio, KERNEL_TARGET)];
}

function optima(): string {
  const rows = FOUR_CASES.flatMap((bench) => {
    const prove = (): { evaluations: number; mass: number } => {
      const problem = new Problem(bench.job, bench.metal);
      const { found } = least(problem);
      return { evaluations: problem.evaluations, mass: found?.value ?? Number.POSITIVE_INFINITY };
    };
    const { evaluations, mass } = prove();
    const time = medianTime(200, prove);
    const target = `${atMost(evaluations, bench.target)}; striving ${atMost(evaluations, bench.striving)}`;
    return [
      [bench.name, 'optimum and proof', String(evaluations), shown(time * 1000), '', '', massText(mass), target],
      minimiserRow(bench, 'LN_COBYLA', evaluations, time),
      minimiserRow(bench, 'LD_SLSQP', evaluations, time),
    ];
  });
  const heading = 'Optimum and proof, beside minimisers of nlopt-js from five starts, which prove nothing';
  const titles = ['job', 'method', 'evaluations', 'µs', 'evaluations / ours', 'time / ours', 'mass, kg', 'target'];
  return table(heading, [titles, ...rows]);
}

function minimiserRow(bench: BenchJob, method: Method, evaluations: number, time: number): string[] {
  const its = minimise(bench, method);
  const took = medianTime(3, () => minimise(bench, method));
  const ratios = [shown(its.evaluations / evaluations), shown(took / time)];
  return ['', method, String(its.evaluations), shown(took * 1000), ...ratios, massText(its.mass), ''];
}

const massText = (mass: number): string => (mass === Number.POSITIVE_INFINITY ? 'nothing fits' : mass.toPrecision(8));

function fronts(): string {
  const metals = twelveMetals();
  const rows = FRONT_JOBS.map(({ name, job, counts }) => {
    const points = metals.reduce((sum, metal) => sum + frontOf(job, metal, null).length, 0);
    const time = medianTime(7, () => metals.map((metal) => frontOf(job, metal, null)));
    return [name, String(points), shown(time), counts ? atMost(time, FRONTS_TARGET) : ''];
  });
  const heading = `Twelve metals, each with a proven front of ${RUNGS} rungs, one core, warm`;
  return table(heading, [['job', 'points', 'ms', 'target'], ...rows]);
}

async function demos(): Promise<string> {
  const library = await loadLibrary();
  const folder = path.join(rootFolder(), 'assets', 'jobs');
  const names = (await readdir(folder)).filter((name) => name.endsWith('.json'));
  const rows: string[][] = [];
  for (const name of names.sort()) {
    const text = await readText(path.join(folder, name), name, 1e6);
    const whole = (): ReturnType<typeof sizeJob> => {
      const read = readJobText(text, library.materials, library.stock);
      if (!read.ok) throw new Error(`${name} cannot be read`);
      return sizeJob(read.brief);
    };
    const report = whole();
    const feasible = report.candidates.filter((candidate) => candidate.feasible).length;
    rows.push([
      name,
      `${feasible} of ${report.candidates.length}`,
      String(report.front.points.length),
      shown(medianTime(5, whole)),
    ]);
  }
  return table('Demo jobs whole, from their text to their report', [['job', 'fit', 'front points', 'ms'], ...rows]);
}

await ready;
const { version, arch, platform } = process;
say(
  `Node ${version}, ${platform} ${arch}, ${os.cpus()[0]?.model.trim() ?? 'unknown processor'}. Times are medians, warm; of the kernels, the quickest of ${TURNS} medians.\n`,
);
const twin = compileTwin();
if (twin === null) say('gcc is not installed: the kernel is shown without its twin in C.\n');
say(kernels(twin));
twin?.remove();
say(optima());
say(fronts());
say(maps());
say(await demos());
say(await windowTimes());
