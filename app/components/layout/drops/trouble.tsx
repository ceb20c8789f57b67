import type { Suggestion, TieFit } from "../../../domain/layout/drops";
import {
  formatInches,
  formatMillimetres,
  type LengthUnit,
  type Millimetres,
  mm,
} from "../../../domain/units/length";
import { Button } from "../../../ui/button";
import { Sign } from "../../../ui/sign";
import { smallLength } from "../lengths";

const REASON: Record<Suggestion["kind"], string> = {
  "inch-burnt": "inch was burnt",
  "inch-lost": "inch was taken off twice",
  centimetres: "other unit was read",
  "digits-swapped": "digits were swapped",
  "six-for-nine": "6 and 9 were mixed up",
  "marks-swapped": "marks were swapped",
  "sides-swapped": "sides were swapped",
};

/** A tape's reading as it would be typed. */
export const asTyped = (length: Millimetres, unit: LengthUnit): string =>
  unit === "in" ? formatInches(length, { denominator: 32 }) : formatMillimetres(length, 1);

/** What this tape alone would have to read so that all meet: "7/16 in less would fit"; null when it fits as it is. */
export function wouldFitWords(
  taped: Millimetres,
  wouldFit: Millimetres | null,
  unit: LengthUnit,
): string | null {
  if (wouldFit === null || Math.abs(wouldFit - taped) < 0.8) return null;
  return `${smallLength(mm(wouldFit - taped), unit)} ${wouldFit < taped ? "less" : "more"} would fit`;
}

export type Correction = { mark: string; typed: string; reason: string };

type Props = {
  fit: TieFit;
  unit: LengthUnit;
  busy: boolean;
  again: (mark: string | null) => void;
  correct: (correction: Correction) => void;
};

/** Tapes that do not meet: what it looks like, and measuring again before anything else. Nothing is changed by itself. */
export function Trouble({ fit, unit, busy, again, correct }: Props) {
  const [first] = fit.suggestions;
  const places = new Set(fit.suggestions.map((one) => one.mark ?? one.kind));
  const only = first && places.size === 1 ? first : null;
  const typed = only?.reading ? asTyped(only.reading, unit) : null;
  return (
    <div className="grid gap-3" role="status">
      <div className="flex items-center gap-3">
        <Sign name="off" size={44} className="text-brass-ink" />
        <div>
          {places.size > 1 ? (
            <ul className="text-[17px] font-semibold leading-snug">
              {fit.suggestions.slice(0, 3).map((one) => (
                <li key={one.words}>{one.words}</li>
              ))}
            </ul>
          ) : null}
          <p className="text-[19px] leading-snug font-semibold">{only ? only.words : fit.advice}</p>
          <p className="text-[15px] text-concrete-700">
            Nothing is changed for you.{" "}
            {typed ? "What was read stays in the record beside the new reading." : ""}
          </p>
        </div>
      </div>
      <div className="flex flex-wrap gap-2.5">
        <Button
          tone="go"
          size="l"
          className="flex-1 whitespace-nowrap"
          onClick={() => again(only?.mark ?? null)}
        >
          {only?.mark ? `Tape ${only.mark} again` : "Tape them again"}
        </Button>
        {only?.mark && typed ? (
          <Button
            size="l"
            className="flex-[2] whitespace-nowrap"
            busy={busy}
            onClick={() =>
              correct({ mark: only.mark ?? "", typed, reason: `Tape ${only.mark}: ${REASON[only.kind]}` })
            }
          >
            Keep {typed}: {REASON[only.kind]}
          </Button>
        ) : null}
      </div>
    </div>
  );
}
