import type { LayoutView, SignatureView } from "../../../domain/layout/view";
import { linesOf, type WorkLine, type WorkListId } from "../../../domain/layout/work-list";
import { ProgressTape } from "../../../ui/progress-tape";
import { Sign } from "../../../ui/sign";
import { dayAndClock, dayAndDate } from "../../time";
import { signatureOf } from "./signed";

const TITLE: Record<WorkListId, string> = {
  weld: "Weld list",
  torque: "Torque list",
  finish: "Before it leaves",
};

type Props = { view: LayoutView; list: WorkListId; inHand: string | null; onPick: (id: string) => void };

/** A list, a row a line: what it is, who signed it and when. A press puts a line in hand. */
export function WorkRows({ view, list, inHand, onPick }: Props) {
  const { done, of } = view.work.progress[list];
  return (
    <section aria-label={TITLE[list]}>
      <h2 className="work-title">
        {TITLE[list]}
        <ProgressTape of={of} done={done} width={120} />
        <span>
          {done} of {of}
        </span>
      </h2>
      <ol className="work-rows">
        {linesOf(list).map((line) => {
          const signature = signatureOf(view, line);
          return (
            <li key={line.id}>
              <button
                type="button"
                className="work-row"
                data-state={signature?.state ?? "open"}
                aria-pressed={line.id === inHand}
                onClick={() => onPick(line.id)}
              >
                <Sign
                  name={signature ? (signature.state === "pass" ? "approve" : "off") : "todo"}
                  size={24}
                  className="work-sign"
                />
                <span className="min-w-0">
                  <b>{line.label}</b>
                  <small>{rowWords(view, line, signature)}</small>
                </span>
              </button>
            </li>
          );
        })}
      </ol>
    </section>
  );
}

function rowWords(view: LayoutView, line: WorkLine, signature: SignatureView | null): string {
  if (!signature) return "not signed";
  const by = `${signature.made.name}, ${dayAndClock(signature.made.at, view.shop.timeZone)}`;
  return [by, signature.state === "pass" ? keptWords(view, line, signature) : `not good: ${signature.words}`]
    .filter(Boolean)
    .join(" · ");
}

/** What was typed with a signature, in a line; empty when nothing was. */
export function keptWords(view: LayoutView, line: WorkLine, signature: SignatureView): string {
  const { wanted, read, tool, words, dueAt, figures } = signature;
  if (line.kind === "bolt")
    return `${read} of ${wanted}, ${tool}${dueAt ? `, again by ${dayAndDate(dueAt, view.shop.timeZone)}` : ""}${words ? `, ${words}` : ""}`;
  if (line.kind === "figures" && figures.length > 0)
    return [...figures.map((figure) => `${figure.id.replace("-", " ")} ${figure.typed}°`), words]
      .filter(Boolean)
      .join(", ");
  return [tool, words].filter(Boolean).join(", ");
}
