// A gate is one command that must pass; a suite is a gate whose tests are counted from its JSON report.
import { readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { run } from './run.mjs';
import { say, seconds } from './say.mjs';

const reportPath = (name) => join(tmpdir(), `fairlead-${process.pid}-${name}.json`);

/** Vitest and jest write the same report: numPassedTests, numFailedTests, testResults[].assertionResults[]. */
function readReport(path) {
  try {
    const report = JSON.parse(readFileSync(path, 'utf8'));
    const failures = report.testResults.flatMap((file) => {
      const failed = file.assertionResults.filter((test) => test.status === 'failed');
      if (failed.length === 0 && file.status === 'failed') {
        return [{ name: file.name, text: file.message ?? 'the file did not run' }];
      }
      return failed.map((test) => ({
        name: `${file.name} › ${test.fullName}`,
        text: (test.failureMessages ?? []).join('\n'),
      }));
    });
    return {
      passed: report.numPassedTests,
      failed: Math.max(report.numFailedTests, failures.length),
      failures,
    };
  } catch {
    return null;
  } finally {
    rmSync(path, { force: true });
  }
}

/** One line a gate, the failures in full below it. A suite that ran no test has failed. */
export async function runGate(gate, env) {
  const from = Date.now();
  const report = gate.suite ? reportPath(gate.name) : null;
  const { code, out } = await run(gate.command, gate.args(report), {
    cwd: gate.cwd,
    env: { ...env, ...(gate.env ?? {}) },
  });
  const counts = report ? readReport(report) : null;
  const ok =
    code === 0 && (!report || (counts !== null && counts.passed > 0 && counts.failed === 0));
  const told = counts ? `, ${counts.passed} tests` : '';
  say(`${ok ? '✓' : '✗'} ${gate.name} (${seconds(from)}${told})`);
  for (const line of out.split('\n').filter((text) => text.startsWith('figure: ')))
    say(`    ${line}`);
  if (!ok) {
    for (const failure of (counts?.failures ?? []).slice(0, 20)) {
      say(`    ✗ ${failure.name}\n${indent(failure.text.slice(0, 3000))}`);
    }
    if (!counts || counts.failures.length === 0) say(indent(out.slice(-6000)));
  }
  return {
    name: gate.name,
    passed: (counts?.passed ?? 0) + (ok ? 1 : 0),
    failed: (counts?.failed ?? 0) + (ok ? 0 : 1),
  };
}

const indent = (text) =>
  text
    .trim()
    .split('\n')
    .map((line) => `      ${line}`)
    .join('\n');
