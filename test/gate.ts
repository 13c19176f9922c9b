/**
 * The one gate, `npm test`: format, lint, types, tests; stops at the first step that fails. The last line is always
 * "N passed, N failed", where a step that fails before the tests counts as one failure.
 */
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { count, type Count } from './tally.js';

const REPORT = 'coverage/tests.json';

const STEPS: readonly (readonly [name: string, command: string, ...args: string[]])[] = [
  ['format', 'prettier', '--check', '--log-level', 'warn', '.'],
  ['lint', 'eslint', '--max-warnings', '0', '.'],
  ['types of the configuration', 'tsc', '-p', '.'],
  ['types of src', 'tsc', '-p', 'src'],
  ['types of main', 'tsc', '-p', 'main'],
  ['types of renderer', 'vue-tsc', '-p', 'renderer'],
  ['types of test', 'tsc', '-p', 'test'],
  ['types of the window tests', 'vue-tsc', '-p', 'test/renderer'],
];

/** Runs a program of the project's own; true where it ends well. What it prints goes straight to the terminal. */
function runs(command: string, args: readonly string[]): boolean {
  const { status, error } = spawnSync(command, args, { stdio: 'inherit', shell: process.platform === 'win32' });
  if (error) console.error(`${command}: ${error.message}`);
  return status === 0;
}

function check(): Count {
  for (const [name, command, ...args] of STEPS) {
    const begun = performance.now();
    if (!runs(command, args)) {
      console.error(`\n${name}: failed; what comes after it did not run.`);
      return { passed: 0, failed: 1 };
    }
    console.log(`${name}: sound (${((performance.now() - begun) / 1000).toFixed(1)} s)`);
  }
  return test();
}

function test(): Count {
  mkdirSync('coverage', { recursive: true });
  rmSync(REPORT, { force: true });
  const sound = runs('vitest', ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${REPORT}`]);
  return count(JSON.parse(readFileSync(REPORT, 'utf8')), sound);
}

function checkOrFail(): Count {
  try {
    return check();
  } catch (error) {
    console.error(error);
    return { passed: 0, failed: 1 };
  }
}

const { passed, failed } = checkOrFail();
process.exitCode = failed === 0 && passed > 0 ? 0 : 1;
console.log(`${String(passed)} passed, ${String(failed)} failed`);
