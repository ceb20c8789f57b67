import type { BoardBay } from "../../domain/floor/board";
import { bayBox, markPoint } from "./geometry";

/** Control marks where the survey has them: discs on the floor, dashed where a vehicle stands over the line. */
export function Marks({ bay, covered }: { bay: BoardBay; covered: boolean }) {
  if (bay.marks.length === 0) return null;
  const box = bayBox(bay);
  return (
    <div className="bay-marks" data-covered={covered} aria-hidden="true">
      {bay.marks.map((mark) => {
        const at = markPoint(bay, mark);
        const style = { "--mx": at.x - box.x, "--my": at.y - box.y } as React.CSSProperties;
        const onLine = Math.abs(mark.yMm) < 1;
        return (
          <span key={mark.label} className="bay-mark" data-on-line={onLine} style={style}>
            <svg viewBox="0 0 20 20" width="18" height="18" aria-hidden="true">
              <circle cx="10" cy="10" r="5.6" />
              <path d="M1 10h18M10 1v18" />
            </svg>
            <b>{mark.label}</b>
          </span>
        );
      })}
    </div>
  );
}
