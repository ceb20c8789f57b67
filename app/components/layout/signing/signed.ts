import type { LayoutView, SignatureView } from "../../../domain/layout/view";
import { linesOf, type WorkLine, type WorkListId, type WorkStates } from "../../../domain/layout/work-list";

/** How each line stands by its newest signature. */
export const statesIn = ({ work }: LayoutView): WorkStates =>
  new Map(
    Object.entries(work.signed).flatMap(([id, [newest]]) => (newest ? [[id, newest.state] as const] : [])),
  );

export const signatureOf = ({ work }: LayoutView, line: WorkLine): SignatureView | null =>
  work.signed[line.id]?.[0] ?? null;

/** What did not pass, in a sentence; null when nothing failed. */
export function failedLines(view: LayoutView, lists: readonly WorkListId[]): string | null {
  const failed = lists.flatMap(linesOf).flatMap((line) => {
    const signature = signatureOf(view, line);
    return signature?.state === "fail" ? [`${line.label}: ${signature.words}`] : [];
  });
  const [first, ...more] = failed;
  if (first === undefined) return null;
  return more.length > 0 ? `Not good: ${first}, and ${more.length} more.` : `Not good: ${first}.`;
}
