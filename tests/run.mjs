// The whole test run: format, lint, types, unit, published, build and browser tests. Each part goes on
// after a failure of another, and the last line counts all of them.
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { prepareMachine } from './setup/machine.mjs';

process.env.NEXT_TELEMETRY_DISABLED = '1';
const reports = mkdtempSync(path.join(os.tmpdir(), 'pullpost-tests-'));
const total = { passed: 0, failed: 0 };

const run = (command, args, env = {}) => {
  console.log(`\n› ${command} ${args.join(' ')}`);
  const done = spawnSync(command, args, { stdio: 'inherit', env: { ...process.env, ...env } });
  return done.status === 0;
};

/** A part without tests of its own counts as one. */
const part = (name, command, args) => {
  const ok = run(command, args);
  total[ok ? 'passed' : 'failed'] += 1;
  if (!ok) console.error(`✗ ${name}`);
  return ok;
};

/** A runner's own counts; a run that ended badly without a failed test counts as one failure. */
const count = (name, ok, read) => {
  let counts = { passed: 0, failed: 0 };
  try {
    counts = read();
  } catch (error) {
    console.error(`✗ ${name} left no report: ${error.message}`);
  }
  if (!ok && counts.failed === 0) counts.failed = 1;
  if (ok && counts.passed === 0) counts.failed += 1;
  total.passed += counts.passed;
  total.failed += counts.failed;
};

const json = (file) => JSON.parse(readFileSync(file, 'utf8'));

const { chromium } = prepareMachine();

part('format', 'npx', ['prettier', '--check', '--log-level', 'warn', '.']);
part('lint', 'npx', ['eslint', '--max-warnings', '0', '.']);
part('route types', 'npx', ['next', 'typegen']);
part('types', 'npx', ['tsc', '--noEmit', '-p', '.']);

const unitReport = path.join(reports, 'unit.json');
const unitOk = run('npx', [
  'vitest',
  'run',
  '--reporter=default',
  '--reporter=json',
  `--outputFile.json=${unitReport}`,
]);
count('unit and published tests', unitOk, () => {
  const report = json(unitReport);
  return { passed: report.numPassedTests, failed: report.numFailedTests };
});

if (part('build', 'node', ['scripts/build.mjs'])) {
  const browserReport = path.join(reports, 'browser.json');
  const browserOk = run('npx', ['playwright', 'test', '--reporter=list,json'], {
    CHROMIUM: chromium,
    PLAYWRIGHT_JSON_OUTPUT_NAME: browserReport,
  });
  count('browser tests', browserOk, () => {
    const { expected, flaky, unexpected } = json(browserReport).stats;
    return { passed: expected + flaky, failed: unexpected };
  });
}

console.log(`\n${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 ? 0 : 1);
