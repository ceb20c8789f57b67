import { SQUARE_TOLERANCE } from "../../domain/layout/square";
import { signedLine } from "../../domain/layout/tack-check";
import type { Made, SignatureView, TackCheckView, TackView, WorkView } from "../../domain/layout/view";
import { workLine } from "../../domain/layout/work-list";
import { mm } from "../../domain/units/length";
import { TackFigures } from "../../validation/layout-work";
import type { LoadedLayout } from "./layout-state.server";
import { figuresUnder } from "./layout-work-state";

export const made = (person: { name: string; initials: string } | null, at: Date): Made => ({
  name: person?.name ?? "",
  initials: person?.initials ?? "",
  at: at.toISOString(),
});

/** The tacked axle: the line that was signed, and every check against it. */
export function tackView({ work, geometry, approvalRow }: LoadedLayout): TackView {
  return {
    state: work.tack,
    within: SQUARE_TOLERANCE,
    wanted:
      approvalRow && geometry.line ? signedLine(geometry.line, mm(approvalRow.choice.axleStationMm)) : null,
    checks: work.checks.map(({ check, counts, ...person }): TackCheckView => {
      const figures = TackFigures.parse(check.figures);
      return {
        id: check.id,
        passes: check.passes,
        counts,
        leftTyped: `${check.leftStationTyped}, ${check.leftOffsetTyped}`,
        rightTyped: `${check.rightStationTyped}, ${check.rightOffsetTyped}`,
        leftAhead: mm(figures.leftAheadMm),
        rightAhead: mm(figures.rightAheadMm),
        outOfSquare: mm(figures.outOfSquareMm),
        sideways: mm(figures.sidewaysMm),
        headline: figures.headline,
        moves: figures.moves,
        made: made(person, check.madeAt),
      };
    }),
  };
}

/** The lists with who signed what; figures stand with the line that they were typed under. */
export function workView({ work }: LoadedLayout): WorkView {
  const signed: WorkView["signed"] = {};
  for (const { item, ...person } of work.items.toReversed()) {
    if (!workLine(item.item)) continue;
    const signature: SignatureView = {
      state: item.state,
      wanted: item.wantedTyped,
      read: item.readTyped,
      tool: item.tool,
      words: item.words,
      dueAt: item.dueAt?.toISOString() ?? null,
      figures: figuresUnder(work.items, item),
      made: made(person, item.signedAt),
    };
    signed[item.item] = [...(signed[item.item] ?? []), signature];
  }
  return { progress: work.work, signed };
}
