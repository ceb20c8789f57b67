import { formatLength, type LengthUnit, mm } from "../../domain/units/length";

export type HangerCard = {
  id: number;
  name: string;
  holes: { number: number; aheadMm: number; aheadTyped: string }[];
};

/** The hangers with their holes, to one scale, front to the right. */
export function Hangers({ hangers, unit }: { hangers: readonly HangerCard[]; unit: LengthUnit }) {
  const longest = Math.max(100, ...hangers.flatMap((hanger) => hanger.holes.map((hole) => hole.aheadMm)));
  return (
    <section aria-labelledby="hangers-head" className="grid gap-3 border-concrete-300 border-t pt-5">
      <h2 id="hangers-head" className="font-label font-semibold text-2xl">
        Hangers
      </h2>
      {hangers.length === 0 ? (
        <p className="text-concrete-700">No hanger is written down yet; Setup has them.</p>
      ) : null}
      <ul className="grid gap-5 md:grid-cols-2 xl:grid-cols-3">
        {hangers.map((hanger) => (
          <li key={hanger.id} className="grid content-start gap-1">
            <p className="font-semibold">{hanger.name}</p>
            <HolePlate holes={hanger.holes} longestMm={longest} />
            <p className="text-concrete-700">
              {hanger.holes.length} {hanger.holes.length === 1 ? "hole" : "holes"}
              {hanger.holes
                .filter((hole) => hole.aheadMm !== 0)
                .map(
                  (hole) =>
                    `; ${hole.number} is ${formatLength(mm(hole.aheadMm), unit, { denominator: 32 })} ahead`,
                )}
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}

function HolePlate({ holes, longestMm }: { holes: HangerCard["holes"]; longestMm: number }) {
  const edge = 22;
  const last = Math.max(0, ...holes.map((hole) => hole.aheadMm));
  return (
    <svg
      viewBox={`0 0 ${longestMm + 2 * edge + 10} 58`}
      className="block h-20 w-auto max-w-full"
      aria-hidden="true"
    >
      <rect
        x="3"
        y="3"
        width={last + 2 * edge - 6}
        height="34"
        rx="5"
        className="fill-concrete-200 stroke-ink"
        strokeWidth="1.6"
      />
      {holes.map((hole) => (
        <g key={hole.number}>
          <circle
            cx={edge + hole.aheadMm}
            cy="20"
            r="6.4"
            className="fill-chalk stroke-ink"
            strokeWidth="1.6"
          />
          <text
            x={edge + hole.aheadMm}
            y="53"
            textAnchor="middle"
            fontSize="13"
            fontWeight="600"
            className="fill-ink font-label"
          >
            {hole.number}
          </text>
        </g>
      ))}
    </svg>
  );
}
