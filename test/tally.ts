import { z } from 'zod';

/** How many tests passed and failed. */
export interface Count {
  readonly passed: number;
  readonly failed: number;
}

const report = z.object({
  success: z.boolean(),
  numTotalTests: z.int().nonnegative(),
  numPassedTests: z.int().nonnegative(),
  testResults: z.array(z.object({ status: z.string(), assertionResults: z.array(z.object({ status: z.string() })) })),
});

/**
 * Counts a JSON report of the test runner. A test that did not run counts as failed, so does a file that broke before
 * its first test or outside its tests, and a run that ends badly for whatever other reason never counts as clean.
 *
 * @param json the report as parsed, nothing about it assumed
 * @param sound whether the runner itself ended with status 0
 */
export function count(json: unknown, sound: boolean): Count {
  const { success, numTotalTests, numPassedTests, testResults } = report.parse(json);
  const broken = testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.every((test) => test.status !== 'failed'),
  );
  const failed = numTotalTests - numPassedTests + broken.length;
  return { passed: numPassedTests, failed: success && sound ? failed : Math.max(1, failed) };
}
