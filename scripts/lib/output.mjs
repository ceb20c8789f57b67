/**
 * What the person at the keyboard reads: one calm line per step, and a problem told as what happened,
 * what the program itself said, and what to do about it.
 */

/** A failure the person can act on. Anything else that is thrown is a mistake in our own code. */
export class Problem extends Error {
  /**
   * @param {string} what one sentence: what went wrong
   * @param {{ todo?: string, details?: string }} [more] what to do, and the failing program's own words
   */
  constructor(what, { todo = "", details = "" } = {}) {
    super(what);
    this.name = "Problem";
    this.todo = todo;
    this.details = details;
  }
}

/** Prints one line about one step: "Packages: up to date". */
export function say(topic, text) {
  console.log(`${topic}: ${text}`);
}

/** The last lines of a longer text, without blank ones. */
export function lastLines(text, count = 15) {
  return text
    .split("\n")
    .filter((line) => line.trim() !== "")
    .slice(-count)
    .join("\n");
}

/** Prints a problem in words; an unexpected error with its stack, because only that helps to mend it. */
export function tellProblem(error) {
  if (!(error instanceof Problem)) {
    console.error(error instanceof Error ? error.stack : error);
    return;
  }
  console.error(`\nProblem: ${error.message}`);
  if (error.details) console.error(`\n${indent(error.details)}`);
  if (error.todo) console.error(`\nWhat to do: ${error.todo}`);
}

/** Seconds since a moment from performance.now(), for people: "8 s". */
export function secondsSince(began) {
  return `${Math.max(1, Math.round((performance.now() - began) / 1000))} s`;
}

/** Keeps a closed terminal from ending us by a write error before everything is shut down. */
export function outliveClosedTerminal() {
  for (const stream of [process.stdout, process.stderr]) stream.on("error", () => {});
}

function indent(text) {
  return text
    .split("\n")
    .map((line) => (line ? `  ${line}` : line))
    .join("\n");
}
