// A thread inherits no loader from the test runner, so that this one registers its own before it imports TypeScript.
import { register } from 'tsx/esm/api';

register();
await import('../../../main/solver/worker.ts');
