import { Link } from "react-router";
import { BAY_KIND_LABEL } from "../../domain/floor/bays";
import type { BoardBay, BoardVehicle } from "../../domain/floor/board";
import { formatFeet, mm } from "../../domain/units/length";
import { Button, buttonClass } from "../../ui/button";
import { Sign } from "../../ui/sign";
import { Tape } from "../../ui/tape";
import { ToolCheck } from "../../ui/tool-check";
import { PlannedEnd, StageRow, StateRow } from "./bay-rows";
import { useFloorView } from "./floor-context";
import type { Need } from "./needs";
import { NeedsYou, Undo, type Undoable } from "./rail";
import { PutBackNote } from "./standing-vehicle";
import { bayTitle } from "./words";
import { YardWords } from "./yard";

/** The Floor on a phone: the bays in walking order, then the yard. Moving is by Move… only. */
export function PhoneList({ needs, undoable }: { needs: readonly Need[]; undoable: Undoable }) {
  const { floor, may } = useFloorView();
  const { bays, yard } = floor.board;
  return (
    <div className="phone-floor">
      <NeedsYou needs={needs} />
      <ol className="grid gap-3" aria-label="Bays in walking order">
        {bays.map(({ bay, vehicle }) => (
          <li key={bay.id} className="phone-bay" aria-label={bayTitle(bay)}>
            <header className="flex items-baseline gap-2">
              <b className="font-label text-[26px] leading-none font-bold">{bay.number}</b>
              <span className="floor-label">
                {BAY_KIND_LABEL[bay.kind]} · {formatFeet(mm(bay.lengthMm))}
              </span>
              {vehicle ? <PlannedEnd vehicle={vehicle} /> : null}
            </header>
            {vehicle ? (
              <PhoneVehicle vehicle={vehicle} bay={bay} />
            ) : (
              <p className="text-concrete-700">Nothing stands here.</p>
            )}
          </li>
        ))}
      </ol>
      <section aria-labelledby="phone-yard" className="grid gap-3">
        <h2 id="phone-yard" className="rail-head">
          <span>Yard</span> <span className="floor-label">{yard.length}</span>
        </h2>
        {yard.map((vehicle) => (
          <div key={vehicle.buildId} className="phone-bay">
            <PhoneVehicle vehicle={vehicle} bay={null} />
          </div>
        ))}
      </section>
      {may.move ? <Undo undoable={undoable} /> : null}
    </div>
  );
}

function PhoneVehicle({ vehicle, bay }: { vehicle: BoardVehicle; bay: BoardBay | null }) {
  const { floor, may, openMove, changed } = useFloorView();
  const words = changed.get(vehicle.buildId);
  const key = `vehicle-${vehicle.buildId}`;
  const sending = floor.pending.some((one) => one.key === key);
  return (
    <div className="grid gap-1">
      <div className="flex items-center gap-2">
        <Tape name={vehicle.nickname} code={vehicle.code} />
        {vehicle.crew.map((one) => (
          <span key={one.personId} role="img" aria-label={one.name}>
            <ToolCheck initials={one.initials} state="on" size={26} />
          </span>
        ))}
      </div>
      {bay ? (
        <>
          <StageRow vehicle={vehicle} />
          <StateRow vehicle={vehicle} />
        </>
      ) : (
        <YardWords vehicle={vehicle} />
      )}
      {sending ? (
        <p className="text-concrete-700">Sending</p>
      ) : words ? (
        <p className="text-line">{words}</p>
      ) : null}
      {floor.putBack?.key === key ? (
        <PutBackNote words={floor.putBack.words} onRead={floor.readPutBack} />
      ) : null}
      <div className="flex gap-2 pt-1">
        {may.move ? (
          <Button
            size="m"
            data-thing={key}
            onClick={() => openMove({ kind: "vehicle", vehicle, bay })}
            aria-label={`Move ${vehicle.nickname}…`}
          >
            <Sign name="move" size={16} /> Move…
          </Button>
        ) : null}
        {vehicle.layoutId !== null && may.seeLayouts ? (
          <Link className={buttonClass("plain", "m")} to={`/layouts/${vehicle.layoutId}`}>
            Layout
          </Link>
        ) : null}
        {may.seeBuilds ? (
          <Link className={buttonClass("quiet", "m")} to={`/builds/${vehicle.buildId}`}>
            Build
          </Link>
        ) : null}
      </div>
    </div>
  );
}
