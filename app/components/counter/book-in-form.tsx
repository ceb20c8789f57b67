import { type ReactNode, useEffect, useRef, useState } from "react";
import { Form, Link, useNavigation } from "react-router";
import { VEHICLE_KIND, VEHICLE_KINDS, type VehicleKind } from "../../domain/builds/vehicle-kinds";
import { formatInches, inches, type LengthUnit } from "../../domain/units/length";
import { Button, buttonClass } from "../../ui/button";
import { ErrorSummary, Field, SelectField, TextAreaField } from "../../ui/field";
import { bookInForm, NICKNAME_LONGEST, PROMISE_TIME } from "../../validation/book-in";
import { type Customer, CustomerPick } from "./customer-pick";
import { faultsOf } from "./form-faults";
import { StagePick } from "./stage-pick";
import { VehiclePreview } from "./vehicle-preview";

export type Refused = {
  kind: string;
  message: string;
  fields: Record<string, string>;
  typed: Record<string, string>;
  detail: Record<string, unknown>;
};

const kindOf = (typed: string | undefined): VehicleKind | null =>
  VEHICLE_KINDS.find((kind) => kind === typed) ?? null;

const LABEL: Record<string, string> = {
  customerId: "Customer",
  customerName: "Customer",
  customerPhone: "Phone",
  customerEmail: "E-mail",
  kind: "Kind",
  nickname: "Nickname",
  length: "Length",
  width: "Width",
  wanted: "In the customer's words",
  tyre: "Tyres",
  tyreRadius: "Tyre radius",
  loadedRadius: "Loaded radius",
  tyreWidth: "Tyre width",
  wheelbase: "Wheelbase",
  approach: "Approach at least",
  promiseDate: "Promised for",
  promiseTime: "Time",
  template: "Stages",
};

/** The faults as sentences that name their field, in the order of the form. */
function sentences(faults: Record<string, string>): string[] {
  const order = Object.keys(LABEL);
  const place = (name: string) => (order.includes(name) ? order.indexOf(name) : order.length);
  return Object.entries(faults)
    .sort(([a], [b]) => place(a) - place(b))
    .map(([name, words]) => `${LABEL[name] ?? "Hours"}: ${words}`);
}

/** A kind's usual size as a person of this shop would type it. */
const usual = (sizeIn: number, unit: LengthUnit) =>
  unit === "in" ? formatInches(inches(sizeIn)) : String(Math.round(inches(sizeIn) / 10) * 10);

/** The book-in form. The browser names faults at once by the server's own rules; the server decides. */
export function BookInForm({
  customers,
  unit,
  refused,
}: {
  customers: readonly Customer[];
  unit: LengthUnit;
  /** The server's answer to the last try, with what was typed. */
  refused: Refused | null;
}) {
  const busy = useNavigation().formAction?.startsWith("/counter/book-in") ?? false;
  const [faults, setFaults] = useState(refused?.fields ?? {});
  /** Counts the tries that failed: each brings the person to the first field that is wrong. */
  const [tries, setTries] = useState(0);
  const form = useRef<HTMLFormElement>(null);
  const fail = (found: Record<string, string>) => {
    setFaults(found);
    setTries((before) => before + 1);
  };
  const putRight = (...names: string[]) => {
    if (names.some((name) => faults[name]))
      setFaults((all) => Object.fromEntries(Object.entries(all).filter(([name]) => !names.includes(name))));
  };
  const failed = useRef(fail);
  failed.current = fail;
  useEffect(() => {
    if (refused) failed.current(refused.fields);
  }, [refused]);
  useEffect(() => {
    if (tries > 0) form.current?.querySelector<HTMLElement>("[aria-invalid=true]")?.focus();
  }, [tries]);
  const typed = refused?.typed ?? {};

  return (
    <main className="mx-auto w-full max-w-[88rem] p-4 sm:p-6">
      <Form
        ref={form}
        method="post"
        noValidate
        aria-label="Book in"
        className="grid gap-6"
        onSubmit={(event) => {
          const found = faultsOf(new FormData(event.currentTarget), bookInForm(unit));
          const good = Object.keys(found).length === 0;
          if (!good || busy) event.preventDefault();
          if (!good) fail(found);
        }}
        onChange={(event) => {
          // What is being put right is no longer called wrong; the next try looks at everything again.
          const field: EventTarget = event.target;
          if ("name" in field) putRight(String(field.name));
        }}
      >
        <h1 className="font-label font-semibold text-3xl">Book in a vehicle</h1>
        <Faults faults={faults} refused={refused} />
        <Fields {...{ customers, unit, typed, faults, busy, putRight }} />
      </Form>
    </main>
  );
}

function Faults({ faults, refused }: { faults: Record<string, string>; refused: Refused | null }) {
  if (Object.keys(faults).length > 0) return <ErrorSummary problems={sentences(faults)} />;
  if (!refused || refused.kind === "invalid") return null;
  const twin = refused.detail.buildId;
  return (
    <p role="alert" className="border-oxide border-l-4 bg-oxide-wash px-4 py-3 font-medium text-oxide">
      {refused.message}{" "}
      {typeof twin === "number" ? (
        <Link to={`/builds/${twin}`} className="underline">
          See the one that was booked in
        </Link>
      ) : null}
    </p>
  );
}

type FieldsProps = {
  customers: readonly Customer[];
  unit: LengthUnit;
  typed: Record<string, string>;
  faults: Record<string, string>;
  busy: boolean;
  /** These fields were filled by us: what was wrong with them is so no longer. */
  putRight: (...names: string[]) => void;
};

function Fields({ customers, unit, typed, faults, busy, putRight }: FieldsProps) {
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
