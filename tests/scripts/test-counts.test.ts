import { describe, expect, it } from 'vitest';
import { countOne, countPlaywright, countVitest, sumCounts } from '@/scripts/setup/test-counts.mjs';
import { chosenStages } from '@/scripts/setup/test-stages.mjs';

const passedFile = { status: 'passed', assertionResults: [{ status: 'passed' }] };
const failedFile = { status: 'failed', assertionResults: [{ status: 'passed' }, { status: 'failed' }] };
const brokenFile = { status: 'failed', assertionResults: [] };

describe('counting what passed and failed', () => {
  it('takes a check without cases as one', () => {
    expect(countOne(0)).toEqual({ passed: 1, failed: 0 });
    expect(countOne(2)).toEqual({ passed: 0, failed: 1 });
  });

  it('adds the files that failed outside their tests', () => {
    const report = {
      numPassedTests: 2,
      numFailedTests: 1,
      testResults: [passedFile, failedFile, brokenFile],
    };
    expect(countVitest(report, 1)).toEqual({ passed: 2, failed: 2 });
  });

  it('never calls a failed run good', () => {
    const clean = { numPassedTests: 1, numFailedTests: 0, testResults: [passedFile] };
    expect(countVitest(clean, 0)).toEqual({ passed: 1, failed: 0 });
    expect(countVitest(clean, 1)).toEqual({ passed: 1, failed: 1 });
    expect(countVitest(null, 0)).toEqual({ passed: 0, failed: 1 });
    expect(countPlaywright(null, 0)).toEqual({ passed: 0, failed: 1 });
    const nothing = { stats: { expected: 0, unexpected: 0, flaky: 0, skipped: 0 } };
    expect(countPlaywright(nothing, 1)).toEqual({ passed: 0, failed: 1 });
  });

  it('counts a browser test that passed only when repeated as failed, and one left out as neither', () => {
    const report = { stats: { expected: 5, unexpected: 1, flaky: 2, skipped: 3 } };
    expect(countPlaywright(report, 1)).toEqual({ passed: 5, failed: 3 });
  });

  it('adds up', () => {
    expect(sumCounts([])).toEqual({ passed: 0, failed: 0 });
    expect(
      sumCounts([
        { passed: 1, failed: 2 },
        { passed: 10, failed: 0 },
      ]),
    ).toEqual({ passed: 11, failed: 2 });
  });
});

describe('choosing stages', () => {
  it('runs all when none is named, and named ones in their own order', () => {
    expect(chosenStages([])).toEqual(['lint', 'types', 'unit', 'integration', 'browser']);
    expect(chosenStages(['--only', 'unit,lint'])).toEqual(['lint', 'unit']);
  });

  it.each([['--only'], ['--only', 'units'], ['unit'], ['--only', '']])(
    'explains itself for %j',
    (...args) => {
      expect(() => chosenStages(args)).toThrow('Usage: npm test');
    },
  );
});
