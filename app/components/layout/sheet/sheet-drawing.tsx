import { framePoint } from "../../../domain/geometry/point";
import type { DropSide } from "../../../domain/layout/drops";
import { toFrame } from "../../../domain/layout/frame";
import type { Option } from "../../../domain/layout/options";
import type { LayoutView } from "../../../domain/layout/view";
import { formatInches, type Millimetres } from "../../../domain/units/length";
import { standing } from "../drawings/plan-figures";
import { fitScale, type Spot, spanOf, spotAt, widened } from "../drawings/viewport";

const SIZE = { width: 736, height: 330 };
const PAD = { top: 26, right: 30, bottom: 66, left: 30 };
const HALO = { paintOrder: "stroke", stroke: "#fff", strokeWidth: 5, strokeLinejoin: "round" } as const;

const line = (...spots: Spot[]) =>
  spots.map((spot, i) => `${i === 0 ? "M" : "L"}${spot.x.toFixed(1)} ${spot.y.toFixed(1)}`).join("");

/**
 * The plan for paper, in the frame's own axes so that the centre line lies level: datums, openings, hole, axle line, and
 * running dimensions from the rear pair. Black only.
 */
export function SheetDrawing({ view, option }: { view: LayoutView; option: Option }) {
  const { frame } = view;
  if (!frame) return null;
  const on = (
    point: "opening-front" | "opening-rear" | "datum-front" | "datum-rear" | "hanger-hole",
    side: DropSide,
  ) => {
    const place = standing(view, point, side);
    return place ? toFrame(frame, place) : null;
  };
  const sides = (["left", "right"] as const).map((side) => ({
    side,
    front: on("opening-front", side),
    rear: on("opening-rear", side),
    datumFront: on("datum-front", side),
    datumRear: on("datum-rear", side),
    hole: on("hanger-hole", side),
  }));
  const all = sides.flatMap((one) =>
    [one.front, one.rear, one.datumFront, one.datumRear, one.hole].flatMap((p) =>
      p ? [{ x: p.station as number, y: p.offset as number }] : [],
    ),
  );
  const span = spanOf([...all, { x: option.axleStation, y: 0 }]);
  if (!span) return null;
  const scale = fitScale(widened(span, 90), SIZE, PAD);
  const at = (station: number, offset: number) => spotAt(scale, { x: station, y: offset });
  const top = at(0, span.maxY + 130).y;
  const bottom = at(0, span.minY - 90).y;
  const foot = SIZE.height - 34;
  const stations: [number, string][] = [
    [0, "0"],
    [option.axleStation, formatInches(option.axleStation)],
    [option.hole.station, formatInches(option.hole.station)],
  ];
  const middle = framePoint(option.axleStation, 0);
  return (
    <svg
      viewBox={`0 0 ${SIZE.width} ${SIZE.height}`}
      className="sheet-drawing"
      role="img"
      aria-label={`Plan: axle line ${formatInches(option.axleStation)} inches ahead of the rear datum pair`}
    >
      <text x="12" y={at(0, span.maxY).y - 14} fontSize="15">
        left side
      </text>
      <text x="12" y={at(0, span.minY).y + 24} fontSize="15">
        right side
      </text>
      {sides.map((one) => (
        <g key={one.side} stroke="#000" fill="none">
          {one.front && one.rear ? (
            <OpeningBox
              {...{ at }}
              front={one.front.station}
              rear={one.rear.station}
              offset={one.front.offset}
            />
          ) : null}
          {one.datumFront && one.datumRear ? (
            <path
              d={line(
                at(one.datumRear.station, one.datumRear.offset),
                at(one.datumFront.station, one.datumFront.offset),
              )}
              strokeDasharray="8 5"
              strokeWidth="1.2"
            />
          ) : null}
          {one.hole ? (
            <>
              <path
                d={line(at(option.axleStation, one.hole.offset), at(option.hole.station, one.hole.offset))}
                strokeWidth="7"
                stroke="#999"
              />
              <circle
                cx={at(option.hole.station, 0).x}
                cy={at(0, one.hole.offset).y}
                r="7"
                strokeWidth="3"
                fill="#fff"
              />
              <path
                d={line(
                  at(option.hole.station, one.hole.offset),
                  at(option.axleStation, -one.hole.offset * 1.4),
                )}
                strokeDasharray="2 4"
              />
            </>
          ) : null}
          {[one.front, one.rear, one.datumFront, one.datumRear].map((p) =>
            p ? <Cross key={`${p.station}`} spot={at(p.station, p.offset)} /> : null,
          )}
        </g>
      ))}
      <path
        d={line(at(span.minX - 60, 0), at(span.maxX + 60, 0))}
        stroke="#000"
        strokeWidth="1.3"
        strokeDasharray="18 5 4 5"
      />
      <text x={at(span.minX, 0).x} y={at(0, 0).y - 8} fontSize="15" {...HALO}>
        frame centre line
      </text>
      <path
        d={line({ x: at(middle.station, 0).x, y: top }, { x: at(middle.station, 0).x, y: bottom })}
        stroke="#000"
        strokeWidth="4.5"
      />
      <text
        x={at(span.maxX, 0).x}
        y={at(0, 0).y - 8}
        fontSize="16"
        fontWeight="700"
        textAnchor="end"
        {...HALO}
      >
        nose →
      </text>
      <path d={`M${at(0, 0).x} ${foot}H${at(option.hole.station, 0).x}`} stroke="#000" strokeWidth="1.3" />
      {stations.map(([station, words], i) => {
        const { x } = at(station, 0);
        return (
          <g key={words} stroke="#000" fill="none">
            <path d={`M${x} ${bottom - 6}V${foot + 6}`} strokeWidth="1" />
            {i > 0 ? (
              <path d={`M${x - 12} ${foot - 5}L${x} ${foot}L${x - 12} ${foot + 5}`} strokeWidth="1.8" />
            ) : null}
            <text
              x={x}
              y={foot + 26}
              textAnchor="middle"
              fontSize="23"
              fontWeight="700"
              fill="#000"
              stroke="none"
              style={{ fontFamily: "var(--font)" }}
            >
              {words}
            </text>
          </g>
        );
      })}
      <Disc n={1} spot={{ x: at(option.axleStation, 0).x + 26, y: top + 18 }} />
      <Disc n={2} spot={{ x: at(option.hole.station, 0).x + 2, y: at(0, span.maxY * 0.45).y - 30 }} />
      <Disc
        n={3}
        spot={{
          x: (at(option.axleStation, 0).x + at(option.hole.station, 0).x) / 2,
          y: at(0, span.minY * 0.5).y + 26,
        }}
      />
    </svg>
  );
}

function Cross({ spot }: { spot: Spot }) {
  return <path d={`M${spot.x - 7} ${spot.y}h14M${spot.x} ${spot.y - 7}v14`} strokeWidth="2.4" />;
}

function OpeningBox({
  at,
  front,
  rear,
  offset,
}: {
  at: (station: number, offset: number) => Spot;
  front: Millimetres;
  rear: Millimetres;
  offset: Millimetres;
}) {
  const inner = offset - Math.sign(offset) * 230;
  return (
    <path
      d={line(at(rear, offset), at(rear, inner), at(front, inner), at(front, offset))}
      strokeWidth="1.4"
      strokeLinejoin="round"
    />
  );
}

function Disc({ n, spot }: { n: number; spot: Spot }) {
  return (
    <g>
      <circle cx={spot.x} cy={spot.y} r="15" fill="#fff" stroke="#000" strokeWidth="2.4" />
      <text x={spot.x} y={spot.y + 8} textAnchor="middle" fontSize="22" fontWeight="700">
        {n}
      </text>
    </g>
  );
}
