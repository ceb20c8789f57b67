import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import type { Check, Status, Topic } from "./check";
import { checksPage } from "./page";
import { topics } from "./topics";

const check = (about: string, name: string, status: Status, place?: string): Check => ({
  about,
  source: { name, status, ...(place === undefined ? {} : { place }) },
  got: () => 1,
  want: 1,
  within: 0,
});
const SAMPLE: Topic[] = [
  {
    topic: "Arcs",
    checks: [
      check("a|b *c*", "Book", "read", "page 3"),
      check("again", "Book", "from memory"),
      check("mine", "Own sum", "derived"),
      check("habit", "common practice, no source", "practice"),
      check("other", "a library", "library"),
    ],
  },
];

describe("the page of the checks", () => {
  it("is up to date", () => {
    const file = join(import.meta.dirname, "../../docs/checks.md");
    const page = existsSync(file) ? readFileSync(file, "utf8") : "";
    expect(page === checksPage(topics), "docs/checks.md is out of date: run `npm run checks`.").toBe(true);
  });
  it("counts works from outside once, and leaves out what is derived or practice", () => {
    const page = checksPage(SAMPLE);
    expect(page).toContain("- Topics: 1\n- Checks: 5\n- Checks against work from outside: 3\n");
    expect(page).toContain("- Separate works from outside: 2 ");
    expect(page).toMatch(/\| derived \| [^|]+ \| 1 \|/);
  });
  it("keeps signs of Markdown as text", () => {
    expect(checksPage(SAMPLE)).toContain("| a\\|b \\*c\\* | Book, page 3 | read |\n");
  });
  it("says every check once", () => {
    const lines = checksPage(topics).split("\n");
    const headings = lines.filter((line) => line.startsWith("## "));
    expect(headings).toHaveLength(topics.length);
    const rows = lines.filter((line) => line.startsWith("| ") && !line.startsWith("| ---"));
    const checks = topics.reduce((sum, topic) => sum + topic.checks.length, 0);
    // Each table has a head; the table of statuses has one and six rows.
    expect(rows).toHaveLength(checks + topics.length + 7);
  });
});
