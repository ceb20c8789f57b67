import { VEHICLE_KIND, type VehicleKind } from "../domain/builds/vehicle-kinds";
import { type Ink, planOf } from "./vehicle/plan-strokes";

export type VehicleTone = "rest" | "hand" | "ghost" | "sending" | "wall";

const MM_PER_FOOT = 304.8;

type Look = { fill: string; stroke: string; width: number; opacity?: number; dash?: string };

function lookOf(ink: Ink, tone: VehicleTone): Look {
  const edge = tone === "hand" || tone === "ghost" ? "var(--brass-ink)" : "var(--ink)";
  const detail = tone === "hand" ? "var(--brass-ink)" : "var(--concrete-500)";
  const fill = tone === "hand" ? "var(--brass-wash)" : "var(--chalk)";
  if (tone === "ghost")
    return { fill: "none", stroke: ink === "body" ? edge : "var(--concrete-300)", width: 1.4, dash: "5 4" };
  switch (ink) {
    case "body":
      return { fill, stroke: edge, width: tone === "hand" ? 2.2 : 1.4 };
    case "wheel":
      return {
        fill: tone === "wall" ? "var(--concrete-500)" : "var(--concrete-700)",
        stroke: "none",
        width: 0,
      };
    case "glass":
      return { fill: "var(--concrete-300)", stroke: detail, width: 1, opacity: 0.8 };
    case "detail":
      return { fill: "none", stroke: detail, width: 1 };
    case "faint":
      return { fill: "none", stroke: detail, width: 1, opacity: 0.45 };
    case "outline":
      return { fill: "none", stroke: edge, width: 1.2 };
    case "heavy":
      return { fill: "none", stroke: edge, width: 2.2 };
    case "tube":
      return { fill: "none", stroke: edge, width: 2, opacity: 0.55 };
  }
}

type PlanProps = {
  kind: VehicleKind;
  lengthMm: number;
  widthMm: number;
  /** CSS pixels a millimetre. */
  scale: number;
  tone?: VehicleTone;
  nose?: "left" | "right";
};

/** A vehicle seen from above at its true length and width; wheels and mirrors stand out a little. */
export function VehiclePlan({ kind, lengthMm, widthMm, scale, tone = "rest", nose = "left" }: PlanProps) {
  const [length, width] = [lengthMm / MM_PER_FOOT, widthMm / MM_PER_FOOT];
  const [w, h] = [lengthMm * scale, widthMm * scale];
  return (
    <svg
      width={w}
      height={h}
      viewBox={`0 0 ${length} ${width}`}
      className="block overflow-visible"
      opacity={tone === "sending" ? 0.62 : 1}
      aria-hidden="true"
      focusable="false"
    >
      <g transform={nose === "right" ? `translate(${length} 0) scale(-1 1)` : undefined}>
        {planOf(kind, length, width).map((stroke, i) => {
          const look = lookOf(stroke.ink, tone);
          return (
            <path
              // biome-ignore lint/suspicious/noArrayIndexKey: a fixed drawing, never reordered
              key={i}
              d={stroke.d}
              fill={look.fill}
              stroke={look.stroke}
              strokeWidth={look.width}
              strokeDasharray={look.dash}
              opacity={look.opacity}
              vectorEffect="non-scaling-stroke"
              strokeLinejoin="round"
            />
          );
        })}
      </g>
    </svg>
  );
}

/** A small picture of a vehicle kind, as high as its box, nose to the left; for the wall. */
export function VehicleGlyph({ kind }: { kind: VehicleKind }) {
  const { lengthIn, widthIn } = VEHICLE_KIND[kind];
  const [length, width] = [lengthIn / 12, widthIn / 12];
  return (
    <svg
      viewBox={`-0.1 -0.3 ${length + 0.2} ${width + 0.6}`}
      className="block h-full w-auto"
      aria-hidden="true"
      focusable="false"
    >
      {planOf(kind, length, width).map((stroke, i) => {
        const look = lookOf(stroke.ink, "wall");
        return (
          <path
            // biome-ignore lint/suspicious/noArrayIndexKey: a fixed drawing, never reordered
            key={i}
            d={stroke.d}
            fill={stroke.ink === "body" ? "var(--concrete-100)" : look.fill}
            stroke={look.stroke === "var(--ink)" ? "var(--concrete-500)" : look.stroke}
            strokeWidth={Math.max(1, look.width)}
            opacity={look.opacity}
            vectorEffect="non-scaling-stroke"
          />
        );
      })}
    </svg>
  );
}
