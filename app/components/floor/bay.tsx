import { useDroppable } from "@dnd-kit/core";
import type { CSSProperties } from "react";
import { Link } from "react-router";
import { BAY_KIND_LABEL } from "../../domain/floor/bays";
import type { BayCard, BoardVehicle } from "../../domain/floor/board";
import { formatFeet, mm } from "../../domain/units/length";
import { Stencil } from "../../ui/stencil";
import { dayAndClock } from "../time";
import { PlannedEnd, StageRow, StateRow } from "./bay-rows";
import { useFloorView } from "./floor-context";
import { type Box, bayBox, paintPath } from "./geometry";
import { Marks } from "./marks";
import { PersonCheck } from "./person-check";
import { StandingVehicle } from "./standing-vehicle";
import { usePlace } from "./use-place";
import { VerdictWord } from "./verdict-word";
import { bayTitle, VERDICT_WORDS } from "./words";

/** Figures without a stroke down their middle are bridged across. */
const FLAT_CUT = new Set([1, 4, 7]);

export const boxStyle = (box: Box) =>
  ({ "--x": box.x, "--y": box.y, "--bw": box.w, "--bh": box.h }) as CSSProperties;

/** A bay on the plan: painted, stencilled, with what stands in it; a place to let go over. */
export function Bay({ card }: { card: BayCard }) {
  const { bay, vehicle } = card;
  const box = bayBox(bay);
  const place = usePlace(bay.id);
  const { setNodeRef } = useDroppable({ id: `place-${bay.id}`, data: { place: bay.id, order: bay.number } });
  return (
    <section
      ref={setNodeRef}
      className="bay at-box"
      style={boxStyle(box)}
      aria-label={bayTitle(bay)}
      data-place={bay.id}
      data-mouth={bay.mouth}
      data-kind={bay.kind}
      {...place.data}
    >
      <span className="bay-no" aria-hidden="true">
        <Stencil n={bay.number} size="var(--no)" cut={FLAT_CUT.has(bay.number % 10) ? "h" : "v"} />
      </span>
      <Marks bay={bay} covered={vehicle !== null} />
      {place.check ? <BayLine box={box} mouth={bay.mouth} /> : null}
      <div className="bay-inner">
        <header className="bay-head">
          <span className="floor-label">
            <b>Bay {bay.number}</b>
          </span>
          <span className="floor-label">
            {BAY_KIND_LABEL[bay.kind]} · {formatFeet(mm(bay.lengthMm))}
          </span>
          {place.check ? (
            <VerdictWord check={place.check} className="bay-word" />
          ) : vehicle ? (
            <PlannedEnd vehicle={vehicle} />
          ) : null}
        </header>
        <div className="bay-stand">
          {vehicle ? <StandingVehicle vehicle={vehicle} bay={bay} /> : <EmptyWords number={bay.number} />}
        </div>
        {vehicle ? (
          <div className="bay-rows">
            <StageRow vehicle={vehicle} />
            <StateRow vehicle={vehicle} />
            <Crew vehicle={vehicle} />
          </div>
        ) : null}
      </div>
      {place.check && place.put ? (
        <button
          type="button"
          className="bay-target"
          aria-label={`Put down in Bay ${bay.number}: ${VERDICT_WORDS[place.check.verdict]}`}
          onClick={place.put}
        />
      ) : null}
    </section>
  );
}

function BayLine({ box, mouth }: { box: Box; mouth: BayCard["bay"]["mouth"] }) {
  return (
    <svg className="bay-line" viewBox={`0 0 ${box.w} ${box.h}`} preserveAspectRatio="none" aria-hidden="true">
      <path d={paintPath({ x: 0, y: 0, w: box.w, h: box.h }, mouth)} />
    </svg>
  );
}

function EmptyWords({ number }: { number: number }) {
  const { next, timeZone, may } = useFloorView();
  const coming = next.find((card) => card.bayNumber === number);
  return (
    <p className="bay-empty">
      {coming ? (
        <>
          Empty. Next: {coming.nickname}, {dayAndClock(coming.at, timeZone)}
        </>
      ) : (
        <>
          Nothing stands here.
          {may.move ? " Drag a vehicle in from the yard" : ""}
          {may.move && may.bookIn ? (
            <>
              , or{" "}
              <Link className="font-semibold text-line underline" to="/counter/book-in">
                book one in
              </Link>
            </>
          ) : null}
          {may.move ? "." : ""}
        </>
      )}
    </p>
  );
}

function Crew({ vehicle }: { vehicle: BoardVehicle }) {
  const { floor } = useFloorView();
  if (vehicle.crew.length === 0) return null;
  const cards = vehicle.crew.flatMap(
    (one) => floor.board.crew.find((card) => card.personId === one.personId) ?? [],
  );
  return (
    <fieldset className="bay-crew" aria-label={`On ${vehicle.nickname}`}>
      {cards.map((person) => (
        <PersonCheck key={person.personId} person={person} hangs="bay" size={26} />
      ))}
    </fieldset>
  );
}
