import { Button } from "../../ui/button";
import { Sign } from "../../ui/sign";
import { useFloorView } from "./floor-context";
import { thingTitle } from "./hand";

/** After the first of two taps: what is in hand, and the ways on. */
export function HandBar() {
  const { floor, select, openMove } = useFloorView();
  const { hand, thing } = floor;
  if (hand?.by !== "tap" || !thing) return null;
  const aim = thing.kind === "vehicle" ? "tap a bay or the yard" : "tap a bay, or the crew to be free";
  return (
    <section
      className="hand-bar"
      aria-label="In hand"
      onKeyDown={(event) => event.key === "Escape" && floor.letGo()}
    >
      <Sign name="move" size={24} />
      <p>
        <b>{thingTitle(thing)} in hand:</b> {aim}
      </p>
      <Button
        size="m"
        onClick={() => {
          floor.letGo();
          openMove(thing);
        }}
      >
        {thing.kind === "vehicle" ? "Move…" : "Put on…"}
      </Button>
      {thing.kind === "vehicle" ? (
        <Button
          size="m"
          onClick={() => {
            floor.letGo();
            select(thing.vehicle.buildId);
          }}
        >
          Open
        </Button>
      ) : null}
      <Button size="m" tone="quiet" onClick={floor.letGo}>
        Put back
      </Button>
    </section>
  );
}
