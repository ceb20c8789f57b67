const EYE_MM = 26;
const LEAF_MM = 13;
const HEIGHT_MM = 214;

/**
 * A leaf spring lying flat, seen from the side, nose to the right, to the scale of the longest in the rack. The shorter
 * leaves below are drawn, not measured.
 */
export function SpringDrawing({
  lengthMm,
  frontHalfMm,
  leaves,
  longestMm,
  name,
}: {
  lengthMm: number;
  frontHalfMm: number;
  leaves: number;
  longestMm: number;
  /** What the drawing shows, in words. */
  name: string;
}) {
  const margin = EYE_MM * 2;
  const width = longestMm + 2 * margin;
  const right = width / 2 + lengthMm / 2;
  const left = right - lengthMm;
  const pin = right - frontHalfMm;
  const top = 62;
  const rear = lengthMm - frontHalfMm;
  const shown = Math.max(1, Math.min(Math.round(leaves), 9));
  const shorter = Array.from({ length: shown - 1 }, (_, index) => {
    const share = 1 - ((index + 1) / shown) * 0.82;
    return `M${pin - rear * share} ${top + (index + 1) * (LEAF_MM + 2)}H${pin + frontHalfMm * share}`;
  }).join("");
  return (
    <svg viewBox={`0 0 ${width} ${HEIGHT_MM}`} className="block h-auto w-full" role="img" aria-label={name}>
      <path
        d={`M${width / 2} 8V${HEIGHT_MM - 12}`}
        className="stroke-concrete-500"
        strokeWidth="5"
        strokeDasharray="4 16"
        strokeLinecap="round"
      />
      <path d={shorter} className="stroke-brass-ink" strokeOpacity=".45" strokeWidth={LEAF_MM} />
      <path d={`M${left} ${top}H${right}`} className="stroke-brass" strokeWidth={LEAF_MM} />
      {[left, right].map((x) => (
        <circle key={x} cx={x} cy={top} r={EYE_MM} className="fill-chalk stroke-brass-ink" strokeWidth="9" />
      ))}
      <path
        d={`M${pin} ${top - 44}V${top + shown * (LEAF_MM + 2) + 24}`}
        className="stroke-ink"
        strokeWidth="10"
        strokeLinecap="round"
      />
    </svg>
  );
}
