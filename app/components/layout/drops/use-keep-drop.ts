import { useRef, useState } from "react";
import type { LayoutView } from "../../../domain/layout/view";
import { newKey } from "../new-key";
import type { Posted } from "../post";
import type { Outbox } from "../use-unsent";
import { type Spot, spotLabel, subjectOf } from "./cells";

/** So long the screen waits to show a refusal beside the field; then it goes on, and the list shows how it went. */
const WAIT_MS = 1500;

export type Kept = "taken" | "kept-here" | "refused";

/**
 * Keeps a drop's reading: on this tablet at once, with the shop as soon as it answers. Its key stays the same until the
 * shop has answered, so that pressing again never counts twice.
 */
export function useKeepDrop(view: LayoutView, outbox: Outbox, spot: Spot) {
  const key = useRef<string | null>(null);
  const onTheWay = useRef(false);
  const [busy, setBusy] = useState(false);
  const [refused, setRefused] = useState<{ message: string; fields: Record<string, string> } | null>(null);

  const one = async (fields: Record<string, string>): Promise<Kept> => {
    key.current ??= newKey();
    const clientKey = key.current;
    const sending = outbox.keep({
      clientKey,
      to: `/layouts/${view.id}/drop`,
      fields,
      what: spotLabel(spot),
      subject: subjectOf(spot),
    });
    const posted = await Promise.race<Posted | null>([
      sending,
      new Promise((go) => setTimeout(() => go(null), WAIT_MS)),
    ]);
    key.current = null;
    if (posted?.state !== "answered") return "kept-here";
    if (posted.answer.ok) return "taken";
    outbox.letGo(clientKey);
    setRefused({ message: posted.answer.message, fields: posted.answer.fields });
    return "refused";
  };

  /** Keeps readings one after the other; stops at the first that the shop does not take. */
  const keep = async (readings: readonly Record<string, string>[]): Promise<Kept | null> => {
    if (onTheWay.current) return null;
    onTheWay.current = true;
    setBusy(true);
    setRefused(null);
    let kept: Kept = "taken";
    for (const fields of readings) {
      kept = await one(fields);
      if (kept === "refused") break;
    }
    onTheWay.current = false;
    setBusy(false);
    return kept;
  };
  return { keep, busy, refused };
}
