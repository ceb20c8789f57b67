import { useEffect, useRef, useState } from "react";
import { Form, Link, useNavigation } from "react-router";
import type { LengthUnit } from "../../domain/units/length";
import { ErrorSummary } from "../../ui/field";
import { bookInForm } from "../../validation/book-in";
import { BookInFields } from "./book-in-fields";
import type { Customer } from "./customer-pick";
import { faultsOf } from "./form-faults";

export type Refused = {
  kind: string;
  message: string;
  fields: Record<string, string>;
  typed: Record<string, string>;
  detail: Record<string, unknown>;
};

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
        <BookInFields {...{ customers, unit, typed, faults, busy, putRight }} />
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
