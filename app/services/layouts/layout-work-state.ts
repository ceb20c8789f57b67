import type { TackCheckRow, WorkItemRow } from "../../db/queries/layout-work.server";
import type { StepFacts } from "../../domain/layout/steps";
import { progressOf, type WorkStates } from "../../domain/layout/work-list";

export type LayoutWork = {
  /** Newest first; `counts` is false for a check of an earlier approval. */
  checks: (TackCheckRow & { counts: boolean })[];
  /** Signatures that count, oldest first. */
  items: WorkItemRow[];
  /** How each line stands by its newest signature. */
  states: WorkStates;
  tack: StepFacts["tack"];
  work: StepFacts["work"];
};

/**
 * Where the work after approval stands. A tack check belongs to one approval: a new one wants the axle checked again.
 * What was signed counts from the first approval of the choice that is signed now: the same numbers signed again lose no
 * weld, other numbers begin the lists anew.
 */
export function layoutWork(input: {
  approvalId: number | null;
  since: Date | null;
  checks: readonly TackCheckRow[];
  items: readonly WorkItemRow[];
}): LayoutWork {
  const { approvalId, since } = input;
  const checks = input.checks
    .map((row) => ({ ...row, counts: row.check.approvalId === approvalId }))
    .toReversed();
  const items = input.items.filter(({ item }) => since !== null && item.signedAt >= since);
  const states: WorkStates = new Map(items.map(({ item }) => [item.item, item.state]));
  const newest = checks.find((row) => row.counts);
  return {
    checks,
    items,
    states,
    tack: newest ? (newest.check.passes ? "passes" : "out") : "none",
    work: {
      weld: progressOf("weld", states),
      torque: progressOf("torque", states),
      finish: progressOf("finish", states),
    },
  };
}

/** The alignment figures that were typed with a signature. */
export const figuresUnder = (
  items: readonly WorkItemRow[],
  line: WorkItemRow["item"],
): { id: string; typed: string }[] =>
  items
    .filter(
      ({ item }) =>
        item.item.startsWith(`${line.item}.`) && item.signedAt.getTime() === line.signedAt.getTime(),
    )
    .map(({ item }) => ({ id: item.item.slice(line.item.length + 1), typed: item.readTyped }));
