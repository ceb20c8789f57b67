import type { Option } from "../../../domain/layout/options";
import type { LayoutView } from "../../../domain/layout/view";
import { halves } from "../../../domain/springs/leaf-spring";
import { formatDegrees } from "../../../domain/units/angle";
import { formatDecimalInches, formatInches, inches } from "../../../domain/units/length";
import { optionOf } from "./plan-figures";
import { type Scale, type Spot, spotAt } from "./viewport";

type Props = { view: LayoutView; optionKey: string; pinnedKey?: string | null };

const W = 560;
const H = 320;
const GROUND = 262;
const HALO = {
  paintOrder: "stroke",
  stroke: "var(--concrete-100)",
  strokeWidth: 5,
  strokeLinejoin: "round",
} as const;
/** Used for the picture alone while no tyre was given; said so in words. */
const NO_TYRE = inches(16);

/**
 * From the right, to scale: the spring flat between its eyes, the axle under its pin, the tyre on the ground, the approach
 * line, the opening's edges. Only what was measured; the body's outline was not, and is not drawn.
 */
export function SideView({ view, optionKey, pinnedKey = null }: Props) {
  const option = optionOf(view, optionKey);
  const other = optionOf(view, pinnedKey);
  if (!option || !view.openings) return null;
  const loaded = view.asked.loadedRadius ?? NO_TYRE;
  const { front, rear } = halves(option.spring, option.turned);
  const behind = option.axleStation - (view.fixedEye === "ahead" ? rear : option.half);
  const low = view.drops.find((drop) => drop.point === "low-front")?.reading?.height ?? null;
  const lowStation = lowPointStation(view);
  const ends = [
    behind,
    option.hole.station,
    option.axleStation - loaded,
    option.axleStation + loaded,
    view.openings.left.front,
    view.openings.left.rear,
    lowStation ?? option.hole.station,
  ];
  const [from, to] = [Math.min(...ends) - 160, Math.max(...ends) + 240];
  const k = Math.min((W - 20) / (to - from), (GROUND - 50) / (loaded * 2.25));
  const scale: Scale = { k, ox: W / 2 - (k * (from + to)) / 2, oy: GROUND };
  const at = (station: number, height: number): Spot => spotAt(scale, { x: station, y: height });
  const eye = loaded * 1.28;
  const axle = at(option.axleStation, loaded);
  const [eyeF, eyeR] = [at(option.axleStation + front, eye), at(option.axleStation - rear, eye)];
  const pin = at(option.axleStation, eye);
  const x = (station: number) => at(station, 0).x;
  return (
    <svg
      viewBox={`0 0 ${W} ${H}`}
      className="block size-full bg-concrete-100"
      role="img"
      aria-label={sideWords(view, option)}
    >
      <rect x="0" y={GROUND} width={W} height={H - GROUND} fill="var(--concrete-200)" />
      <path d={`M0 ${GROUND}H${W}`} stroke="var(--ink)" strokeWidth="2" />
      {(["front", "rear"] as const).map((edge) => (
        <path
          key={edge}
          d={`M${x(view.openings?.left[edge] ?? 0)} 30V${GROUND - 40}`}
          stroke="var(--concrete-500)"
          strokeWidth="1.2"
          strokeDasharray="3 3"
        />
      ))}
      {view.axle ? (
        <>
          <path
            d={`M${x(view.axle.line.station)} 34V${GROUND}`}
            stroke="var(--line)"
            strokeWidth="1.3"
            strokeDasharray="2 4"
          />
          <text
            x={x(view.axle.line.station) - 6}
            y="24"
            textAnchor="end"
            fontSize="15"
            fill="var(--line)"
            {...HALO}
          >
            centre {formatDecimalInches(view.axle.line.station)}
          </text>
        </>
      ) : null}
      {other ? (
        <circle
          cx={x(other.axleStation)}
          cy={axle.y}
          r={loaded * k}
          fill="none"
          stroke="var(--concrete-500)"
          strokeDasharray="2 4"
          strokeWidth="1.6"
        />
      ) : null}
      <circle
        cx={axle.x}
        cy={axle.y}
        r={loaded * k}
        fill="var(--concrete-300)"
        fillOpacity=".55"
        stroke="var(--ink)"
        strokeWidth="2"
      />
      <circle
        cx={axle.x}
        cy={axle.y}
        r={loaded * k * 0.5}
        fill="var(--concrete-100)"
        stroke="var(--concrete-500)"
      />
      <path d={`M${axle.x} 34V${GROUND}`} stroke="var(--line)" strokeWidth="8" opacity=".16" />
      <path d={`M${axle.x} 34V${GROUND}`} stroke="var(--line)" strokeWidth="2" />
      <text x={axle.x + 7} y="24" fontSize="16" fontWeight="700" fill="var(--line)" {...HALO}>
        axle line {formatDecimalInches(option.axleStation)}
      </text>
      <path d={`M${eyeR.x} ${eyeR.y}H${eyeF.x}`} stroke="var(--brass)" strokeWidth="6" />
      <path d={`M${pin.x} ${pin.y - 9}v18`} stroke="var(--ink)" strokeWidth="4" />
      {view.holes.map((hole) => (
        <circle
          key={hole.id}
          cx={x(hole.station)}
          cy={eyeF.y}
          r={hole.id === option.hole.id ? 6 : 4}
          fill={hole.id === option.hole.id ? "var(--brass)" : "var(--chalk)"}
          stroke="var(--ink)"
          strokeWidth="1.6"
        />
      ))}
      <circle
        cx={view.fixedEye === "ahead" ? eyeR.x : eyeF.x}
        cy={eyeR.y}
        r="5"
        fill="var(--chalk)"
        stroke="var(--ink)"
        strokeWidth="1.6"
      />
      <text
        x={x(option.hole.station)}
        y={eyeF.y - 13}
        textAnchor="middle"
        fontSize="14"
        fontWeight="600"
        {...HALO}
      >
        hole {option.hole.number}
      </text>
      {option.approach !== null && low && lowStation !== null ? (
        <Approach {...{ option, at, loaded, low: { station: lowStation, height: low.mm } }} />
      ) : null}
      <Halves
        from={x(option.axleStation - rear)}
        middle={axle.x}
        to={x(option.axleStation + front)}
        rear={formatInches(rear)}
        front={formatInches(front)}
      />
      <text x="10" y={H - 8} fontSize="13.5" fill="var(--concrete-700)">
        From the right, to scale, spring flat. Eye height and body outline not measured.
        {view.asked.loadedRadius === null ? " Tyre not given: drawn 16 in." : ""}
      </text>
    </svg>
  );
}

