import { describe, expect, it } from 'vitest';
import { countStep, countVitest, exitCodeOf, summarise } from '../../scripts/lib/results.mjs';

const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((test) => ({ status: test })),
});

describe('counting a vitest run', () => {
  it('takes the numbers of a good run', () => {
    const report = {
      numPassedTests: 2,
      numFailedTests: 0,
      testResults: [file('passed', 'passed', 'passed')],
    };
    expect(countVitest('unit', report, 0)).toMatchObject({ passed: 2, failed: 0 });
  });

  it('counts a file that broke before its tests as one failure', () => {
    const report = {
      numPassedTests: 1,
      numFailedTests: 1,
      testResults: [file('failed'), file('failed', 'failed'), file('passed', 'passed')],
    };
    expect(countVitest('unit', report, 1)).toMatchObject({ passed: 1, failed: 2 });
  });

  it('counts a file whose clean-up broke after good tests', () => {
    const report = { numPassedTests: 1, numFailedTests: 0, testResults: [file('failed', 'passed')] };
    expect(countVitest('unit', report, 1)).toMatchObject({ passed: 1, failed: 1 });
  });

  it('is a failure when vitest failed outside its tests', () => {
    const report = { numPassedTests: 1, numFailedTests: 0, testResults: [file('passed', 'passed')] };
    expect(countVitest('unit', report, 1)).toMatchObject({ passed: 1, failed: 1 });
    expect(countVitest('unit', report, null)).toMatchObject({ passed: 1, failed: 1 });
  });

  it('is a failure when no test ran, skipped ones included', () => {
    expect(countVitest('api', { numPassedTests: 0, numFailedTests: 0, testResults: [] }, 0).failed).toBe(1);
    const skipped = { numPassedTests: 0, numFailedTests: 0, numPendingTests: 3, testResults: [] };
    expect(countVitest('api', skipped, 0)).toMatchObject({ failed: 1, skipped: 3 });
  });

  it('is a failure without a report', () => {
    expect(countVitest('browser', null, 0)).toMatchObject({ passed: 0, failed: 1 });
  });
});

describe('the closing line', () => {
  it('adds all parts up and stands last, alone', () => {
    const sum = summarise([
      countStep('lint', true),
      countStep('types', false),
      { name: 'unit', passed: 40, failed: 2, skipped: 1 },
    ]);
    expect(sum.lines.at(-1)).toBe('41 passed, 3 failed');
    expect(sum.lines).toHaveLength(4);
  });

  it('goes with the exit code: 0 only when something passed and nothing failed', () => {
    expect(exitCodeOf({ passed: 3, failed: 0 })).toBe(0);
    expect(exitCodeOf({ passed: 3, failed: 1 })).toBe(1);
    expect(exitCodeOf({ passed: 0, failed: 0 })).toBe(1);
  });
});
