import type { GaugeLevel } from "../../../domain/layout/level";
import { formatDegrees } from "../../../domain/units/angle";
import { Sign } from "../../../ui/sign";
import { ReadingField } from "../reading-field";
import { angleIn, GAUGE_PLACES, slopeAt } from "./gauge";
import { twistDegreesWords } from "./level-verdict";
import type { LevelWay } from "./level-way";

/** The angle gauge, read and turned end for end at four places: its own error cancels. */
export function GaugeWay({
  draft,
  change,
  fields,
  readOnly,
  check,
  now,
}: LevelWay & { now: GaugeLevel | null }) {
  return (
    <div className="grid gap-2.5 p-2.5">
      <p className="flex items-center gap-2 px-1 text-[15px] text-concrete-700">
        <Sign name="turn" size={22} /> Read, turn the gauge end for end on the same spot, read again. Minus is
        typed as −.
      </p>
      <div className="grid gap-2.5 sm:grid-cols-2">
        {GAUGE_PLACES.map(({ id, label, plus }) => {
          const slope = slopeAt(id, draft);
          return (
            <fieldset key={id} className="gauge-card">
              <legend className="sr-only">{label}</legend>
              <p className="flex items-baseline justify-between gap-2 font-semibold">
                {label}
                <span className="text-[22px] font-bold">{slope === null ? "" : formatDegrees(slope)}</span>
              </p>
              <p className="text-[15px] text-concrete-500">{plus}</p>
              <div className="grid grid-cols-2 gap-2.5">
                {(["first", "turned"] as const).map((way) => {
                  const name = `${way}.${id}`;
                  const value = draft[name] ?? "";
                  const unread = value.trim() !== "" && angleIn(value) === null;
                  return (
                    <ReadingField
                      key={way}
                      label={way === "first" ? "First reading" : "Turned round"}
                      quietLabel={`, ${label}`}
                      name={name}
                      value={value}
                      onChange={(text) => change({ [name]: text })}
                      onKeep={check}
                      readOnly={readOnly}
                      padUp={false}
                      error={fields[name] ?? (unread ? "Degrees with a point, for example 0.3" : undefined)}
                    />
                  );
                })}
              </div>
            </fieldset>
          );
        })}
      </div>
      {now ? (
        <p role="status" className="px-1 text-[15px] text-concrete-700">
          {now.gaugeDoubt ? (
            <b className="font-semibold text-oxide">
              The gauge's own error changed between places: do not trust it.{" "}
            </b>
          ) : (
            `The gauge itself reads ${formatDegrees(now.gaugeOffset)} off; turning it took that out. `
          )}
          {twistDegreesWords(now.twistDegrees)}
        </p>
      ) : null}
    </div>
  );
}
