import type { Check } from "../../domain/floor/move-check";
import { Sign } from "../../ui/sign";
import { useFloorView } from "./floor-context";
import { lettingGo, placeName, type Thing, wherePossible } from "./hand";
import { type PlaceKey, ruleSign, VERDICT_SIGN, VERDICT_WORDS } from "./words";

const TONE = { takes: "text-line", asks: "text-brass-ink", refuses: "text-oxide" } as const;

function headOf(check: Check, where: string): string {
  if (check.reasons[0]?.rule === "same") return "It stands here";
  if (where === "free") return check.verdict === "takes" ? "Free" : "Free already";
  const words = { takes: "Goes in", asks: "Asks first in", refuses: "Will not go in" }[check.verdict];
  return `${words} ${where}`;
}

/** Beside what is in hand: every reason at once, then what letting go does. */
export function HandNote({ thing, place, check }: { thing: Thing; place: PlaceKey; check: Check }) {
  const { floor } = useFloorView();
  const { board, verdicts } = floor;
  const same = check.reasons[0]?.rule === "same";
  return (
    <>
      <h3 className={same ? "text-concrete-700" : TONE[check.verdict]}>
        <Sign name={same ? "move" : VERDICT_SIGN[check.verdict]} size={20} />
        {headOf(check, placeName(board, place))}
      </h3>
      {same || check.reasons.length === 0 ? null : (
        <ul>
          {check.reasons.map((reason) => (
            <li key={reason.rule}>
              <Sign name={ruleSign(reason.rule)} size={16} />
              <span>{reason.words}</span>
            </li>
          ))}
        </ul>
      )}
      <footer>
        <span>
          {lettingGo(board, thing, place, check)} <kbd className="floor-key">Esc</kbd>
        </span>
        {check.verdict === "refuses" && verdicts && thing.kind === "vehicle" ? (
          <span>{wherePossible(board, verdicts)}</span>
        ) : null}
      </footer>
    </>
  );
}

/** The same, as one sentence for those who listen. */
export function spokenVerdict(where: string, check: Check): string {
  const reasons = check.reasons.map((reason) => reason.words).join(" ");
  if (check.reasons[0]?.rule === "same") return `${where}: ${reasons}`;
  return `${where}: ${VERDICT_WORDS[check.verdict]}. ${reasons}`.trim();
}
