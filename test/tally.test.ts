import { describe, expect, it } from 'vitest';
import { count } from './tally.js';

const file = (status: string, ...tests: string[]): object => ({
  status,
  assertionResults: tests.map((test) => ({ status: test })),
});

const report = (success: boolean, total: number, passed: number, ...testResults: object[]): object => ({
  success,
  numTotalTests: total,
  numPassedTests: passed,
  testResults,
});

describe('count', () => {
  it('counts what passed', () => {
    expect(count(report(true, 2, 2, file('passed', 'passed', 'passed')), true)).toEqual({ passed: 2, failed: 0 });
  });

  it('counts what failed', () => {
    expect(count(report(false, 2, 1, file('failed', 'passed', 'failed')), false)).toEqual({ passed: 1, failed: 1 });
  });

  it('counts a test that was left out as failed', () => {
    expect(count(report(true, 2, 1, file('passed', 'passed', 'pending')), true)).toEqual({ passed: 1, failed: 1 });
  });

  it('counts a file that broke before its first test as failed', () => {
    const broken = report(false, 1, 1, file('passed', 'passed'), file('failed'));
    expect(count(broken, false)).toEqual({ passed: 1, failed: 1 });
  });

  it('counts a runner that ended badly as a failure though every test passed', () => {
    expect(count(report(true, 1, 1, file('passed', 'passed')), false)).toEqual({ passed: 1, failed: 1 });
  });

  it('refuses what is no report', () => {
    expect(() => count({}, true)).toThrow();
  });
});
