import { BAY_KIND_LABEL } from "../../domain/floor/bays";
import type { Check } from "../../domain/floor/move-check";
import { formatFeet, mm } from "../../domain/units/length";
import { Button } from "../../ui/button";
import { Dialog } from "../../ui/dialog";
import { useFloorView } from "./floor-context";
import { type Thing, thingTitle, verdictsFor } from "./hand";
import { VerdictWord } from "./verdict-word";
import { bayName, firstName, mouthWord, type PlaceKey } from "./words";

/** Every place with its verdict, in the same words as the drag: the way to move without dragging. */
export function MoveDialog({ thing, onClose }: { thing: Thing; onClose: () => void }) {
  const { floor, now } = useFloorView();
  const verdicts = [...verdictsFor(floor.board, thing, now)];
  const title = thing.kind === "vehicle" ? `Move ${thingTitle(thing)}` : `Put ${thingTitle(thing)} on`;
  const stay = stayWords(thing);
  const choose = (place: PlaceKey) => {
    onClose();
    floor.put(thing, place);
  };
  return (
    <Dialog
      title={title}
      sign="move"
      open
      onClose={onClose}
      actions={
        <Button tone="quiet" onClick={onClose}>
          {stay}
        </Button>
      }
    >
      <ul className="move-list" aria-label="Places">
        {verdicts.map(([place, check]) => (
          <li key={place}>
            <PlaceButton place={place} check={check} thing={thing} onChoose={() => choose(place)} />
          </li>
        ))}
      </ul>
    </Dialog>
  );
}

function stayWords(thing: Thing): string {
  if (thing.kind === "vehicle") return `Leave it in ${bayName(thing.bay)}`;
  const { person } = thing;
  return `Leave ${firstName(person.name)} ${person.on ? `on ${person.on.nickname}` : "free"}`;
}

type PlaceButtonProps = { place: PlaceKey; check: Check; thing: Thing; onChoose: () => void };

function PlaceButton({ place, check, thing, onChoose }: PlaceButtonProps) {
  const { floor } = useFloorView();
  const { name, more } = describePlace(floor.board.bays, place, thing);
  const refused = check.verdict === "refuses";
  const reasons = check.reasons.map((reason) => reason.words).join(" ");
  return (
    <button
      type="button"
      data-verdict={check.verdict}
      aria-disabled={refused}
      aria-label={`${name}: ${mouthWord(check)}. ${reasons}`.trim()}
      onClick={() => !refused && onChoose()}
    >
      <span>
        <b>{name}</b> <span className="text-concrete-500">{more}</span>
      </span>
      <VerdictWord check={check} />
      {reasons ? <span className="move-reasons">{reasons}</span> : null}
    </button>
  );
}

type Bays = ReturnType<typeof useFloorView>["floor"]["board"]["bays"];

function describePlace(bays: Bays, place: PlaceKey, thing: Thing): { name: string; more: string } {
  if (place === "yard") return { name: "Yard", more: "" };
  if (place === "free")
    return {
      name: "Free",
      more: thing.kind === "person" ? `${firstName(thing.person.name)} on nothing` : "",
    };
  const card = bays.find((one) => one.bay.id === place);
  if (!card) return { name: "Gone", more: "" };
  const { bay, vehicle } = card;
  if (thing.kind === "person")
    return { name: `Bay ${bay.number}`, more: vehicle ? vehicle.nickname : "empty" };
  return { name: `Bay ${bay.number}`, more: `${BAY_KIND_LABEL[bay.kind]}, ${formatFeet(mm(bay.lengthMm))}` };
}
