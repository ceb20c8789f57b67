import type { Check } from "../../domain/floor/move-check";
import { Sign } from "../../ui/sign";
import { mouthWord, ruleSign, VERDICT_SIGN } from "./words";

/** A place's verdict as its sign and its word. */
export function VerdictWord({ check, className = "" }: { check: Check; className?: string }) {
  const [first] = check.reasons;
  const sign = check.verdict === "refuses" && first ? ruleSign(first.rule) : VERDICT_SIGN[check.verdict];
  return (
    <span className={`verdict-word inline-flex items-center gap-1.5 ${className}`}>
      <Sign name={sign} size={16} />
      {mouthWord(check)}
    </span>
  );
}
