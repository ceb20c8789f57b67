import { type LevelReading, landsOut, levelVerdict } from "../../../domain/layout/level";
import type { LayoutView } from "../../../domain/layout/view";
import { type Degrees, degrees, formatDegrees } from "../../../domain/units/angle";
import { inches, type LengthUnit, mm } from "../../../domain/units/length";
import { Verdict } from "../../../ui/verdict";
import { clock, dayAndClock } from "../../time";
import { smallLength, withUnit } from "../lengths";

/** About as high as a wheel opening's lip over the floor on stands: what a slope costs is said for a point there. */
const EXAMPLE_HEIGHT = inches(30);

/** What the slope would cost on the floor, in words; null when it costs nothing to speak of. */
export function costWords(
  reading: Pick<LevelReading, "noseHigh" | "rightHigh">,
  unit: LengthUnit,
): string | null {
  const side = Math.abs(reading.rightHigh) >= Math.abs(reading.noseHigh);
  const slope = side ? reading.rightHigh : reading.noseHigh;
  const out = mm(Math.abs(landsOut(EXAMPLE_HEIGHT, slope)));
  const words = smallLength(out, unit);
  if (words.startsWith("under") || out < 0.05) return null;
  const way = side
    ? slope > 0
      ? "out to the left"
      : "out to the right"
    : slope > 0
      ? "out to the rear"
      : "out to the front";
  return `As it stands, a point ${withUnit(EXAMPLE_HEIGHT, unit)} up lands ${words} ${way}.`;
}

type Props = {
  view: LayoutView;
  /** By what is typed now; null while that is not whole. */
  typed: Pick<LevelReading, "noseHigh" | "rightHigh"> | null;
  /** What is typed is not what the shop has. */
  dirty: boolean;
  missing: string | null;
  allowed: Degrees;
};

/** The verdict over the level step: on what is typed while it is typed, else on the last check. */
export function LevelVerdict({ view, typed, dirty, missing, allowed }: Props) {
  const { level } = view;
  if (dirty && typed) return <Reading view={view} reading={typed} allowed={allowed} checked={null} />;
  if (level?.state === "void") return <Voided view={view} missing={missing} />;
  if (dirty || !level)
    return (
      <Verdict
        tone="in-hand"
        sign="not-level"
        size="l"
        title={missing ?? "Read the frame at every stand."}
        detail={`Level the frame on its rails, not the body. Allowed ${formatDegrees(allowed)} either way.`}
        live
      />
    );
  const reading = { noseHigh: level.noseHighDeg, rightHigh: level.rightHighDeg };
  return (
    <Reading
      view={view}
      reading={reading}
      allowed={level.allowedDeg}
      checked={clock(level.made.at, view.shop.timeZone)}
    />
  );
}

type ReadingProps = Pick<Props, "view" | "allowed"> & {
  reading: Pick<LevelReading, "noseHigh" | "rightHigh">;
  checked: string | null;
};

function Reading({ view, reading, allowed, checked }: ReadingProps) {
  const verdict = levelVerdict(reading, allowed);
  const cost = costWords(reading, view.unit);
  const said = checked
    ? `Read ${checked} by ${view.level?.made.name}.`
    : "Not kept yet: check it to make it count.";
  if (verdict.isTrue)
    return (
      <Verdict
        tone={checked ? "true" : "in-hand"}
        sign="level"
        size="l"
        title={
          <>
            {verdict.headline} <span className="text-moss">{checked ? "Level true." : "True."}</span>
          </>
        }
        detail={`Allowed ${formatDegrees(allowed)}. ${said}`}
        live
      />
    );
  return (
    <Verdict
      tone="not-true"
      sign="not-level"
      size="l"
      title={
        <>
          {verdict.headline} <span className="whitespace-nowrap font-bold text-oxide">Not true yet.</span>
        </>
      }
      detail={`Allowed ${formatDegrees(allowed)}. ${cost ?? said}`}
      live
    />
  );
}

function Voided({ view, missing }: { view: LayoutView; missing: string | null }) {
  const { level, shop, drops } = view;
  const waiting = drops.filter((drop) => drop.reading !== null).length;
  const when = level?.voided ? `, ${dayAndClock(level.voided.made.at, shop.timeZone)}` : "";
  return (
    <Verdict
      tone="void"
      sign="void"
      size="l"
      title={`Level void: ${level?.voided?.reason ?? "it was broken"}${when}.`}
      detail={`${waiting === 0 ? "" : `${waiting} ${waiting === 1 ? "drop waits" : "drops wait"}. `}Level again${waiting === 0 ? "" : ", then drop one old point again"}. ${missing ?? ""}`}
      live
    />
  );
}

/** Twist in words, where the method can tell and it is worth a word. */
export function twistWords(twist: number | null, unit: LengthUnit): string | null {
  if (twist === null || twist < 0.4) return null;
  return `The frame is twisted ${smallLength(mm(twist), unit)}; stands cannot take that out.`;
}

export const twistDegreesWords = (twist: number | null): string | null =>
  twist === null || Math.abs(twist) < 0.05
    ? null
    : `The frame is twisted ${formatDegrees(degrees(Math.abs(twist)))}; stands cannot take that out.`;
