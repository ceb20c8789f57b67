import type { DropRow, SecondLookRow } from "../../db/queries/layouts.server";
import { agreeWithin, pointsToLookAt, type Weight, weightsOf } from "../../domain/layout/second-look";
import { type Millimetres, mm } from "../../domain/units/length";
import type { StandingDrops } from "./compute-layout";

/** A drop to look at again, with the reading that counts and what others read there. */
export type LookItem = Weight & {
  row: DropRow;
  /** Looks held against that reading, oldest first, without those that a third reading set aside. */
  looks: SecondLookRow[];
  /** Readings of this point that a third one set aside: shown, never lost. */
  setAside: SecondLookRow[];
  state: "to-do" | "apart" | "agrees";
};
export type SecondLook = {
  within: Millimetres;
  items: LookItem[];
  state: "to-do" | "apart" | "agrees";
};

/**
 * Where the second look stands: it is held against the readings that count now, so that a reading that is taken again
 * has to be looked at again, and one that stays keeps its look whatever option is in hand.
 */
export function secondLookState(input: {
  drops: StandingDrops;
  rows: readonly DropRow[];
  looks: readonly SecondLookRow[];
  method: "square" | "through-centres" | "asked" | null;
  sigma: { tapeSigmaMm: number; dropSigmaMm: number };
}): SecondLook {
  const { drops, rows, looks, method, sigma } = input;
  const points = pointsToLookAt(weightsOf(drops.at, method ?? "square"));
  const items = points.flatMap((weight): LookItem[] => {
    const row = rows.find(
      (one) =>
        one.drop.point === weight.point && one.drop.side === weight.side && one.reading.supersededAt === null,
    );
    if (!row) return [];
    const own = looks.filter(({ look }) => look.againstId === row.reading.id && look.supersededAt === null);
    const state = own.some(({ look }) => look.agrees) ? "agrees" : own.length > 0 ? "apart" : "to-do";
    const setAside = looks.filter(({ look }) => look.dropId === row.drop.id && look.supersededAt !== null);
    return [{ ...weight, row, looks: own, setAside, state }];
  });
  const has = (state: LookItem["state"]) => items.some((item) => item.state === state);
  return {
    within: agreeWithin({ tape: mm(sigma.tapeSigmaMm), drop: mm(sigma.dropSigmaMm) }),
    items,
    state: has("apart") ? "apart" : items.length === 0 || has("to-do") ? "to-do" : "agrees",
  };
}
