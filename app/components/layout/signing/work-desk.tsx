import { useEffect, useRef, useState } from "react";
import { Link } from "react-router";
import type { LayoutView } from "../../../domain/layout/view";
import { nextLine, type WorkListId, workLine } from "../../../domain/layout/work-list";
import { buttonClass } from "../../../ui/button";
import { Sign } from "../../../ui/sign";
import type { May } from "../may";
import { LineInHand } from "./line-in-hand";
import { statesIn } from "./signed";
import { WorkRows } from "./work-rows";
import "./work.css";

type Props = {
  view: LayoutView;
  may: May;
  person: string;
  done: () => void;
  lists: readonly WorkListId[];
  caution: string;
  next: { to: string; label: string } | null;
};

/** The lists, and one line in hand: the next that is not signed, unless another is picked. */
export function WorkDesk({ view, may, person, done, lists, caution, next }: Props) {
  const [picked, setPicked] = useState<{ id: string } | null>(null);
  const hand = useRef<HTMLDivElement>(null);
  const follow = useRef(false);
  const states = statesIn(view);
  const open = lists.map((list) => nextLine(list, states)).find((line) => line !== null) ?? null;
  const inHand = (picked && workLine(picked.id)) ?? (may.measure ? open : null);
  const heldId = inHand?.id ?? null;
  // Who picked or signed a line goes on at the next: it comes into sight, and the keyboard stands there.
  // biome-ignore lint/correctness/useExhaustiveDependencies: a line picked twice is brought into sight twice
  useEffect(() => {
    if (!follow.current) return;
    follow.current = false;
    hand.current?.querySelector("h2")?.focus();
  }, [heldId, picked]);
  return (
    <div className="work-desk">
      <div className="work-hand" ref={hand}>
        {inHand ? (
          <LineInHand
            key={inHand.id}
            view={view}
            line={inHand}
            may={may}
            person={person}
            states={states}
            done={done}
            signed={() => {
              follow.current = true;
              setPicked(null);
            }}
          />
        ) : null}
        {open === null && next ? (
          <Link to={`/layouts/${view.id}/step/${next.to}`} className={`${buttonClass("go", "xl")} w-full`}>
            {next.label}
          </Link>
        ) : null}
        <p className="flex items-start gap-2.5 text-[15px] text-concrete-700">
          <Sign name="caution" size={20} className="mt-0.5 text-ink" />
          {caution}
        </p>
      </div>
      <div className="grid content-start gap-5">
        {lists.map((list) => (
          <WorkRows
            key={list}
            view={view}
            list={list}
            inHand={heldId}
            onPick={(id) => {
              follow.current = true;
              setPicked({ id });
            }}
          />
        ))}
      </div>
    </div>
  );
}
