import { existsSync, readFileSync } from "node:fs";

/**
 * How many tests of a runner's JSON report passed and failed.
 * @param {"vitest" | "playwright"} kind
 * @param {string} file
 * @returns {{ passed: number, failed: number } | null} null when there is no report that can be read
 */
export function readReport(kind, file) {
  if (!existsSync(file)) return null;
  try {
    const report = JSON.parse(readFileSync(file, "utf8"));
    return kind === "vitest" ? vitestCounts(report) : playwrightCounts(report);
  } catch {
    return null;
  }
}

function vitestCounts(report) {
  // A file that could not be loaded has no test that failed: it counts as one.
  const broken = report.testResults.filter(
    (result) =>
      result.status === "failed" && !result.assertionResults.some((test) => test.status === "failed"),
  ).length;
  return { passed: report.numPassedTests, failed: report.numFailedTests + broken };
}

function playwrightCounts({ stats, errors }) {
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky + (errors?.length ?? 0) };
}
