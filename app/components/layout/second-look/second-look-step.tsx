import { useState } from "react";
import { Link } from "react-router";
import type { LayoutView, LookView } from "../../../domain/layout/view";
import { Button, buttonClass } from "../../../ui/button";
import { Field } from "../../../ui/field";
import { Sign } from "../../../ui/sign";
import { Verdict } from "../../../ui/verdict";
import { clock } from "../../time";
import { smallLength } from "../lengths";
import type { May } from "../may";
import { usePost } from "../use-post";
import { LookEntry } from "./look-entry";
import "./second-look.css";

const COUNT = ["No", "One", "Two", "Three", "Four"];

type Props = { view: LayoutView; may: May; person: string; done: () => void };

/** A second person reads again what weighs most, without having seen the first figures. */
export function SecondLookStep({ view, may, person, done }: Props) {
  const { secondLook, approval } = view;
  const settled = secondLook.state === "agrees" || secondLook.state === "waived";
  return (
    <>
      <LookVerdict view={view} />
      <div className="second-look">
        <ol className="look-points" aria-label="Points to read again">
          {secondLook.items.map((item) => (
            <LookPoint
              key={`${item.point} ${item.side}`}
              view={view}
              item={item}
              person={person}
              mayLook={may.measure && secondLook.state !== "waived" && approval?.state !== "approved"}
              done={done}
            />
          ))}
        </ol>
        <aside className="grid content-start gap-4">
          {settled ? (
            <Link to={`/layouts/${view.id}/step/approval`} className={`${buttonClass("go", "xl")} w-full`}>
              Go to Approval
            </Link>
          ) : null}
          <p className="text-concrete-700">
            These readings weigh most in where the axle comes to stand. Hang the bob yourself, read along the
            line and off it, and type what you read. The first figures are shown once yours are kept. Up to{" "}
            {smallLength(secondLook.within, view.unit)} apart is as near as two people get.
          </p>
          {may.approve && !settled ? <Waive view={view} done={done} /> : null}
        </aside>
      </div>
    </>
  );
}

function LookVerdict({ view }: { view: LayoutView }) {
  const { secondLook } = view;
  const left = secondLook.items.filter((item) => item.state === "to-do").length;
  const names = [...new Set(secondLook.items.flatMap((item) => item.looks.map((look) => look.made.name)))];
  switch (secondLook.state) {
    case "agrees":
      return (
        <Verdict
          tone="true"
          sign="person"
          size="l"
          title="Two people read the same."
          detail={`${names.join(" and ")} looked again. Next: the foreman signs.`}
          live
        />
      );
    case "waived":
      return (
        <Verdict
          tone="waiting"
          sign="person"
          size="l"
          title={`No second look: ${secondLook.waived?.reason ?? ""}`}
          detail={`${secondLook.waived?.made.name ?? ""} let it go on. The sheet says so.`}
          live
        />
      );
    case "apart":
      return (
        <Verdict
          tone="not-true"
          sign="off"
          size="l"
          title="Two readings are apart."
          detail="Hang the bob once more: a third reading by either of you decides."
          live
        />
      );
    case "to-do":
      return (
        <Verdict
          tone="in-hand"
          sign="person"
          size="l"
          title={`${COUNT[left] ?? left} ${left === 1 ? "point" : "points"} to read again.`}
          detail="By somebody else than who read them first."
          live
        />
      );
  }
}

type PointProps = { view: LayoutView; item: LookView; person: string; mayLook: boolean; done: () => void };

function LookPoint({ view, item, person, mayLook, done }: PointProps) {
  const own = item.state === "to-do" && item.firstBy === person;
  return (
    <li className="look-point" data-state={item.state}>
      <h2>
        <Sign
          name={item.state === "agrees" ? "same" : item.state === "apart" ? "off" : "drop"}
          size={24}
          className="flex-none"
        />
        <span>
          {item.label}
          <small>{Math.round(item.share * 100)} % of what is unsure</small>
        </span>
      </h2>
      {item.first ? <Readings view={view} item={item} /> : <p className="text-concrete-700">{item.where}</p>}
      {own ? (
        <p className="font-medium text-brass-ink">You read this one first: somebody else looks again.</p>
      ) : mayLook && item.state !== "agrees" ? (
        <LookEntry view={view} item={item} done={done} />
      ) : null}
    </li>
  );
}

/** What each read, once both have. */
function Readings({ view, item }: { view: LayoutView; item: LookView }) {
  const at = (moment: string) => clock(moment, view.shop.timeZone);
  return (
    <table className="look-readings">
      <caption className="sr-only">Readings of {item.label}</caption>
      <tbody>
        {item.first ? (
          <tr>
            <th scope="row">{item.first.made.name}</th>
            <td>{item.first.typed}</td>
            <td>first, {at(item.first.made.at)}</td>
          </tr>
        ) : null}
        {item.looks.map((look) => (
          <tr key={look.made.at} data-agrees={look.agrees}>
            <th scope="row">{look.made.name}</th>
            <td>{look.typed}</td>
            <td>
              {look.agrees ? "agrees, " : ""}
              {smallLength(look.apart, view.unit)} apart, {at(look.made.at)}
            </td>
          </tr>
        ))}
        {item.setAside.map((look) => (
          <tr key={look.made.at}>
            <th scope="row">{look.made.name}</th>
            <td>
              <s>{look.typed}</s>
            </td>
            <td>set aside: {look.reason}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** The foreman may go on without it, and has to say why. */
function Waive({ view, done }: { view: LayoutView; done: () => void }) {
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState("");
  const sending = usePost(done);
  if (!open)
    return (
      <Button size="l" onClick={() => setOpen(true)}>
        Go on without a second look…
      </Button>
    );
  return (
    <form
      className="grid gap-3 border-brass border-l-4 bg-brass-wash p-4"
      onSubmit={(event) => {
        event.preventDefault();
        void sending.send(`/layouts/${view.id}/waive-look`, { reason });
      }}
    >
      <Field
        label="Why there is no second look"
        name="reason"
        hint="Printed on the layout sheet and kept in the record."
        scale="tablet"
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        error={sending.fields.reason}
        maxLength={200}
        autoFocus
      />
      {sending.trouble && !sending.fields.reason ? (
        <p role="alert" className="font-medium text-oxide">
          {sending.trouble}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button size="l" tone="stop" type="submit" busy={sending.busy}>
          Waive it
        </Button>
        <Button size="l" tone="quiet" onClick={() => setOpen(false)}>
          Keep the second look
        </Button>
      </div>
    </form>
  );
}
