import { type ReactNode, useState } from "react";
import { Link } from "react-router";
import { VEHICLE_KIND, VEHICLE_KINDS, type VehicleKind } from "../../domain/builds/vehicle-kinds";
import { formatInches, inches, type LengthUnit } from "../../domain/units/length";
import { Button, buttonClass } from "../../ui/button";
import { Field, SelectField, TextAreaField } from "../../ui/field";
import { NICKNAME_LONGEST, PROMISE_TIME } from "../../validation/book-in";
import { type Customer, CustomerPick } from "./customer-pick";
import { StagePick } from "./stage-pick";
import { VehiclePreview } from "./vehicle-preview";

const kindOf = (typed: string | undefined): VehicleKind | null =>
  VEHICLE_KINDS.find((kind) => kind === typed) ?? null;

/** A kind's usual size as a person of this shop would type it. */
const usual = (sizeIn: number, unit: LengthUnit) =>
  unit === "in" ? formatInches(inches(sizeIn)) : String(Math.round(inches(sizeIn) / 10) * 10);

type FieldsProps = {
  customers: readonly Customer[];
  unit: LengthUnit;
  typed: Record<string, string>;
  faults: Record<string, string>;
  busy: boolean;
  /** These fields were filled by us: what was wrong with them is so no longer. */
  putRight: (...names: string[]) => void;
};

/** The fields of the book-in form, with the vehicle drawn as it is typed. */
export function BookInFields({ customers, unit, typed, faults, busy, putRight }: FieldsProps) {
  const [kind, setKind] = useState(kindOf(typed.kind));
  const [nickname, setNickname] = useState(typed.nickname ?? "");
  const [length, setLength] = useState(typed.length ?? "");
  const [width, setWidth] = useState(typed.width ?? "");
  /** A usual size takes the place of an empty field or of another kind's usual size, never of a measured one. */
  const chooseKind = (next: VehicleKind | null) => {
    const before = kind && VEHICLE_KIND[kind];
    const isUsual = (value: string, sizeIn: number | undefined) =>
      value.trim() === "" || (sizeIn !== undefined && value === usual(sizeIn, unit));
    if (next) {
      const { lengthIn, widthIn } = VEHICLE_KIND[next];
      if (isUsual(length, before?.lengthIn)) setLength(usual(lengthIn, unit));
      if (isUsual(width, before?.widthIn)) setWidth(usual(widthIn, unit));
    }
    setKind(next);
    putRight("kind", "length", "width");
  };
  const hint = unit === "in" ? "As on the tape: 189, 15' 9 or 480 cm" : "As on the tape: 4800 or 480 cm";
  return (
    <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
      <div className="grid gap-8">
        <Part title="Whose vehicle">
          <CustomerPick customers={customers} typed={typed} faults={faults} />
        </Part>
        <Part title="The vehicle">
          <div className="grid gap-4 sm:grid-cols-2">
            <SelectField
              label="Kind"
              name="kind"
              value={kind ?? ""}
              error={faults.kind}
              onChange={(event) => chooseKind(kindOf(event.target.value))}
            >
              <option value="">Choose…</option>
              {VEHICLE_KINDS.map((known) => (
                <option key={known} value={known}>
                  {VEHICLE_KIND[known].label}
                </option>
              ))}
            </SelectField>
            <Field
              label="Nickname"
              name="nickname"
              value={nickname}
              maxLength={NICKNAME_LONGEST}
              autoComplete="off"
              hint="Goes on the tape and the tag."
              error={faults.nickname}
              onChange={(event) => setNickname(event.target.value)}
            />
            <Field
              label="Length"
              name="length"
              value={length}
              autoComplete="off"
              hint={hint}
              error={faults.length}
              onChange={(event) => setLength(event.target.value)}
            />
            <Field
              label="Width"
              name="width"
              value={width}
              autoComplete="off"
              hint="Mirrors folded."
              error={faults.width}
              onChange={(event) => setWidth(event.target.value)}
            />
          </div>
        </Part>
        <Part title="What is wanted">
          <TextAreaField
            label="In the customer's words"
            name="wanted"
            rows={4}
            maxLength={2000}
            defaultValue={typed.wanted}
            error={faults.wanted}
          />
          <Sizes typed={typed} faults={faults} unit={unit} />
        </Part>
        <Part title="Promise">
          <div className="grid gap-4 sm:grid-cols-2">
            <Field
              label="Promised for"
              name="promiseDate"
              type="date"
              defaultValue={typed.promiseDate}
              error={faults.promiseDate}
              hint="Empty: no promise."
            />
            <Field
              label="Time"
              name="promiseTime"
              type="time"
              defaultValue={typed.promiseTime}
              error={faults.promiseTime}
              hint={`Empty: ${PROMISE_TIME}.`}
            />
          </div>
        </Part>
      </div>
      <div className="grid gap-8">
        <VehiclePreview {...{ kind, nickname, length, width, unit }} />
        <Part title="Stages">
          <StagePick typed={typed} faults={faults} />
        </Part>
        <div className="flex flex-wrap gap-3">
          <Button tone="go" size="l" type="submit" busy={busy}>
            Book in
          </Button>
          <Link to="/counter" className={buttonClass("plain", "l")}>
            Cancel
          </Link>
        </div>
      </div>
    </div>
  );
}

function Sizes({ typed, faults, unit }: Pick<FieldsProps, "typed" | "faults" | "unit">) {
  const field = (name: string, label: string, hint?: string) => (
    <Field
      label={label}
      name={name}
      autoComplete="off"
      defaultValue={typed[name]}
      error={faults[name]}
      hint={hint}
    />
  );
  const example = unit === "in" ? "16 1/2" : "419";
  return (
    <fieldset className="grid gap-4">
      <legend className="pb-3 text-concrete-700">Sizes asked for, where they are known</legend>
      <div className="grid gap-4 sm:grid-cols-2 xl:grid-cols-3">
        {field("tyre", "Tyres", "As on the sidewall: 35 × 12.5")}
        {field("tyreRadius", "Tyre radius", "Free, not under load.")}
        {field("loadedRadius", "Loaded radius", `Hub to ground, such as ${example}.`)}
        {field("tyreWidth", "Tyre width")}
        {field("wheelbase", "Wheelbase")}
        {field("approach", "Approach at least", "Whole degrees.")}
      </div>
    </fieldset>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section aria-label={title} className="grid gap-4">
      <h2 className="border-concrete-300 border-b pb-1 font-label font-semibold text-xl">{title}</h2>
      {children}
    </section>
  );
}
