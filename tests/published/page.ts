import type { Check, Source, Status, Topic } from "./check";

/** What each status means, in the order of the page: the surest first. */
const STATUSES: readonly (readonly [Status, string])[] = [
  ["read", "the page with the value was read"],
  [
    "recomputed",
    "the value was remembered or read in part, and the published formula and inputs give it again",
  ],
  ["from memory", "from memory of the work named; the page was not seen"],
  ["library", "another library's answer, worked out in the test"],
  ["derived", "worked out from the named formula or by a second method; no printed value was seen"],
  ["practice", "the trade does it so; there is no source"],
];

/** These say nothing that comes from outside the project. */
const OWN: readonly Status[] = ["derived", "practice"];
const isOutside = (source: Source): boolean => !OWN.includes(source.status);

/** Signs that Markdown would take as its own, and line ends, as plain text in a table's cell. */
const cell = (text: string): string =>
  text
    .replace(/\s+/g, " ")
    .trim()
    .replace(/[\\|*_`[\]<>~]/g, "\\$&")
    .replace(/&/g, "&amp;");

const row = (cells: readonly string[]): string => `| ${cells.join(" | ")} |`;
const table = (head: readonly string[], rows: readonly (readonly string[])[]): string[] => [
  row(head),
  row(head.map(() => "---")),
  ...rows.map(row),
];

const sourceOf = ({ name, place }: Source): string => cell(place ? `${name}, ${place}` : name);
const countOf = (checks: readonly Check[], status: Status): number =>
  checks.filter((check) => check.source.status === status).length;

function totals(topics: readonly Topic[]): string[] {
  const all = topics.flatMap((one) => one.checks);
  const outside = all.filter((check) => isOutside(check.source));
  const sources = new Set(outside.map((check) => check.source.name));
  return [
    `- Topics: ${topics.length}`,
    `- Checks: ${all.length}`,
    `- Checks against work from outside: ${outside.length}`,
    `- Separate works from outside: ${sources.size} (“derived” and “practice” are not counted)`,
    "",
    ...table(
      ["Status", "What it means", "Checks"],
      STATUSES.map(([status, words]) => [status, cell(words), String(countOf(all, status))]),
    ),
  ];
}

const section = ({ topic, checks }: Topic): string[] => [
  "",
  `## ${cell(topic)}`,
  "",
  ...table(
    ["What is checked", "Source, place", "Status"],
    checks.map((check) => [cell(check.about), sourceOf(check.source), check.source.status]),
  ),
];

/**
 * The page docs/checks.md: every check against work from outside, a table per topic, in the order given.
 * @returns Markdown, the same for the same topics
 */
export function checksPage(topics: readonly Topic[]): string {
  return `${[
    "# What the calculations are checked against",
    "",
    "Every line below runs as a test (`tests/published`). The status says how sure the expected value is: not every page could be opened, so a value remembered from a book is not passed off as one that was read. What was worked out here by a second method is listed too, but is not counted as work from outside.",
    "",
    "This page is written by `npm run checks` from the checks themselves: do not edit it by hand.",
    "",
    ...totals(topics),
    ...topics.flatMap(section),
  ].join("\n")}\n`;
}
