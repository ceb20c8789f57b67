import { formatInches, inchParts, mm } from "../domain/units/length";

type Props = { mm: number; denominator?: 16 | 32 | 64; className?: string; signed?: boolean };

/** Inches as on a tape: whole and a diagonal fraction, read out as "26 1/2". */
export function Inches({ mm: length, denominator = 16, className = "", signed = false }: Props) {
  const parts = inchParts(mm(length), denominator);
  const plus = signed && parts.sign === "" && (parts.whole > 0 || parts.numerator > 0) ? "+" : "";
  return (
    <span className={className}>
      <span className="sr-only">{formatInches(mm(length), { denominator, sign: signed })}</span>
      <span aria-hidden="true">
        {parts.sign || plus}
        {parts.whole > 0 || parts.numerator === 0 ? parts.whole : ""}
        {parts.numerator > 0 ? (
          <span className="fr">
            {parts.numerator}/{parts.denominator}
          </span>
        ) : null}
      </span>
    </span>
  );
}
