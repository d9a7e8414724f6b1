/**
 * Adds up the reports of the unit and the browser tests and prints "N passed, N failed" as the last line.
 * Fails when a test failed, when a report is missing, or when a report holds no test that passed.
 */
import { readFileSync } from 'node:fs';
import process from 'node:process';

const REPORTS = [
  { file: 'test-results/unit.json', read: fromVitest },
  { file: 'test-results/browser.json', read: fromPlaywright }
];

function fromVitest(report) {
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests,
    skipped: report.numPendingTests + report.numTodoTests,
    broken: report.success === false && report.numFailedTests === 0
  };
}

function fromPlaywright({ stats, errors }) {
  return {
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky,
    skipped: stats.skipped,
    broken: errors.length > 0
  };
}

try {
  const total = { passed: 0, failed: 0, skipped: 0 };
  const faults = [];
  for (const { file, read } of REPORTS) {
    const count = read(JSON.parse(readFileSync(new URL(`../${file}`, import.meta.url), 'utf8')));
    if (!(count.passed > 0)) faults.push(`${file}: no test passed`);
    if (count.broken) faults.push(`${file}: something broke outside the tests`);
    for (const key of Object.keys(total)) total[key] += count[key];
  }
  for (const fault of faults) console.error(fault);
  console.log(
    `${total.passed} passed, ${total.failed} failed` + (total.skipped ? `, ${total.skipped} skipped` : '')
  );
  if (faults.length || total.failed) process.exitCode = 1;
} catch (trouble) {
  console.error(trouble instanceof Error ? trouble.message : String(trouble));
  process.exitCode = 1;
}