function lowPointStation(view: LayoutView): number | null {
  const reading = view.drops.find((drop) => drop.point === "low-front")?.reading;
  if (!reading || !view.frame) return null;
  const turn = (-view.frame.angle * Math.PI) / 180;
  const [dx, dy] = [reading.at.x - view.frame.origin.x, reading.at.y - view.frame.origin.y];
  return Math.cos(turn) * dx - Math.sin(turn) * dy;
}

type ApproachProps = {
  option: Option;
  at: (station: number, height: number) => Spot;
  loaded: number;
  low: { station: number; height: number };
};

/** The line that touches the loaded tyre and the lowest point. */
function Approach({ option, at, loaded, low }: ApproachProps) {
  const angle = ((option.approach ?? 0) * Math.PI) / 180;
  const touch = at(option.axleStation + loaded * Math.sin(angle), loaded - loaded * Math.cos(angle));
  const point = at(low.station, low.height);
  const beyond = { x: point.x + (point.x - touch.x) * 0.35, y: point.y + (point.y - touch.y) * 0.35 };
  return (
    <g>
      <path
        d={`M${touch.x} ${touch.y}L${beyond.x} ${beyond.y}`}
        stroke="var(--ink)"
        strokeWidth="1.5"
        strokeDasharray="12 4 3 4"
      />
      <circle cx={touch.x} cy={touch.y} r="3" fill="var(--ink)" />
      <circle cx={point.x} cy={point.y} r="4" fill="var(--ink)" />
      <text
        x={point.x + 6}
        y={point.y + 38}
        fontSize="22"
        fontWeight="700"
        style={{ fontFamily: "var(--font)" }}
        {...HALO}
      >
        {formatDegrees(option.approach as NonNullable<Option["approach"]>)}
      </text>
    </g>
  );
}

function Halves({
  from,
  middle,
  to,
  rear,
  front,
}: {
  from: number;
  middle: number;
  to: number;
  rear: string;
  front: string;
}) {
  const y = GROUND + 22;
  return (
    <g stroke="var(--ink)" fill="none">
      <path
        d={`M${from} ${y}H${to}M${from} ${y - 8}v16M${middle} ${y - 8}v16M${to} ${y - 8}v16`}
        strokeWidth="1.1"
      />
      {[
        [(from + middle) / 2, rear],
        [(middle + to) / 2, front],
      ].map(([x, words]) => (
        <text
          key={String(words) + x}
          x={x}
          y={y + 7}
          textAnchor="middle"
          fontSize="19"
          fontWeight="700"
          fill="var(--ink)"
          stroke="var(--concrete-200)"
          strokeWidth="9"
          paintOrder="stroke"
          style={{ fontFamily: "var(--font)" }}
        >
          {words}
        </text>
      ))}
    </g>
  );
}

function sideWords(view: LayoutView, option: Option): string {
  const parts = [
    `Side view: the axle stands ${formatDecimalInches(option.axleStation)} inches ahead of the rear datum pair`,
    `in hole ${option.hole.number}`,
    view.axle ? `${formatDecimalInches(option.shift)} inches from the opening's centre` : "",
    option.approach === null ? "" : `approach ${formatDegrees(option.approach)}`,
  ];
  return `${parts.filter((part) => part !== "").join(", ")}.`;
}
