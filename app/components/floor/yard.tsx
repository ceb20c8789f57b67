import { useDroppable } from "@dnd-kit/core";
import { STAGE_LABEL } from "../../domain/builds/stages";
import type { BoardVehicle, NextCard } from "../../domain/floor/board";
import { Sign } from "../../ui/sign";
import { whenInWords } from "../time";
import { boxStyle } from "./bay";
import { stageSign } from "./bay-rows";
import { useFloorView } from "./floor-context";
import type { PlanExtent } from "./geometry";
import { StandingVehicle, vehicleStyle } from "./standing-vehicle";
import { usePlace } from "./use-place";
import { useRoomBeyond } from "./use-room-beyond";
import { VerdictWord } from "./verdict-word";
import { VERDICT_WORDS } from "./words";

/** The yard: what stands outside, the newest first; more than fit are a press away. */
export function Yard({ extent }: { extent: PlanExtent }) {
  const { floor, may } = useFloorView();
  const { yard } = floor.board;
  const newestFirst = yard.toSorted((a, b) => b.since.localeCompare(a.since));
  const { row, beyond, goOn } = useRoomBeyond(yard.length);
  const place = usePlace("yard");
  const { setNodeRef } = useDroppable({ id: "place-yard", data: { place: "yard", order: 0 } });
  return (
    <section
      ref={setNodeRef}
      className="yard at-box"
      style={boxStyle(extent.yard)}
      aria-label="Yard"
      data-place="yard"
      {...place.data}
    >
      <div className="yard-row" ref={row}>
        {yard.length === 0 ? (
          <p className="self-center">
            The yard is empty. {may.bookIn ? "Book a vehicle in at the counter." : ""}
          </p>
        ) : null}
        {newestFirst.map((vehicle) => (
          <YardItem key={vehicle.buildId} vehicle={vehicle} />
        ))}
      </div>
      <div className="yard-side">
        {beyond ? (
          <button type="button" className="yard-more" onClick={goOn}>
            {beyond === "ahead" ? "More in the yard →" : "← Back to the first"}
          </button>
        ) : null}
        <p className="flex gap-2">
          <span className="floor-label">
            <b>Yard</b>
          </span>
          <span className="floor-label">{yard.length === 1 ? "1 stands" : `${yard.length} stand`}</span>
        </p>
        {place.check ? (
          <VerdictWord check={place.check} className="font-label text-[13px] font-semibold" />
        ) : null}
        <ScaleBar />
      </div>
      {place.check && place.put ? (
        <button
          type="button"
          className="bay-target"
          aria-label={`Put down in the yard: ${VERDICT_WORDS[place.check.verdict]}`}
          onClick={place.put}
        />
      ) : null}
    </section>
  );
}

function YardItem({ vehicle }: { vehicle: BoardVehicle }) {
  return (
    <div className="yard-item" style={vehicleStyle(vehicle, null)}>
      <StandingVehicle vehicle={vehicle} bay={null} />
      <YardWords vehicle={vehicle} />
    </div>
  );
}

/** What a vehicle in the yard waits for: its hold, or its next bay and when. */
export function YardWords({ vehicle }: { vehicle: BoardVehicle }) {
  const { now, timeZone, next } = useFloorView();
  const coming = next.find((card) => card.nickname === vehicle.nickname);
  if (vehicle.hold)
    return (
      <div className="bay-row text-oxide">
        <Sign name="hold" size={16} />
        <b>Hold</b> <span className="cut">{vehicle.hold.words}</span>
      </div>
    );
  return (
    <div className="bay-row">
      <Sign name={vehicle.stage ? stageSign(vehicle.stage.kind) : "approve"} size={16} />
      <b>{vehicle.stage ? STAGE_LABEL[vehicle.stage.kind] : "All stages done"}</b>
      <span className="cut">{comingWords(coming, vehicle, now, timeZone)}</span>
    </div>
  );
}

function comingWords(
  coming: NextCard | undefined,
  vehicle: BoardVehicle,
  now: string,
  timeZone: string,
): string {
  if (coming) return `Bay ${coming.bayNumber}, ${whenInWords(coming.at, now, timeZone)}`;
  return vehicle.promisedAt
    ? `promised ${whenInWords(vehicle.promisedAt, now, timeZone)}`
    : "not planned yet";
}

function ScaleBar() {
  return (
    <div className="scale-bar" role="img" aria-label="Scale: the bar is 10 ft long">
      <svg viewBox="0 0 100 8" preserveAspectRatio="none" width="100%" height="8" aria-hidden="true">
        <path
          d="M.5 4H99.5M.5 0V8M50 1V7M99.5 0V8"
          className="fill-none stroke-concrete-700"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
      <span className="flex justify-between" aria-hidden="true">
        <span>0</span>
        <span>5</span>
        <span>10 ft</span>
      </span>
    </div>
  );
}
