import { machineDesk } from './machine.js';
import { run } from './run.js';

process.exitCode = await run(process.argv.slice(2), machineDesk());
