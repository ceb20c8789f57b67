import { meetsTorque } from "./torque-reading";
import type { WorkLine, WorkState } from "./work-list";

/** What is written down when a line is signed; empty where nothing was typed. */
export type WorkEntry = {
  state: WorkState;
  wanted: string;
  read: string;
  tool: string;
  words: string;
  figures: readonly { id: string; typed: string }[];
};

/** No wheel stands further off than this (degrees). */
const FURTHEST_DEG = 20;

/**
 * What is missing in a signature, in words by field; empty when it may be kept. A line that did not pass says why; a
 * weld names what its welder is qualified by; a bolt its torque, the reading and the tool.
 */
export function entryFaults(line: WorkLine, entry: WorkEntry): Record<string, string> {
  const faults: Record<string, string> = {};
  if (entry.state === "fail") {
    if (entry.words.length < 3) faults.words = "Say in a few words what is not right.";
    return faults;
  }
  if (line.kind === "weld" && entry.tool.length < 3)
    faults.tool = "Write what you are qualified by, as it stands on your card.";
  if (line.kind === "bolt") Object.assign(faults, boltFaults(entry));
  if (line.kind === "figures")
    for (const { id, typed } of entry.figures)
      if (degreesTyped(typed) === null) faults[`figure.${id}`] = "In degrees, for example 3.5 or -0.25.";
  return faults;
}

function boltFaults({ wanted, read, tool }: WorkEntry): Record<string, string> {
  const faults: Record<string, string> = {};
  if (!/\d/.test(wanted)) faults.wanted = "Type the torque that the parts maker asks for, with its unit.";
  if (!/\d/.test(read)) faults.read = "Type what the wrench read.";
  if (tool.length < 2) faults.tool = "Name the wrench, so that it can be found again.";
  const meets = meetsTorque(wanted, read);
  if (meets === "low")
    faults.read = `Under the ${wanted} that is asked for: torque it again, or sign that it failed.`;
  if (meets === "high")
    faults.read = `Over the ${wanted} that is asked for: sign that it failed, and say so.`;
  return faults;
}

/** An angle as typed, in degrees; null when it is none. */
export function degreesTyped(typed: string): number | null {
  const text = typed.trim().replace(",", ".").replace("−", "-").replace(/\s*°$/, "");
  const value = Number(text);
  return text !== "" && Number.isFinite(value) && Math.abs(value) <= FURTHEST_DEG ? value : null;
}
