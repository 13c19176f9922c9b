import { expect, it } from 'vitest';
import { readStartCall, START_HELP } from '../../../main/launch/startCall.js';

it('reads nothing, and each option', () => {
  expect(readStartCall([])).toEqual({ help: false, browser: false, noOpen: false });
  expect(readStartCall(['--browser'])).toMatchObject({ browser: true });
  expect(readStartCall(['--no-open'])).toMatchObject({ noOpen: true });
  expect(readStartCall(['-h'])).toMatchObject({ help: true });
});

it.each([['--nothing'], ['job.wring.json'], ['--no-open=1'], ['--']].map((argv) => [argv]))(
  'says what was expected in place of %j',
  (argv) => {
    const read = readStartCall(argv);
    if (argv[0] === '--') expect(read).toMatchObject({ help: false });
    else expect(read).toBe(`${argv.join(' ')}: not understood; expected --browser, --no-open or --help`);
  },
);

it('has help for every option', () => {
  for (const option of ['--browser', '--no-open', '--help']) expect(START_HELP).toContain(option);
});
