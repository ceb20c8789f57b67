import { type CSSProperties, useEffect, useRef } from "react";
import { Link } from "react-router";
import { STAGE_LABEL } from "../../domain/builds/stages";
import { VEHICLE_KIND } from "../../domain/builds/vehicle-kinds";
import { type BoardBay, type BoardVehicle, vehiclesOn } from "../../domain/floor/board";
import { formatFeet, mm } from "../../domain/units/length";
import { Button, buttonClass } from "../../ui/button";
import { Sign } from "../../ui/sign";
import { ageInWords, whenInWords } from "../time";
import { stageSign } from "./bay-rows";
import { useFloorView } from "./floor-context";
import { bayBox, type PlanExtent } from "./geometry";
import { HoldPart } from "./hold-part";
import { focusThing } from "./slide-home";
import { type Doing, useDoing } from "./use-doing";
import { bayName, firstName, levelWords } from "./words";

/** Where the panel opens: on the aisle's side of the bay, above the yard for what stands there. */
function panelPlace(bay: BoardBay | null, extent: PlanExtent): { style: CSSProperties; side: string } {
  if (!bay || bay.outside)
    return { side: "yard", style: { "--x": extent.w / 2, "--y": extent.yard.y } as CSSProperties };
  const box = bayBox(bay);
  const low = box.y + box.h / 2 > extent.building.h / 2;
  const x = bay.mouth === "west" ? box.x : box.x + box.w;
  const side = `${bay.mouth === "west" ? "left" : "right"}-${low ? "low" : "high"}`;
  return { side, style: { "--x": x, "--y": low ? box.y + box.h : box.y } as CSSProperties };
}

/** The selected vehicle: what is known of it and what can be done with it. */
export function VehiclePanel({ extent }: { extent: PlanExtent }) {
  const { floor, selected, select } = useFloorView();
  const standing = vehiclesOn(floor.board).find(({ vehicle }) => vehicle.buildId === selected);
  const panel = useRef<HTMLElement>(null);
  const buildId = standing?.vehicle.buildId;
  useEffect(() => {
    if (buildId !== undefined) panel.current?.focus();
  }, [buildId]);
  if (!standing || floor.hand) return null;
  const { vehicle, bay } = standing;
  const { style, side } = panelPlace(bay, extent);
  const close = () => {
    select(null);
    focusThing(`vehicle-${vehicle.buildId}`);
  };
  return (
    <section
      ref={panel}
      tabIndex={-1}
      className="vehicle-panel"
      data-side={side}
      style={style}
      aria-label={`${vehicle.nickname}, ${bayName(bay)}`}
      onKeyDown={(event) => event.key === "Escape" && close()}
    >
      <header>
        <h2>
          {vehicle.nickname} <span>{vehicle.code}</span>
        </h2>
        <Button tone="quiet" size="s" onClick={close}>
          Close
        </Button>
      </header>
      <Facts vehicle={vehicle} bay={bay} />
      <Actions key={vehicle.buildId} vehicle={vehicle} bay={bay} />
    </section>
  );
}

function Facts({ vehicle, bay }: { vehicle: BoardVehicle; bay: BoardBay | null }) {
  const { now, timeZone } = useFloorView();
  const level = levelWords(vehicle.level, now);
  const { stage } = vehicle;
  return (
    <dl>
      <dt>Vehicle</dt>
      <dd>
        {VEHICLE_KIND[vehicle.kind].label}, {formatFeet(mm(vehicle.lengthMm))}
      </dd>
      <dt>Stands</dt>
      <dd>
        {bay ? `Bay ${bay.number}` : "Yard"}, {ageInWords(vehicle.since, now)}, by{" "}
        {firstName(vehicle.movedBy)}
      </dd>
      <dt>Stage</dt>
      <dd className="flex items-center gap-1.5">
        {stage ? (
          <>
            <Sign name={stageSign(stage.kind)} size={16} /> {STAGE_LABEL[stage.kind]},{" "}
            {stage.state === "under-way" ? "under way" : "not begun"}
          </>
        ) : (
          "All done"
        )}
      </dd>
      <dt>Level</dt>
      <dd>{level ?? "Not taken on this visit"}</dd>
      <dt>Planned</dt>
      <dd>
        {vehicle.endsAt ? `till ${whenInWords(vehicle.endsAt, now, timeZone)}` : "not planned"}
        {vehicle.promisedAt ? `, promised ${whenInWords(vehicle.promisedAt, now, timeZone)}` : ", no promise"}
      </dd>
    </dl>
  );
}

function Actions({ vehicle, bay }: { vehicle: BoardVehicle; bay: BoardBay | null }) {
  const { floor, may, openMove, select } = useFloorView();
  const doing = useDoing();
  const inHand = () => {
    select(null);
    floor.pickUp({ kind: "vehicle", buildId: vehicle.buildId, by: "tap" });
  };
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap gap-2">
        <LayoutPart vehicle={vehicle} doing={doing} />
        {may.measure ? <StagePart vehicle={vehicle} doing={doing} /> : null}
      </div>
      {may.move ? (
        <div className="flex flex-wrap gap-2">
          <Button size="s" onClick={() => openMove({ kind: "vehicle", vehicle, bay })}>
            <Sign name="move" size={16} /> Move…
          </Button>
          <Button size="s" onClick={inHand}>
            Take in hand
          </Button>
        </div>
      ) : null}
      {may.hold ? <HoldPart vehicle={vehicle} doing={doing} /> : null}
      {doing.words ? (
        <p role="alert" className="text-[13px] text-oxide">
          {doing.words}
        </p>
      ) : null}
      <p className="flex gap-4 text-[13px]">
        {may.seeBuilds ? (
          <Link className="font-medium text-line underline" to={`/builds/${vehicle.buildId}`}>
            Build
          </Link>
        ) : null}
        {may.printTags ? (
          <Link className="font-medium text-line underline" to={`/builds/${vehicle.buildId}/tag`}>
            Tag
          </Link>
        ) : null}
      </p>
    </div>
  );
}

function LayoutPart({ vehicle, doing }: { vehicle: BoardVehicle; doing: Doing }) {
  const { may } = useFloorView();
  if (vehicle.layoutId !== null)
    return may.seeLayouts ? (
      <Link className={buttonClass("go", "s")} to={`/layouts/${vehicle.layoutId}`}>
        Open layout
      </Link>
    ) : null;
  if (!may.measure) return null;
  return (
    <Button
      tone="go"
      size="s"
      busy={doing.busy === "layout"}
      onClick={() => void doing.startLayout(vehicle.buildId)}
    >
      Start layout
    </Button>
  );
}

function StagePart({ vehicle, doing }: { vehicle: BoardVehicle; doing: Doing }) {
  const { stage } = vehicle;
  if (!stage) return null;
  const state = stage.state === "under-way" ? "done" : "under-way";
  return (
    <Button
      size="s"
      busy={doing.busy === "stage"}
      onClick={() =>
        void doing.run("stage", `/builds/${vehicle.buildId}/stage`, { stageId: stage.id, state })
      }
    >
      {state === "done" ? "Finish" : "Start"} {STAGE_LABEL[stage.kind].toLowerCase()}
    </Button>
  );
}
