import { useDraggable } from "@dnd-kit/core";
import { type CSSProperties, useRef } from "react";
import type { BoardBay, BoardVehicle } from "../../domain/floor/board";
import { Sign } from "../../ui/sign";
import { Tape } from "../../ui/tape";
import { VehiclePlan, type VehicleTone } from "../vehicle-plan";
import { useFloorView } from "./floor-context";
import { feet, NOSE_TURN, noseInset } from "./geometry";
import { vehicleName } from "./words";

/** Before the style sheet says how many pixels a foot is. */
const PX_PER_MM = 13 / 304.8;

type Props = { vehicle: BoardVehicle; bay: BoardBay | null };

/** Sizes of a vehicle as the style sheet reads them, in feet. */
export function vehicleStyle(vehicle: BoardVehicle, bay: BoardBay | null): CSSProperties {
  return {
    "--vl": feet(vehicle.lengthMm),
    "--vw": feet(vehicle.widthMm),
    "--inset": bay ? noseInset(feet(bay.lengthMm - vehicle.lengthMm)) : 0,
    "--turn": `${bay ? NOSE_TURN[bay.mouth] : 0}deg`,
  } as CSSProperties;
}

/** A vehicle where it stands, at its true length: a button that opens it, and a thing that can be taken in hand. */
export function StandingVehicle({ vehicle, bay }: Props) {
  const { floor, may, changed } = useFloorView();
  const key = `vehicle-${vehicle.buildId}`;
  const inHand = floor.hand?.kind === "vehicle" && floor.hand.buildId === vehicle.buildId;
  const sending = floor.pending.some((one) => one.kind === "vehicle" && one.buildId === vehicle.buildId);
  const words = changed.get(vehicle.buildId);
  return (
    <div
      className="standing"
      style={vehicleStyle(vehicle, bay)}
      data-left={inHand && floor.hand?.by === "drag"}
      data-sending={sending}
    >
      {words ? <span key={words} className="changed-wash" /> : null}
      <VehicleButton vehicle={vehicle} bay={bay} inHand={inHand} />
      {may.move ? <MoveButton vehicle={vehicle} bay={bay} /> : null}
      {inHand && floor.hand?.by === "drag" ? (
        <span className="stood-here">
          <Sign name="move" size={16} />
          {vehicle.nickname} stood here
        </span>
      ) : null}
      {floor.putBack?.key === key ? (
        <PutBackNote words={floor.putBack.words} onRead={floor.readPutBack} />
      ) : sending ? (
        <span className="below-vehicle text-concrete-700">
          <Sign name="unsent" size={16} /> Sending
        </span>
      ) : words ? (
        <span className="below-vehicle text-line">
          <Sign name="live" size={16} /> {words}
        </span>
      ) : null}
    </div>
  );
}

function VehicleButton({ vehicle, bay, inHand }: Props & { inHand: boolean }) {
  const { floor, may, selected, select, openMove } = useFloorView();
  const touch = useRef(false);
  const { setNodeRef, listeners, attributes } = useDraggable({
    id: `vehicle-${vehicle.buildId}`,
    data: { hand: { kind: "vehicle", buildId: vehicle.buildId } },
    disabled: !may.move,
  });
  const thing = { kind: "vehicle", vehicle, bay } as const;
  return (
    <button
      type="button"
      ref={setNodeRef}
      {...listeners}
      aria-describedby={may.move ? attributes["aria-describedby"] : undefined}
      aria-keyshortcuts={may.move ? "Space M" : undefined}
      aria-expanded={selected === vehicle.buildId}
      className="vehicle"
      data-thing={`vehicle-${vehicle.buildId}`}
      data-movable={may.move}
      data-in-hand={inHand}
      aria-label={vehicleName(vehicle, bay)}
      onPointerDown={(event) => {
        touch.current = event.pointerType === "touch";
      }}
      onContextMenu={(event) => touch.current && event.preventDefault()}
      onClick={() => {
        if (touch.current && may.move) floor.pickUp({ kind: "vehicle", buildId: vehicle.buildId, by: "tap" });
        else select(selected === vehicle.buildId ? null : vehicle.buildId);
      }}
      onKeyDown={(event) => {
        const plain = !event.ctrlKey && !event.metaKey && !event.altKey;
        if (may.move && plain && event.key.toLowerCase() === "m" && !floor.hand) {
          event.preventDefault();
          openMove(thing);
        } else listeners?.onKeyDown?.(event);
      }}
    >
      <VehicleDrawing
        vehicle={vehicle}
        tone={inHand ? (floor.hand?.by === "drag" ? "ghost" : "hand") : "rest"}
      />
    </button>
  );
}

/** The drawing and its tape; the lifted vehicle is drawn with it too. A ghost is where it stood: no tape. */
export function VehicleDrawing({ vehicle, tone }: { vehicle: BoardVehicle; tone: VehicleTone }) {
  return (
    <>
      <span className="vehicle-drawing" aria-hidden="true">
        <VehiclePlan
          kind={vehicle.kind}
          lengthMm={vehicle.lengthMm}
          widthMm={vehicle.widthMm}
          scale={PX_PER_MM}
          tone={tone}
        />
      </span>
      {tone === "ghost" ? null : (
        <span className="vehicle-tape" aria-hidden="true">
          <Tape name={vehicle.nickname} code={vehicle.code} />
        </span>
      )}
    </>
  );
}

function MoveButton({ vehicle, bay }: Props) {
  const { openMove } = useFloorView();
  return (
    <button
      type="button"
      className="vehicle-move"
      aria-label={`Move ${vehicle.nickname}…`}
      onClick={() => openMove({ kind: "vehicle", vehicle, bay })}
    >
      <Sign name="move" size={16} />
      Move…
    </button>
  );
}

/** Why something was put back; stays until it is read. */
export function PutBackNote({ words, onRead }: { words: string; onRead: () => void }) {
  return (
    <span className="below-vehicle put-back text-oxide">
      <Sign name="undo" size={16} />
      <span>
        <b className="font-semibold">Put back.</b> {words}
      </span>
      <button type="button" className="floor-key" onClick={onRead}>
        OK
      </button>
    </span>
  );
}
