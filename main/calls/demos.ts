import { readFile, readdir } from 'node:fs/promises';
import path from 'node:path';
import { demoJob } from '../files/assets.js';

/** The demo job that a first start shows. */
const FIRST = 'interconnect.wring.json';

/** The demo jobs as their files hold them, the one to show first leading, the others by the order of their names. */
export async function readDemos(): Promise<readonly unknown[]> {
  const all = await readdir(path.dirname(demoJob(FIRST)));
  const others = all.filter((name) => name.endsWith('.wring.json') && name !== FIRST).sort();
  const texts = await Promise.all([FIRST, ...others].map((name) => readFile(demoJob(name), 'utf8')));
  return texts.map((text): unknown => JSON.parse(text));
}
