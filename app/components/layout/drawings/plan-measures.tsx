import { framePoint } from "../../../domain/geometry/point";
import { toFloor, toFrame } from "../../../domain/layout/frame";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDecimalInches, mm } from "../../../domain/units/length";
import { ELLIPSE_DRAWN, optionOf, standing } from "./plan-figures";
import { barLength, type Scale, type Spot } from "./viewport";

/** From a point of the floor to its spot on the drawing. */
export type To = (point: { x: number; y: number }) => Spot;

/** So that words over lines can be read. */
export const HALO = {
  paintOrder: "stroke",
  stroke: "var(--concrete-100)",
  strokeWidth: 5,
  strokeLinejoin: "round",
} as const;
/** A line through spots. */
export const path = (spots: readonly Spot[]) =>
  spots.map((spot, i) => `${i === 0 ? "M" : "L"}${spot.x.toFixed(1)} ${spot.y.toFixed(1)}`).join("");

/** From the rear datum pair to the axle line, along the frame. */
export function Dimension({ view, to, optionKey }: { view: LayoutView; to: To; optionKey: string | null }) {
  const station = optionOf(view, optionKey)?.axleStation ?? view.axle?.line.station;
  const foot = standing(view, "datum-rear", "right");
  if (!view.frame || station === undefined || !foot) return null;
  const { frame } = view;
  const offset = toFrame(frame, foot).offset - 330;
  const [from, till] = [
    to(toFloor(frame, framePoint(0, offset))),
    to(toFloor(frame, framePoint(station, offset))),
  ];
  const [foot0, footS] = [to(foot), to(toFloor(frame, framePoint(station, offset + 330)))];
  const middle = { x: (from.x + till.x) / 2, y: (from.y + till.y) / 2 };
  return (
    <g stroke="var(--ink)" fill="none">
      <path
        d={`${path([foot0, { x: from.x, y: from.y + 6 }])}${path([footS, { x: till.x, y: till.y + 6 }])}`}
        strokeWidth=".9"
      />
      <path d={path([from, till])} strokeWidth="1.1" />
      <path d={`M${from.x - 5} ${from.y + 5}l10 -10M${till.x - 5} ${till.y + 5}l10 -10`} strokeWidth="1.6" />
      <text
        x={middle.x}
        y={middle.y + 7}
        textAnchor="middle"
        fontSize="21"
        fontWeight="700"
        fill="var(--ink)"
        style={{ fontFamily: "var(--font)" }}
        {...HALO}
        strokeWidth={9}
      >
        {formatDecimalInches(mm(station))}
      </text>
    </g>
  );
}

/** How long a length is, and how the unsureness is drawn. */
export function ScaleBar({ view, scale }: { view: LayoutView; scale: Scale }) {
  const inches = view.unit === "in";
  const length = barLength(
    inches ? [25.4, 76.2, 152.4, 304.8, 609.6, 1219.2] : [10, 50, 100, 200, 500, 1000],
    scale.k,
    130,
  );
  const width = length * scale.k;
  const words = inches ? `${Math.round(length / 25.4)} in` : `${length} mm`;
  return (
    <g>
      <text x="12" y="20" fontSize="14" fontWeight="500" fill="var(--concrete-700)" {...HALO}>
        how sure, drawn {ELLIPSE_DRAWN} times · nose →
      </text>
      <path
        d={`M12 36h${width}M12 31v10M${12 + width} 31v10`}
        stroke="var(--ink)"
        strokeWidth="1.5"
        fill="none"
      />
      <text x={20 + width} y="41" fontSize="14" fontWeight="600" {...HALO}>
        {words}
      </text>
    </g>
  );
}
