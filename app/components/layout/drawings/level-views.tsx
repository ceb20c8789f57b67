import { type Degrees, degrees, formatDegrees } from "../../../domain/units/angle";

/** How much more than it is the tilt is drawn. */
const DRAWN = 10;
const MOST = 14;

type Props = { noseHighDeg: Degrees; rightHighDeg: Degrees; allowedDeg: Degrees };

/** The frame on its stands from behind and from the left, with the bob on its cross or off it. */
export function LevelViews({ noseHighDeg, rightHighDeg, allowedDeg }: Props) {
  return (
    <div className="grid gap-px md:grid-cols-2">
      <View
        title="From behind"
        tilt={-rightHighDeg}
        slope={rightHighDeg}
        allowed={allowedDeg}
        ends={["left", "right"]}
        span={150}
        words={["left side high", "right side high"]}
      />
      <View
        title="From the left"
        tilt={noseHighDeg}
        slope={noseHighDeg}
        allowed={allowedDeg}
        ends={["nose", "tail"]}
        span={250}
        words={["nose low", "nose high"]}
      />
    </div>
  );
}

type ViewProps = {
  title: string;
  /** Turned to the right on the picture, degrees; positive lowers the right end. */
  tilt: number;
  slope: Degrees;
  allowed: Degrees;
  ends: [string, string];
  span: number;
  words: [string, string];
};

function View({ title, tilt, slope, allowed, ends, span, words }: ViewProps) {
  const turn = Math.max(-MOST, Math.min(MOST, tilt * DRAWN));
  const good = Math.abs(slope) <= allowed;
  const size = formatDegrees(degrees(Math.abs(slope)));
  const [W, H, floor, top] = [320, 190, 160, 66];
  const half = span / 2;
  const rise = Math.tan((turn * Math.PI) / 180) * half;
  const [left, right] = [
    { x: W / 2 - half, y: top - rise },
    { x: W / 2 + half, y: top + rise },
  ];
  // The bob hangs from the frame's middle; its cross was set square under it, so it leaves it as the frame leans.
  const cross = W / 2 + Math.sin((turn * Math.PI) / 180) * (floor - top);
  const said = good
    ? `${title}: true within ${formatDegrees(allowed)}`
    : `${title}: ${slope > 0 ? words[1] : words[0]} ${size}`;
  return (
    <figure className="m-0 bg-concrete-100">
      <svg viewBox={`0 0 ${W} ${H}`} className="block h-auto w-full" role="img" aria-label={said}>
        <text x="12" y="20" fontSize="15" fontWeight="700">
          {title}
        </text>
        <text x="12" y="37" fontSize="13.5" fontWeight="500" fill="var(--brass-ink)">
          tilt drawn {DRAWN} times
        </text>
        <path d={`M14 ${floor}H${W - 14}`} stroke="var(--ink)" strokeWidth="1.8" />
        <path
          d={Array.from({ length: 22 }, (_, i) => `M${20 + i * 13} ${floor + 1}l-6 7`).join("")}
          stroke="var(--concrete-300)"
        />
        {[left, right].map((end) => (
          <g key={end.x} stroke="var(--ink)" fill="var(--chalk)" strokeWidth="1.6">
            <path d={`M${end.x - 5} ${end.y + 12}h10l14 ${floor - end.y - 12}h-38z`} fill="none" />
            <path d={`M${end.x - 4} ${end.y + 12}h8v18h-8z`} fill="var(--concrete-200)" />
          </g>
        ))}
        <g
          transform={`rotate(${turn} ${W / 2} ${top})`}
          className="motion-safe:transition-transform motion-safe:duration-500"
        >
          <rect
            x={W / 2 - half - 12}
            y={top - 6}
            width={span + 24}
            height="14"
            fill="var(--chalk)"
            stroke="var(--ink)"
            strokeWidth="1.8"
          />
        </g>
        <path
          d={`M${W / 2 - half - 26} ${top}H${W / 2 + half + 26}`}
          stroke="var(--concrete-500)"
          strokeDasharray="2 4"
        />
        <path d={`M${W / 2} ${top}V${floor - 40}`} stroke="var(--brass)" strokeWidth="1.8" />
        <path
          d={`M${W / 2 - 6} ${floor - 40}h12l1.500 6-7.500 24-7.500-24z`}
          fill="var(--brass)"
          stroke="var(--brass-ink)"
        />
        <path
          d={`M${cross - 11} ${floor}h22M${cross} ${floor - 11}v22`}
          stroke="var(--line)"
          strokeWidth="2.6"
        />
        <text
          x={W - 14}
          y={30}
          textAnchor="end"
          fontSize="25"
          fontWeight="700"
          fill={good ? "var(--moss)" : "var(--oxide)"}
          style={{ fontFamily: "var(--font)" }}
        >
          {size}
        </text>
        <text
          x={W / 2}
          y={H - 6}
          textAnchor="middle"
          fontSize="14"
          fontWeight="700"
          fill={good ? "var(--moss)" : "var(--oxide)"}
        >
          {good ? "bob on its cross" : "bob off its cross"}
        </text>
        <text x="18" y={H - 6} fontSize="13.5">
          {ends[0]}
        </text>
        <text x={W - 18} y={H - 6} textAnchor="end" fontSize="13.5">
          {ends[1]}
        </text>
      </svg>
    </figure>
  );
}
