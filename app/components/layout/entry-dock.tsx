import { type ReactNode, useState } from "react";
import type { LengthUnit } from "../../domain/units/length";
import { Button } from "../../ui/button";
import { Inches } from "../../ui/length";
import { NumberPad } from "../../ui/number-pad";
import { understood } from "./lengths";

type Props = {
  /** What is being read: "Left rear stand". */
  what: string;
  hint?: ReactNode;
  value: string;
  onChange: (value: string) => void;
  onKeep: () => void;
  unit: LengthUnit;
  /** "and go to Left front". */
  next: string | null;
  caution?: string;
  busy?: boolean;
  padUp: boolean;
  setPad: (up: boolean) => void;
};

/** The reading in hand at the foot of the screen: what it is, what it is understood as, and the press that keeps it. */
export function EntryDock({
  what,
  hint,
  value,
  onChange,
  onKeep,
  unit,
  next,
  caution,
  busy,
  padUp,
  setPad,
}: Props) {
  const [padUnit, setPadUnit] = useState<LengthUnit>(unit);
  const read = understood(value, unit);
  const ok = read !== null && "mm" in read;
  return (
    <section className="layout-dock" aria-label="Reading in hand">
      <div className="flex min-h-15 items-center gap-3 border-t-2 border-concrete-500 bg-chalk px-4 py-1">
        <div className="min-w-0 flex-1">
          <p className="font-label text-[19px] leading-tight font-semibold text-brass-ink">{what}</p>
          <p
            className={`truncate font-label text-base leading-tight ${read && !ok ? "font-semibold text-oxide" : "text-concrete-700"}`}
          >
            {read && "problem" in read ? read.problem : ok ? `understood: ${read.words}` : hint}
          </p>
        </div>
        <output className="layout-value" aria-hidden="true">
          <Shown value={value} inches={ok && unit === "in" && !/[a-z'′]/i.test(value) ? read.mm : null} />
        </output>
        {padUp ? null : (
          <Button tone="go" size="l" busy={busy} disabled={!ok} onClick={onKeep}>
            Keep {ok ? value.trim() : ""}
          </Button>
        )}
        <Button
          size="l"
          tone="quiet"
          aria-pressed={padUp}
          onClick={() => setPad(!padUp)}
          className="hidden sm:inline-flex"
        >
          {padUp ? "Pad away" : "Number pad"}
        </Button>
      </div>
      {padUp ? (
        <NumberPad
          value={value}
          onChange={onChange}
          onKeep={onKeep}
          unit={padUnit}
          onUnit={setPadUnit}
          keepLabel={ok ? `Keep ${value.trim()}${/[a-z"″']/i.test(value) ? "" : ` ${unit}`}` : "Keep"}
          keepDetail={next ?? undefined}
          caution={caution}
          busy={busy}
        />
      ) : null}
    </section>
  );
}

/** The entry as it stands on the tape; as typed while it cannot be read, or carries a unit of its own. */
function Shown({ value, inches }: { value: string; inches: number | null }) {
  if (value.trim() === "") return <span className="text-concrete-300">–</span>;
  if (inches === null) return <u>{value}</u>;
  return (
    <>
      <u>
        <Inches mm={inches} denominator={32} />
      </u>
      <small>in</small>
    </>
  );
}
