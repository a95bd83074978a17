import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Adds up the suites' own reports; a suite that left none counts as one failure. */
const [folder, ...suites] = process.argv.slice(2);
let passed = 0;
let failed = 0;
let skipped = 0;

for (const file of readdirSync(folder).filter((name) => name.endsWith('.step'))) {
  if (readFileSync(join(folder, file), 'utf8').trim() === 'pass') passed++;
  else failed++;
}
for (const suite of suites) {
  const file = join(folder, `${suite}.json`);
  if (!existsSync(file)) {
    console.log(`${suite}: left no report`);
    failed++;
    continue;
  }
  const report = JSON.parse(readFileSync(file, 'utf8'));
  const broken = report.testResults.filter((r) => r.status === 'failed' && r.assertionResults.length === 0).length;
  passed += report.numPassedTests;
  failed += report.numFailedTests + broken;
  skipped += report.numPendingTests;
  console.log(`${suite}: ${report.numPassedTests} passed, ${report.numFailedTests + broken} failed`);
}
if (skipped > 0) console.log(`${skipped} tests were skipped, as they said`);
console.log(`${passed} passed, ${failed} failed`);
process.exit(failed > 0 || passed === 0 ? 1 : 0);
