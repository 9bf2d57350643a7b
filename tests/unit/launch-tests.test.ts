import { describe, expect, test } from 'vitest';
import { planTests } from '#server/launch/test-plan.mjs';
import { sumTallies, tallyReport } from '#server/launch/test-report.mjs';

describe('the arguments of npm test', () => {
  test('none: everything', () => {
    expect(planTests([])).toEqual({ projects: ['unit', 'property', 'api', 'e2e'], hasChecks: true, filters: [] });
  });

  test('one project with filters: that alone, without types and lint', () => {
    const expected = { projects: ['api'], hasChecks: false, filters: ['questions', '-t', 'refuses'] };
    expect(planTests(['--project', 'api', 'questions', '-t', 'refuses'])).toEqual(expected);
    expect(planTests(['questions', '--project=api', '-t', 'refuses'])).toEqual(expected);
  });

  test('without the browser: everything else', () => {
    expect(planTests(['--without', 'e2e'])).toEqual({
      projects: ['unit', 'property', 'api'],
      hasChecks: true,
      filters: [],
    });
  });

  test.each([[['--project', 'nonesuch']], [['--project']], [['--without', 'types']]])('%j is refused', (args) => {
    expect(() => planTests(args)).toThrow('choose among');
  });
});

describe('the closing count', () => {
  const file = (status: string, ...tests: string[]) => ({
    status,
    assertionResults: tests.map((each) => ({ status: each })),
  });

  test('counts tests that passed and failed, not those passed over', () => {
    const report = {
      success: false,
      testResults: [file('failed', 'passed', 'failed', 'pending'), file('passed', 'passed')],
    };
    expect(tallyReport(report, 1)).toEqual({ passed: 2, failed: 1 });
  });

  test('counts a file that could not be collected as one failure', () => {
    const report = { success: false, testResults: [file('failed'), file('failed', 'passed')] };
    expect(tallyReport(report, 1)).toEqual({ passed: 1, failed: 2 });
  });

  test('never reads a failed or missing run as a good one', () => {
    expect(tallyReport(undefined, 0)).toEqual({ passed: 0, failed: 1 });
    expect(tallyReport({ success: true, testResults: [file('passed', 'passed')] }, 1)).toEqual({
      passed: 1,
      failed: 1,
    });
    expect(tallyReport({ success: false, testResults: [] }, 0)).toEqual({ passed: 0, failed: 1 });
  });

  test('sums up', () => {
    expect(
      sumTallies([
        { passed: 2, failed: 0 },
        { passed: 1, failed: 3 },
      ]),
    ).toEqual({ passed: 3, failed: 3 });
    expect(sumTallies([])).toEqual({ passed: 0, failed: 0 });
  });
});
