import { Link } from "react-router";
import type { LengthUnit } from "../../domain/units/length";
import { asMeasured } from "./as-measured";

export type Asked = {
  tyre: string | null;
  loadedRadius: string | null;
  tyreRadius: string | null;
  tyreWidth: string | null;
  wheelbase: string | null;
  approachDeg: number | null;
};

/** What the customer wants, in their words and in numbers. */
export function AskedFor({
  wanted,
  asked,
  unit,
  putRight,
}: {
  wanted: string;
  asked: Asked;
  unit: LengthUnit;
  /** Where it is put right; null for those who may not. */
  putRight: string | null;
}) {
  const rows: [string, string | null][] = [
    ["Tyres", asked.tyre],
    ["Tyre radius", asMeasured(asked.tyreRadius, unit)],
    ["Loaded radius", asMeasured(asked.loadedRadius, unit)],
    ["Tyre width", asMeasured(asked.tyreWidth, unit)],
    ["Wheelbase", asMeasured(asked.wheelbase, unit)],
    ["Approach at least", asked.approachDeg === null ? null : `${asked.approachDeg}°`],
  ];
  const given = rows.filter(([, value]) => value !== null);
  return (
    <section aria-labelledby="asked-head" className="grid gap-3">
      <div className="flex items-baseline justify-between gap-4">
        <h2 id="asked-head" className="label">
          Asked for
        </h2>
        {putRight ? (
          <Link className="font-medium text-line underline" to={putRight}>
            Put right
          </Link>
        ) : null}
      </div>
      <p className="whitespace-pre-line text-lg leading-snug">{wanted}</p>
      {given.length > 0 ? (
        <dl className="grid">
          {given.map(([label, value]) => (
            <div key={label} className="flex justify-between gap-4 border-concrete-200 border-t py-1.5">
              <dt className="text-concrete-700">{label}</dt>
              <dd className="font-semibold">{value}</dd>
            </div>
          ))}
        </dl>
      ) : (
        <p className="text-concrete-700">No sizes were given. The layout will ask for those it needs.</p>
      )}
    </section>
  );
}
