import { BEFORE_WELDING } from "../../../domain/layout/caution";
import type { LayoutView } from "../../../domain/layout/view";
import { type WorkLine, type WorkStates, whyNotYet } from "../../../domain/layout/work-list";
import { Sign } from "../../../ui/sign";
import { dayAndClock } from "../../time";
import type { May } from "../may";
import { SignForm } from "./sign-form";
import { keptWords } from "./work-rows";

type Props = {
  view: LayoutView;
  line: WorkLine;
  may: May;
  person: string;
  states: WorkStates;
  done: () => void;
  /** It was taken: the next line comes into hand. */
  signed: () => void;
};

/** The one line that is worked on: what has to be so, what was signed before, and the signature. */
export function LineInHand({ view, line, may, person, states, done, signed }: Props) {
  const noWeld = line.list === "weld" ? may.whyNoWeld : null;
  const early = states.get(line.id) === "pass" ? null : whyNotYet(line, states);
  const why = may.measure ? (noWeld ?? early) : null;
  return (
    <section className="work-line" aria-label="Line in hand">
      <h2 tabIndex={-1}>{line.label}</h2>
      {line.kind === "ready" ? (
        <ul className="grid gap-2">
          {BEFORE_WELDING.map((words) => (
            <li key={words} className="flex items-start gap-2.5 text-[17px] leading-snug">
              <Sign name="caution" size={22} className="mt-0.5 text-oxide" />
              {words}
            </li>
          ))}
        </ul>
      ) : (
        <p className="text-[17px] leading-snug text-concrete-700">{line.where}</p>
      )}
      <Before view={view} line={line} />
      {why ? (
        <p className="work-why">
          <Sign name="lock" size={24} />
          {why}
        </p>
      ) : may.measure ? (
        <SignForm
          view={view}
          line={line}
          person={person}
          isSigned={states.get(line.id) === "pass"}
          done={done}
          signed={signed}
        />
      ) : null}
    </section>
  );
}

/** Who signed this line before, newest first. */
function Before({ view, line }: { view: LayoutView; line: WorkLine }) {
  const signatures = view.work.signed[line.id] ?? [];
  if (signatures.length === 0) return null;
  return (
    <ol className="work-before" aria-label="Signed before">
      {signatures.map((signature) => (
        <li key={signature.made.at} data-state={signature.state}>
          <b>{signature.state === "pass" ? "Signed" : "Not good"}</b> {signature.made.name},{" "}
          {dayAndClock(signature.made.at, view.shop.timeZone)}
          {signature.state === "pass"
            ? keptWords(view, line, signature) && `: ${keptWords(view, line, signature)}`
            : `: ${signature.words}`}
        </li>
      ))}
    </ol>
  );
}
