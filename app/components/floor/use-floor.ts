import { useCallback, useEffect, useMemo, useRef, useState } from "react";
import { useRevalidator } from "react-router";
import type { Board } from "../../domain/floor/board";
import type { Check } from "../../domain/floor/move-check";
import { checkPlace, type Hand, type Thing, thingInHand, thingTitle, verdictsFor } from "./hand";
import { isShown, type Pending, withPending } from "./pending";
import { post } from "./post";
import { slideHome } from "./slide-home";
import { assignQuestion, moveQuestion, type PlaceKey, type Question } from "./words";

export type Asked = Question & { confirm: () => void; thing: Thing };
/** Why something was put back; stays until it is read. */
export type PutBack = { key: string; words: string };

export const thingKey = (thing: Thing) =>
  thing.kind === "vehicle" ? `vehicle-${thing.vehicle.buildId}` : `person-${thing.person.personId}`;

type Options = { live: Board; now: string; refusal: string | null };

const reasonsOf = (check: Check) => check.reasons.map((reason) => reason.words).join(" ");

/**
 * The hand of the Floor: what is picked up, what each place says to it, and what happens when it is let go of.
 * @param options.live the board as it was last heard
 * @param options.refusal words that refuse every move now (the page is not live); null when moves are taken
 */
export function useFloor({ live, now, refusal }: Options) {
  const [hand, setHand] = useState<Hand | null>(null);
  const [pending, setPending] = useState<readonly Pending[]>([]);
  const [asked, setAsked] = useState<Asked | null>(null);
  const [putBack, setPutBack] = useState<PutBack | null>(null);
  const [said, setSaid] = useState("");
  const { revalidate } = useRevalidator();
  const board = useMemo(() => withPending(live, pending), [live, pending]);
  const latest = useRef({ live, board, now, refusal });
  latest.current = { live, board, now, refusal };

  useEffect(() => {
    setPending((all) =>
      all.some((one) => isShown(live, one)) ? all.filter((one) => !isShown(live, one)) : all,
    );
  }, [live]);

  const thing = useMemo(() => thingInHand(board, hand), [board, hand]);
  const verdicts = useMemo(() => (thing ? verdictsFor(board, thing, now) : null), [board, thing, now]);

  const pickUp = useCallback((next: Hand) => {
    setPutBack(null);
    setHand(next);
    const what = thingInHand(latest.current.board, next);
    if (what && next.by === "tap") setSaid(`${thingTitle(what)} in hand: choose a place.`);
  }, []);
  const letGo = useCallback(() => setHand(null), []);

  const refuse = useCallback((what: Thing, words: string) => {
    setPutBack({ key: thingKey(what), words });
    setSaid(`Put back: ${words}`);
  }, []);

  const send = useCallback(
    async (what: Thing, place: PlaceKey, confirmed: boolean) => {
      const change = changeFor(latest.current.board, what, place);
      if (!change) return;
      setPending((all) => [...all.filter((one) => one.key !== change.key), change]);
      const answer = await post(...requestFor(change, confirmed));
      if (answer.ok) {
        setSaid(`${answer.words}.`);
        await revalidate();
        return;
      }
      slideHome(thingKey(what), () => setPending((all) => all.filter((one) => one !== change)));
      if (answer.kind === "ask-first") {
        const check = answer.detail.check as Check | undefined;
        if (check)
          return setAsked(ask(latest.current, what, place, check, () => void send(what, place, true)));
      }
      refuse(what, answer.message);
      await revalidate();
    },
    [refuse, revalidate],
  );

  /** Lets a thing go over a place. @returns true when it goes there, false when it goes home */
  const put = useCallback(
    (what: Thing, place: PlaceKey): boolean => {
      setHand(null);
      const state = latest.current;
      const check = checkPlace(state.board, what, place, state.now);
      if (!check) return false;
      if (state.refusal) {
        refuse(what, state.refusal);
        return false;
      }
      if (check.verdict === "refuses") {
        // Putting it down where it stands is a change of mind, not a mistake.
        if (!check.reasons.some((reason) => reason.rule === "same")) refuse(what, reasonsOf(check));
        return false;
      }
      if (check.verdict === "asks") {
        setAsked(ask(state, what, place, check, () => void send(what, place, true)));
        return false;
      }
      void send(what, place, false);
      return true;
    },
    [refuse, send],
  );

  const undo = useCallback(async () => {
    if (latest.current.refusal) return setSaid(latest.current.refusal);
    const answer = await post("/floor/undo", {});
    setSaid(answer.ok ? answer.words : answer.message);
    await revalidate();
  }, [revalidate]);

  return {
    board,
    hand,
    thing,
    verdicts,
    pending,
    asked,
    putBack,
    said,
    pickUp,
    letGo,
    put,
    undo,
    closeAsked: useCallback(() => setAsked(null), []),
    readPutBack: useCallback(() => setPutBack(null), []),
    say: setSaid,
  };
}
export type Floor = ReturnType<typeof useFloor>;

function ask(
  state: { board: Board; now: string },
  what: Thing,
  place: PlaceKey,
  check: Check,
  go: () => void,
): Asked {
  const bay = state.board.bays.find((card) => card.bay.id === place);
  if (what.kind === "vehicle")
    return {
      ...moveQuestion(what.vehicle, what.bay, bay?.bay ?? null, check, state.now),
      confirm: go,
      thing: what,
    };
  const vehicle = bay?.vehicle;
  if (!vehicle) throw new Error("A question about putting a person on nothing");
  return { ...assignQuestion(what.person, vehicle, check), confirm: go, thing: what };
}

function changeFor(board: Board, what: Thing, place: PlaceKey): Pending | null {
  const key = thingKey(what);
  if (what.kind === "vehicle") {
    const { buildId, placementId } = what.vehicle;
    return { key, kind: "vehicle", buildId, placementId, toBayId: typeof place === "number" ? place : null };
  }
  const { personId } = what.person;
  if (place === "free") return { key, kind: "person", personId, toBuildId: null };
  const vehicle = board.bays.find((card) => card.bay.id === place)?.vehicle;
  return vehicle ? { key, kind: "person", personId, toBuildId: vehicle.buildId } : null;
}

function requestFor(change: Pending, confirmed: boolean): [string, Record<string, string | number>] {
  const yes = confirmed ? "1" : "";
  if (change.kind === "vehicle") {
    const { buildId, placementId, toBayId } = change;
    return ["/floor/move-vehicle", { buildId, placementId, toBayId: toBayId ?? "", confirmed: yes }];
  }
  return [
    "/floor/assign-person",
    { personId: change.personId, toBuildId: change.toBuildId ?? "", confirmed: yes },
  ];
}
