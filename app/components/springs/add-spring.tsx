import { useEffect, useRef, useState } from "react";
import { useFetcher } from "react-router";
import { formatLength, type LengthUnit, mm } from "../../domain/units/length";
import { parseLength } from "../../domain/units/parse-length";
import { Button } from "../../ui/button";
import { Field } from "../../ui/field";
import { springForm } from "../../validation/spring";
import { faultsOf } from "../counter/form-faults";
import { SpringDrawing } from "./spring-drawing";
import { pinWords } from "./spring-facts";

type Added =
  | { ok: true; words: string }
  | { ok: false; message: string; fields: Record<string, string>; typed: Record<string, string> };

/** A new spring, measured flat on the bench; the drawing follows what is typed. */
export function AddSpring({
  unit,
  nextRack,
  onClose,
}: {
  unit: LengthUnit;
  nextRack: number;
  onClose: () => void;
}) {
  const fetcher = useFetcher<Added>();
  const [faults, setFaults] = useState<Record<string, string>>({});
  const [typed, setTyped] = useState({ length: "", frontHalf: "", leaves: "5" });
  const form = useRef<HTMLFormElement>(null);
  const refused = fetcher.data && !fetcher.data.ok ? fetcher.data : null;
  const added = fetcher.data?.ok ? fetcher.data : null;
  useEffect(() => {
    setFaults(refused?.fields ?? {});
  }, [refused]);
  useEffect(() => {
    if (!added) return;
    form.current?.reset();
    setTyped({ length: "", frontHalf: "", leaves: "5" });
  }, [added]);
  const hint = unit === "in" ? "As on the tape: 26 1/2" : "As on the tape: 673";
  return (
    <section aria-labelledby="add-head" className="grid gap-4 border-brass border-t-4 bg-chalk p-4 sm:p-6">
      <h2 id="add-head" className="font-label font-semibold text-2xl">
        A spring for the rack
      </h2>
      <fetcher.Form
        ref={form}
        method="post"
        noValidate
        className="grid gap-4"
        onChange={(event) => {
          const field: EventTarget = event.target;
          if (!(field instanceof HTMLInputElement)) return;
          if (field.name in typed) setTyped((before) => ({ ...before, [field.name]: field.value }));
          // What is being put right is no longer called wrong.
          setFaults(({ [field.name]: _, ...others }) => others);
        }}
        onSubmit={(event) => {
          const found = faultsOf(new FormData(event.currentTarget), springForm(unit));
          setFaults(found);
          if (Object.keys(found).length > 0) event.preventDefault();
        }}
      >
        <input type="hidden" name="do" value="add" />
        <div className="grid gap-4 sm:grid-cols-3 lg:grid-cols-6">
          <Field
            key={nextRack}
            label="Rack number"
            name="rackNumber"
            inputMode="numeric"
            autoComplete="off"
            defaultValue={refused?.typed.rackNumber ?? nextRack}
            error={faults.rackNumber}
          />
          <Field
            label="Length, eye to eye"
            name="length"
            autoComplete="off"
            hint={hint}
            error={faults.length}
          />
          <Field
            label="Front half, eye to pin"
            name="frontHalf"
            autoComplete="off"
            error={faults.frontHalf}
          />
          <Field
            label="Leaves"
            name="leaves"
            inputMode="numeric"
            autoComplete="off"
            defaultValue="5"
            error={faults.leaves}
          />
          <Field
            label="Leaf width"
            name="leafWidth"
            autoComplete="off"
            defaultValue={unit === "in" ? "2 1/2" : "63.5"}
            error={faults.leafWidth}
          />
          <Field label="Note" name="note" autoComplete="off" maxLength={120} error={faults.note} />
        </div>
        <Preview {...typed} unit={unit} />
        <div className="flex flex-wrap items-center gap-3">
          <Button tone="go" size="m" type="submit" busy={fetcher.state !== "idle"}>
            Put it in the rack
          </Button>
          <Button tone="plain" size="m" type="button" onClick={onClose}>
            Close
          </Button>
          <p role="status" className={refused ? "font-medium text-oxide" : "font-medium text-moss"}>
            {refused && Object.keys(refused.fields).length === 0 ? refused.message : (added?.words ?? "")}
          </p>
        </div>
      </fetcher.Form>
    </section>
  );
}

function Preview({
  length,
  frontHalf,
  leaves,
  unit,
}: {
  length: string;
  frontHalf: string;
  leaves: string;
  unit: LengthUnit;
}) {
  const whole = length.trim() === "" ? null : parseLength(length, unit);
  const front = frontHalf.trim() === "" ? null : parseLength(frontHalf, unit);
  if (!whole?.ok || !front?.ok || front.value <= 0 || front.value >= whole.value)
    return (
      <p className="text-concrete-700">
        Lay it flat: clamp it until the main leaf is straight, then tape along the leaf.
      </p>
    );
  const rear = formatLength(mm(whole.value - front.value), unit, { denominator: 32 });
  const words = `${pinWords(whole.value, front.value, unit)}; rear half ${rear}`;
  return (
    <div className="grid max-w-2xl gap-1">
      <SpringDrawing
        lengthMm={whole.value}
        frontHalfMm={front.value}
        leaves={Number(leaves) || 1}
        longestMm={whole.value}
        name={`The spring flat: ${words}`}
      />
      <p className="font-medium">{words}</p>
    </div>
  );
}
