import "./floor.css";
import "./vehicle.css";
import "./hand.css";
import "./rail.css";
import { useEffect, useMemo, useState } from "react";
import type { Board } from "../../domain/floor/board";
import { useLiveBoard } from "../../realtime/use-live";
import type { ShellData } from "../frame/areas";
import { Shell } from "../frame/shell";
import { clock } from "../time";
import { AskDialog } from "./ask-dialog";
import { type FloorMay, FloorProvider, type FloorView } from "./floor-context";
import { FloorDrag } from "./floor-drag";
import { FloorPlan } from "./floor-plan";
import type { Thing } from "./hand";
import { HandBar } from "./hand-bar";
import { MoveDialog } from "./move-dialog";
import { needsOn } from "./needs";
import { PhoneList } from "./phone-list";
import { Rail, type Undoable } from "./rail";
import { focusThing } from "./slide-home";
import { useChanges } from "./use-changes";
import { useFloor } from "./use-floor";
import { useNow } from "./use-now";

type Props = { served: Board; shell: ShellData; undoable: Undoable; may: FloorMay };

/** The Floor: the plan of the shop as it stands, live, with everything that can be moved on it. */
export function FloorScreen({ served, shell, undoable, may }: Props) {
  const now = useNow(shell.now);
  const { timeZone } = shell;
  const [held, setHeld] = useState(false);
  const { board: live, status } = useLiveBoard(served, held);
  const refusal =
    status.state === "not-live"
      ? `Not live${status.lastHeard === null ? "" : ` since ${clock(new Date(status.lastHeard), timeZone)}`}: nothing is moved until the shop is heard again.`
      : null;
  const floor = useFloor({ live, now, refusal });
  const inHand = floor.hand !== null;
  useEffect(() => setHeld(inHand), [inHand]);
  const changed = useChanges(live, shell.person.name);
  const [selected, select] = useState<number | null>(null);
  const [moving, setMoving] = useState<Thing | null>(null);
  const needs = useMemo(() => needsOn(floor.board, now, timeZone), [floor.board, now, timeZone]);
  const view: FloorView = {
    floor,
    now,
    timeZone,
    may,
    changed,
    selected,
    select,
    openMove: setMoving,
    next: floor.board.next,
  };
  useEscape(inHand && floor.hand?.by === "tap", floor.letGo);
  return (
    <Shell shell={shell} live={status}>
      <FloorProvider value={view}>
        <main>
          <h1 className="sr-only">Floor</h1>
          <FloorDrag>
            <div className="floor-screen">
              <FloorPlan />
              <Rail needs={needs} undoable={undoable} />
            </div>
          </FloorDrag>
          <PhoneList needs={needs} undoable={undoable} />
        </main>
        <HandBar />
        <Said words={floor.said} />
        {moving ? (
          <MoveDialog
            thing={moving}
            onClose={() => {
              setMoving(null);
              requestAnimationFrame(() =>
                focusThing(
                  moving.kind === "vehicle"
                    ? `vehicle-${moving.vehicle.buildId}`
                    : `person-${moving.person.personId}`,
                ),
              );
            }}
          />
        ) : null}
        {floor.asked ? <AskDialog asked={floor.asked} onClose={floor.closeAsked} /> : null}
      </FloorProvider>
    </Shell>
  );
}

function useEscape(on: boolean, act: () => void): void {
  useEffect(() => {
    if (!on) return;
    const listen = (event: KeyboardEvent) => event.key === "Escape" && act();
    window.addEventListener("keydown", listen);
    return () => window.removeEventListener("keydown", listen);
  }, [on, act]);
}

const SAID_MS = 8000;

/** What just happened, in one sentence, seen and heard. */
function Said({ words }: { words: string }) {
  const [shown, setShown] = useState(words);
  useEffect(() => {
    setShown(words);
    const timer = setTimeout(() => setShown(""), SAID_MS);
    return () => clearTimeout(timer);
  }, [words]);
  return (
    <p role="status" className="floor-said" data-shown={shown !== ""}>
      {shown}
    </p>
  );
}
