/**
 * Writes docs/checks.md from the checks against published work: `npm run checks`. With `--check` it writes nothing and
 * ends with 1 when the page is not up to date.
 */
import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { checksPage } from "../tests/published/page";
import { topics } from "../tests/published/topics";

const file = join(import.meta.dirname, "../docs/checks.md");
const page = checksPage(topics);

function written(): string | null {
  try {
    return readFileSync(file, "utf8");
  } catch {
    return null;
  }
}

if (process.argv.includes("--check")) {
  if (written() !== page) {
    console.error("docs/checks.md is out of date: run `npm run checks`.");
    process.exitCode = 1;
  }
} else {
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, page);
  console.log(`docs/checks.md: ${topics.reduce((sum, topic) => sum + topic.checks.length, 0)} checks.`);
}
