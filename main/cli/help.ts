/** What --help prints. */
export const HELP = `Finds the lightest round tube that carries a torque.

  npm run size -- JOB [--json FILE|-] [--csv FILE] [--stock FILE.csv] [--quiet]

  JOB               a job file (*.wring.json); see the README and assets/jobs
  --json FILE       write the report as JSON; "-" prints it alone on standard output
  --csv FILE        write the line-up of materials as CSV
  --stock FILE.csv  size from this list (columns outer diameter, wall, optional price
                    per metre) in place of the job's sizes
  --quiet           print no table, no notes and no progress
  --help            print this and stop
  --version         print the version and stop

Exit status: 0 a design was found; 3 the job is sound but nothing fits;
2 the job file or the call is wrong; 1 anything else.
`;
