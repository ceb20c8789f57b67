import type { FloorPoint } from "../../../domain/geometry/point";
import type { DropPointId, DropSide } from "../../../domain/layout/drops";
import type { LayoutView } from "../../../domain/layout/view";
import type { Spot } from "./viewport";

type Props = {
  view: LayoutView;
  to: (point: { x: number; y: number }) => Spot;
  inHand: { point: DropPointId; side: DropSide } | null;
  preview: { at: FloorPoint; ties: string[]; suspect: boolean } | null;
};

/** The tapes to the point in hand, in brass; the one that a known slip would mend is dashed in oxide. */
export function Tapes({ view, to, inHand, preview }: Props) {
  const drop = inHand
    ? view.drops.find((one) => one.point === inHand.point && one.side === inHand.side)
    : null;
  const reading = drop?.reading ?? null;
  const at = preview?.at ?? reading?.at;
  const marks = preview ? preview.ties : (reading?.ties.map((tie) => tie.mark) ?? []);
  if (!at || marks.length === 0) return null;
  const odd = preview ? null : (reading?.fit?.suggestions[0]?.mark ?? null);
  const point = to(at);
  return (
    <g>
      {marks.map((label) => {
        const mark = view.bay.marks.find((one) => one.label === label);
        if (!mark) return null;
        const from = to(mark);
        const wrong = label === odd;
        return (
          <path
            key={label}
            d={`M${from.x} ${from.y}L${point.x} ${point.y}`}
            stroke={wrong ? "var(--oxide)" : "var(--brass)"}
            strokeWidth="2.4"
            strokeDasharray={wrong ? "9 5" : undefined}
          />
        );
      })}
    </g>
  );
}
