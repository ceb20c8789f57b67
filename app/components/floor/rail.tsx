import { useDroppable } from "@dnd-kit/core";
import { useState } from "react";
import type { CrewCard } from "../../domain/floor/board";
import { Sign } from "../../ui/sign";
import { ageInWords, clock, whenInWords } from "../time";
import { useFloorView } from "./floor-context";
import type { Need } from "./needs";
import { PersonCheck } from "./person-check";
import { PutBackNote } from "./standing-vehicle";
import { usePlace } from "./use-place";
import { VerdictWord } from "./verdict-word";
import { isAway, VERDICT_WORDS } from "./words";

export type Undoable = { words: string; at: string } | null;

/** What needs the foreman, who is where, and the way back. Folds to a strip or a drawer where there is less room. */
export function Rail({ needs, undoable }: { needs: readonly Need[]; undoable: Undoable }) {
  const { floor, may } = useFloorView();
  const [open, setOpen] = useState(false);
  const dragging = floor.hand !== null;
  return (
    <aside className="rail" data-open={open && !dragging} aria-label="Needs you, crew and undo">
      <button type="button" className="rail-strip" aria-expanded={open} onClick={() => setOpen(!open)}>
        <span className="rail-count">{needs.length}</span>
        <span>Needs you</span>
        <span className="rail-strip-more">Crew</span>
      </button>
      <div className="rail-body">
        <NeedsYou needs={needs} />
        <Crew />
      </div>
      {may.move ? <Undo undoable={undoable} /> : null}
    </aside>
  );
}

export function NeedsYou({ needs }: { needs: readonly Need[] }) {
  const { now, select } = useFloorView();
  return (
    <section aria-labelledby="needs-head" className="mb-4">
      <h2 id="needs-head" className="rail-head">
        <span>Needs you</span> <span className="floor-label">{needs.length}</span>
      </h2>
      {needs.length === 0 ? <p className="rail-none">Nothing waits for you.</p> : null}
      <ul>
        {needs.map((need) => (
          <li key={need.buildId} className="border-t border-concrete-200">
            <button type="button" className="need" onClick={() => select(need.buildId)}>
              <span className={need.tone === "stop" ? "text-oxide" : "text-brass-ink"}>
                <Sign name={need.sign} size={20} />
              </span>
              <span className="min-w-0">
                <b>{need.title}</b>
                <span className="block text-[13px] text-concrete-500">{need.words}</span>
              </span>
              <time dateTime={need.since}>{ageInWords(need.since, now)}</time>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}

function Crew() {
  const { floor, now } = useFloorView();
  const { crew } = floor.board;
  const away = crew.filter((person) => isAway(person, now));
  const here = crew.filter((person) => !isAway(person, now));
  const place = usePlace("free");
  const { setNodeRef } = useDroppable({ id: "place-free", data: { place: "free", order: 0 } });
  return (
    <section
      ref={setNodeRef}
      aria-labelledby="crew-head"
      className="rail-crew"
      data-place="free"
      {...place.data}
    >
      <h2 id="crew-head" className="rail-head">
        <span>Crew</span> <span className="floor-label">{crew.length}</span>
      </h2>
      {place.check ? (
        <p className="rail-free">
          <VerdictWord check={place.check} /> to be free
        </p>
      ) : null}
      <Group title="On a vehicle" people={here.filter((person) => person.on)} />
      <Group title="Free" people={here.filter((person) => !person.on)} none="Everyone is on a vehicle." />
      <Group title="Away" people={away} />
      {place.check && place.put ? (
        <button
          type="button"
          className="bay-target"
          aria-label={`Put down here, free: ${VERDICT_WORDS[place.check.verdict]}`}
          onClick={place.put}
        />
      ) : null}
    </section>
  );
}

function Group({ title, people, none }: { title: string; people: readonly CrewCard[]; none?: string }) {
  if (people.length === 0 && !none) return null;
  return (
    <section className="rail-group" aria-label={title}>
      <h3 className="flex justify-between">
        <span className="floor-label">{title}</span> <span className="floor-label">{people.length}</span>
      </h3>
      {people.length === 0 ? <p className="rail-none">{none}</p> : null}
      <ul>
        {people.map((person) => (
          <PersonRow key={person.personId} person={person} />
        ))}
      </ul>
    </section>
  );
}

function PersonRow({ person }: { person: CrewCard }) {
  const { floor, may, now, timeZone, openMove } = useFloorView();
  const away = isAway(person, now);
  const sending = floor.pending.some((one) => one.kind === "person" && one.personId === person.personId);
  const where = away
    ? `back ${whenInWords(person.awayUntil ?? now, now, timeZone)}`
    : person.on
      ? `${person.on.nickname}${person.on.bayNumber === null ? "" : `, Bay ${person.on.bayNumber}`}`
      : "free";
  return (
    <li className="person-row">
      <PersonCheck person={person} hangs="rail" />
      <span className="min-w-0">
        <b className={away ? "text-concrete-500" : ""}>{person.name}</b>
        <span className="block truncate text-[12.5px] text-concrete-500">{where}</span>
      </span>
      {sending ? (
        <span className="person-time">Sending</span>
      ) : person.on && !away ? (
        <time className="person-time" dateTime={person.on.since}>
          {ageInWords(person.on.since, now)}
        </time>
      ) : null}
      {may.assign && !away ? (
        <button
          type="button"
          className="person-put"
          aria-label={`Put ${person.name} on…`}
          onClick={() => openMove({ kind: "person", person })}
        >
          Put on…
        </button>
      ) : null}
      {floor.putBack?.key === `person-${person.personId}` ? (
        <PutBackNote words={floor.putBack.words} onRead={floor.readPutBack} />
      ) : null}
    </li>
  );
}

export function Undo({ undoable }: { undoable: Undoable }) {
  const { floor, timeZone } = useFloorView();
  return (
    <div className="rail-undo">
      <button type="button" disabled={!undoable} onClick={() => void floor.undo()}>
        <Sign name="undo" size={16} />
        {undoable ? (
          <span>
            <b className="font-semibold">Undo</b> {undoable.words}, {clock(undoable.at, timeZone)}
          </span>
        ) : (
          <span className="text-concrete-500">Nothing to undo</span>
        )}
      </button>
    </div>
  );
}
