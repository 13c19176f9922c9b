import { spawnSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { rootFolder } from '../../main/files/assets.js';
import type { Report } from '../../src/report/report.js';
import type { JobDocument } from './jobs.js';

/** The command line as the build bundles it. */
const COMMAND = path.join(rootFolder(), 'dist', 'main', 'size.js');

/** The report that the command line gives for a job, by way of a file in the folder. */
export function commandLineReport(job: JobDocument, folder: string): Report {
  const file = path.join(folder, 'asked.wring.json');
  writeFileSync(file, JSON.stringify(job));
  const { stdout, stderr } = spawnSync(process.execPath, [COMMAND, file, '--json', '-', '--quiet'], {
    encoding: 'utf8',
    maxBuffer: 1e9,
  });
  if (stdout === '') throw new Error(`the command line gave no report: ${stderr}`);
  return JSON.parse(stdout) as Report;
}
