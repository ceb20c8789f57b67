import { type FormEvent, useState } from "react";
import { HOLD_KINDS, HOLD_LABEL } from "../../domain/builds/stages";
import type { BoardVehicle } from "../../domain/floor/board";
import { Button } from "../../ui/button";
import { Field, SelectField } from "../../ui/field";
import { Sign } from "../../ui/sign";
import { ageInWords } from "../time";
import { useFloorView } from "./floor-context";
import type { Doing } from "./use-doing";

/** The hold that stands with its way out, or the way to put one on. */
export function HoldPart({ vehicle, doing }: { vehicle: BoardVehicle; doing: Doing }) {
  const { now } = useFloorView();
  const [open, setOpen] = useState(false);
  const { buildId, hold } = vehicle;
  if (hold)
    return (
      <div className="panel-hold">
        <p>
          <Sign name="hold" size={16} /> <b>Hold, {ageInWords(hold.placedAt, now)}.</b>{" "}
          {HOLD_LABEL[hold.kind]}: {hold.words}
        </p>
        <Button
          size="s"
          busy={doing.busy === "hold"}
          onClick={() => void doing.run("hold", "/floor/hold", { buildId, action: "lift" })}
        >
          Lift the hold
        </Button>
      </div>
    );
  if (!open)
    return (
      <Button size="s" tone="stop" className="justify-self-start" onClick={() => setOpen(true)}>
        <Sign name="hold" size={16} /> Hold…
      </Button>
    );
  const place = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const fields = {
      buildId,
      action: "place",
      kind: String(form.get("kind")),
      words: String(form.get("words")),
    };
    if ((await doing.run("hold", "/floor/hold", fields)).ok) setOpen(false);
  };
  return (
    <form className="panel-hold" noValidate onSubmit={(event) => void place(event)}>
      <SelectField label="It waits for" name="kind" defaultValue="parts">
        {HOLD_KINDS.map((kind) => (
          <option key={kind} value={kind}>
            {HOLD_LABEL[kind]}
          </option>
        ))}
      </SelectField>
      <Field
        label="Why, in a few words"
        name="words"
        autoComplete="off"
        autoFocus
        maxLength={160}
        error={doing.fields.words}
      />
      <div className="flex gap-2">
        <Button size="s" tone="stop" type="submit" busy={doing.busy === "hold"}>
          Put on hold
        </Button>
        <Button size="s" tone="quiet" onClick={() => setOpen(false)}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
