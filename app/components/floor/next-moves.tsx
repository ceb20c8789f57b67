import { STAGE_LABEL } from "../../domain/builds/stages";
import type { NextCard } from "../../domain/floor/board";
import { whenInWords } from "../time";
import { useFloorView } from "./floor-context";

/** What comes next by the plan, chalked on the floor of the aisle. */
export function NextMoves({ next, x, y }: { next: readonly NextCard[]; x: number; y: number }) {
  const { now, timeZone } = useFloorView();
  if (next.length === 0) return null;
  return (
    <section
      className="next-moves"
      style={{ "--x": x, "--y": y } as React.CSSProperties}
      aria-labelledby="next-head"
    >
      <h2 id="next-head" className="floor-label text-line">
        Next by the plan
      </h2>
      <ol>
        {next.map((card) => (
          <li key={card.stintId}>
            <time dateTime={card.at}>{whenInWords(card.at, now, timeZone)}</time>
            <b>{card.nickname}</b> {STAGE_LABEL[card.stage].toLowerCase()}, Bay {card.bayNumber}
          </li>
        ))}
      </ol>
    </section>
  );
}
