import { useMemo } from "react";
import type { FloorPoint } from "../../../domain/geometry/point";
import type { DropPointId, DropSide } from "../../../domain/layout/drops";
import type { LayoutView } from "../../../domain/layout/view";
import { PlanDrawing, type PlanProps } from "./plan-drawing";
import { planSpan, planWords } from "./plan-figures";
import { useLook } from "./use-look";
import { fitScale, lookedAt, nearest, spotAt } from "./viewport";

type Props = {
  view: LayoutView;
  inHand?: { point: DropPointId; side: DropSide };
  onPick?: (point: DropPointId, side: DropSide) => void;
  /** A reading that is being typed, drawn before it is kept. */
  previewReading?: { at: FloorPoint; ties: string[]; suspect: boolean };
  /** The option whose axle, spring and tyres are drawn; without it those of the axle line. */
  optionKey?: string | null;
  compact?: boolean;
};

const PAD = { top: 30, right: 34, bottom: 46, left: 34 };
const REACH = 28;

/**
 * The bay's floor seen from above, to scale, from the shop's own numbers: nose to the right, left side up. Zoom by wheel,
 * pinch or + and −; tap a cross to take it in hand. The drops list beside it says the same in words.
 */
export function FloorPlan({
  view,
  inHand,
  onPick,
  previewReading,
  optionKey = null,
  compact = false,
}: Props) {
  const press = (x: number, y: number) => {
    const places = view.drops.flatMap((drop) =>
      drop.reading ? [{ drop, spot: spotAt(scale, drop.reading.at) }] : [],
    );
    const found = nearest(places, { x, y }, REACH);
    if (found) onPick?.(found.drop.point, found.drop.side);
  };
  const { box, size, look, handlers, zoomIn, zoomOut, whole } = useLook(press);
  const span = useMemo(() => planSpan(view), [view]);
  const scale = lookedAt(fitScale(span, size, PAD), look, size);
  const drawing: PlanProps = {
    view,
    scale,
    size,
    inHand: inHand ?? null,
    preview: previewReading ?? null,
    optionKey,
    compact,
  };
  return (
    <div className="relative h-full min-h-56 w-full overflow-hidden bg-concrete-100">
      <div
        ref={box}
        role="application"
        // biome-ignore lint/a11y/noNoninteractiveTabindex: the drawing zooms and pans by keys
        tabIndex={0}
        aria-label={`Floor plan. ${planWords(view)}`}
        className="absolute inset-0 touch-none"
        {...handlers}
      >
        <PlanDrawing {...drawing} />
      </div>
      <div className="no-print absolute top-2 right-2 flex gap-1">
        {(
          [
            ["−", "Zoom out", zoomOut],
            ["+", "Zoom in", zoomIn],
            ["All", "Show all", whole],
          ] as const
        ).map(([sign, label, act]) => (
          <button
            key={label}
            type="button"
            aria-label={label}
            onClick={act}
            className="size-12 rounded border border-paint-edge bg-chalk/90 text-xl font-semibold"
          >
            {sign}
          </button>
        ))}
      </div>
    </div>
  );
}
