import { toFrame } from "../../../domain/layout/frame";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDecimalInches, type Millimetres, mm } from "../../../domain/units/length";
import { standing } from "../drawings/plan-figures";
import { smallLength, withUnit } from "../lengths";
import { type DrawnEnd, drawnEnds, onPicture, SCALE, SIZE, timesDrawn } from "./tack-figures";

const HALO = {
  paintOrder: "stroke",
  stroke: "var(--concrete-100)",
  strokeWidth: 5,
  strokeLinejoin: "round",
} as const;

type Built = { leftAhead: Millimetres; rightAhead: Millimetres; sideways: Millimetres };

/** The signed axle line from above, to scale, and the tacked one beside it with its errors drawn larger. */
export function TackPlan({ view, built, kept }: { view: LayoutView; built: Built | null; kept: boolean }) {
  const { tack, unit } = view;
  const { wanted, within } = tack;
  if (!wanted) return null;
  const errors = built ? [built.leftAhead, built.rightAhead, built.sideways] : [];
  const times = timesDrawn([...errors, within]);
  const ends = built ? drawnEnds(wanted, built, times, within) : null;
  const [top, bottom] = [onPicture(wanted, wanted.station, 900), onPicture(wanted, wanted.station, -900)];
  const slack = within * times * SCALE;
  return (
    <figure className="tack-plan">
      <figcaption>
        <span>From above, nose →</span>
        <b>{times === 1 ? "drawn to scale" : `errors drawn ${times} times`}</b>
      </figcaption>
      <svg
        viewBox={`0 0 ${SIZE.width} ${SIZE.height}`}
        role="img"
        aria-label={
          built
            ? `Left end ${awayWords(built.leftAhead, unit)}, right end ${awayWords(built.rightAhead, unit)}.`
            : "The signed axle line; no end is read yet."
        }
      >
        <Rails view={view} />
        <path
          d={`M0 ${SIZE.height / 2}H${SIZE.width}`}
          stroke="var(--ink)"
          strokeWidth="1.3"
          strokeDasharray="16 4 3 4"
        />
        <rect
          x={top.x - slack}
          y={top.y}
          width={2 * slack}
          height={bottom.y - top.y}
          fill="var(--line)"
          fillOpacity=".09"
        />
        <path
          d={`M${top.x} ${top.y}L${bottom.x} ${bottom.y}`}
          stroke="var(--line)"
          strokeWidth="8"
          opacity=".16"
        />
        <path d={`M${top.x} ${top.y}L${bottom.x} ${bottom.y}`} stroke="var(--line)" strokeWidth="2.2" />
        <text x={12} y={SIZE.height / 2 - 8} fontSize="14" fontWeight="600" {...HALO}>
          frame centre line
        </text>
        <text
          x={top.x + 10}
          y={SIZE.height / 2 + 22}
          fontSize="16"
          fontWeight="700"
          fill="var(--line)"
          {...HALO}
        >
          signed {formatDecimalInches(wanted.station)}
        </text>
        {ends ? (
          <>
            <path
              d={`M${ends.left.x} ${ends.left.y}L${ends.right.x} ${ends.right.y}`}
              stroke="var(--ink)"
              strokeWidth="3"
              strokeDasharray={kept ? undefined : "9 4"}
            />
            <End end={ends.left} words={awayWords(ends.left.ahead, unit)} above />
            <End end={ends.right} words={awayWords(ends.right.ahead, unit)} />
          </>
        ) : null}
      </svg>
      <p className="text-[15px] text-concrete-700">
        Chalk blue: the signed line, {smallLength(within, unit)} each way shaded. Ink: the tacked axle
        {kept ? "" : ", not kept yet"}.
      </p>
    </figure>
  );
}

/** As finely as the verdict says it. */
const awayWords = (ahead: Millimetres, unit: LayoutView["unit"]): string => {
  const size = withUnit(mm(Math.abs(ahead)), unit);
  return /^0 /.test(size) ? "on the line" : `${size} ${ahead > 0 ? "ahead" : "back"}`;
};

/** The hub face, how far it is off, and the arrow that takes it back to its line when that is too far. */
function End({ end, words, above = false }: { end: DrawnEnd; words: string; above?: boolean }) {
  const colour = end.isOut ? "var(--oxide)" : "var(--ink)";
  const y = end.y + (above ? -26 : 38);
  const way = Math.sign(end.lineX - end.x);
  const arrow = end.y + (above ? -14 : 14);
  return (
    <g>
      <rect x={end.x - 5} y={end.y - 9} width="10" height="18" fill={colour} />
      {end.isOut ? (
        <path
          d={`M${end.x} ${arrow}H${end.lineX}m${-7 * way} -5l${7 * way} 5l${-7 * way} 5`}
          stroke={colour}
          strokeWidth="2"
          fill="none"
        />
      ) : null}
      <text
        x={end.x + (end.ahead >= 0 ? 12 : -12)}
        y={y}
        textAnchor={end.ahead >= 0 ? "start" : "end"}
        fontSize="19"
        fontWeight="700"
        fill={colour}
        {...HALO}
      >
        {words}
      </text>
    </g>
  );
}

/** The rails through their datum drops, as far as the picture goes. */
function Rails({ view }: { view: LayoutView }) {
  const { frame, tack } = view;
  if (!frame || !tack.wanted) return null;
  const { wanted } = tack;
  return (["left", "right"] as const).map((side) => {
    const places = (["datum-rear", "datum-front"] as const).map((point) => standing(view, point, side));
    const [rear, front] = places.map((place) => place && toFrame(frame, place));
    if (!rear || !front) return null;
    const [a, b] = [
      onPicture(wanted, rear.station, rear.offset),
      onPicture(wanted, front.station, front.offset),
    ];
    return (
      <path
        key={side}
        d={`M${a.x.toFixed(1)} ${a.y.toFixed(1)}L${b.x.toFixed(1)} ${b.y.toFixed(1)}`}
        stroke="var(--concrete-700)"
        strokeWidth="1.3"
        strokeDasharray="7 4"
      />
    );
  });
}
