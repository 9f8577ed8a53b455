import { mkdirSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { localFile } from "../project.mjs";
import { complain } from "../terminal.mjs";

const folder = localFile("reports");

export function reportPath(name) {
  mkdirSync(folder, { recursive: true });
  const path = join(folder, `${name}.${process.pid}`);
  rmSync(path, { force: true });
  return path;
}

export function vitestCounts(path) {
  return countsOf(path, (report) => {
    const filesThatDidNotRun = report.testResults.filter(
      ({ status, assertionResults }) => status === "failed" && assertionResults.length === 0,
    );
    return {
      passed: report.numPassedTests,
      failed: report.numFailedTests + filesThatDidNotRun.length,
      skipped: report.numPendingTests + report.numTodoTests,
    };
  });
}

export function playwrightCounts(path) {
  return countsOf(path, ({ stats, errors }) => ({
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky + errors.length,
    skipped: stats.skipped,
  }));
}

/** A runner that left no report failed once. A test that did not run is no success, unless somebody chose the tests. */
export function sumUp({ passed, failed, skipped }, { exitedBadly, chosen }) {
  const unrun = chosen ? 0 : skipped;
  if (unrun > 0) complain(`${unrun} did not run, which counts as failed.`);
  return { passed, failed: Math.max(failed + unrun, exitedBadly ? 1 : 0) };
}

function countsOf(path, read) {
  try {
    return read(JSON.parse(readFileSync(path, "utf8")));
  } catch {
    return { passed: 0, failed: 1, skipped: 0 };
  } finally {
    rmSync(path, { force: true });
  }
}
