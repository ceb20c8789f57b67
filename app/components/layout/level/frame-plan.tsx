/** A stand on the plan: millimetres from the middle, x forward, y to the left; null while its place is not known. */
export type PlanStand = { place: string; x: number | null; y: number | null };

type Props = { stands: readonly PlanStand[]; inHand: string | null; spread: string | null };

const W = 324;
const H = 176;
const MID = { x: W / 2, y: 84 };
const ROOM = { x: 232, y: 74 };

/** Whole millimetres that fit the picture both ways, at one scale. */
function scaleFor(stands: readonly PlanStand[]): number {
  const reach = (axis: "x" | "y") => Math.max(1, ...stands.map((stand) => Math.abs(stand[axis] ?? 0))) * 2;
  return Math.min(ROOM.x / reach("x"), ROOM.y / reach("y"));
}

const CROSS_MEMBERS = [-0.56, -0.2, 0.2, 0.56];

/** The frame from above with its stands where they are, at one scale; the nose to the right, left side up. */
export function FramePlan({ stands, inHand, spread }: Props) {
  const known = stands.flatMap(({ place, x, y }) => (x === null || y === null ? [] : [{ place, x, y }]));
  const k = scaleFor(known);
  const railY = Math.max(26, ...known.map((stand) => Math.abs(stand.y) * k));
  const railX = Math.max(110, ...known.map((stand) => Math.abs(stand.x) * k)) + 22;
  return (
    <svg
      viewBox={`0 0 ${W} ${H}`}
      className="level-plan"
      role="img"
      aria-label="The stands under the frame, from above, nose to the right"
    >
      {CROSS_MEMBERS.map((at) => (
        <rect
          key={at}
          x={MID.x + at * railX * 1.6 - 4}
          y={MID.y - railY}
          width={8}
          height={railY * 2}
          className="fill-chalk stroke-concrete-500"
        />
      ))}
      {[-railY, railY].map((y) => (
        <rect
          key={y}
          x={MID.x - railX}
          y={MID.y + y - 5}
          width={railX * 2}
          height={10}
          strokeWidth={1.4}
          className="fill-chalk stroke-concrete-700"
        />
      ))}
      <path
        d={`M${MID.x - railX - 6} ${MID.y}H${MID.x + railX + 6}`}
        className="stroke-line"
        strokeDasharray="14 4 3 4"
      />
      <text
        x={MID.x + 3}
        y={MID.y - 7}
        textAnchor="middle"
        fontSize={15}
        className="fill-concrete-700 font-label"
      >
        nose →
      </text>
      {known.map((stand) => (
        <PlanMark
          key={stand.place}
          x={MID.x + stand.x * k}
          y={MID.y - stand.y * k}
          side={stand.x < 0 ? -1 : 1}
          inHand={stand.place === inHand}
        />
      ))}
      {spread ? (
        <text x={MID.x} y={18} textAnchor="middle" fontSize={15} className="fill-concrete-700 font-label">
          {spread}
        </text>
      ) : null}
    </svg>
  );
}

function PlanMark({ x, y, side, inHand }: { x: number; y: number; side: -1 | 1; inHand: boolean }) {
  const edge = side < 0 ? 0 : W;
  const stroke = inHand ? "stroke-brass-ink" : "stroke-ink";
  return (
    <g strokeWidth={inHand ? 2.6 : 1.6}>
      <path
        d={`M${edge} ${y}H${x + side * 13}`}
        strokeWidth={1.2}
        className={inHand ? "stroke-brass-ink" : "stroke-concrete-500"}
      />
      <rect
        x={x - 13}
        y={y - 13}
        width={26}
        height={26}
        className={`${stroke} ${inHand ? "fill-brass-wash" : "fill-concrete-200"}`}
      />
      <path
        d={`M${x - 13} ${y - 13}l26 26m0 -26l-26 26`}
        strokeWidth={1}
        className={inHand ? "stroke-brass-ink" : "stroke-concrete-500"}
      />
      <circle cx={x} cy={y} r={5} strokeWidth={1.8} className={`fill-chalk ${stroke}`} />
    </g>
  );
}
