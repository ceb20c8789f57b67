import type { KeyboardEvent, PointerEvent } from "react";
import { fractionSteps, readPad, setFraction, setTenth, tenthOf, wholeCm } from "./number-pad-text";

type TapeProps = { value: string; onChange: (text: string) => void; disabled: boolean };

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

const TENTHS = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9] as const;

type Cell = { steps: number; label: string; rank: number };

/** The cells of one inch; rank 0 is the half and the even inch, then quarters, eighths … */
function cellsOf(denominator: number): Cell[] {
  return Array.from({ length: denominator }, (_, steps) => {
    const common = gcd(steps, denominator) || denominator;
    const reduced = denominator / common;
    const label = steps === 0 ? "even" : `${steps / common}/${reduced}`;
    return { steps, label, rank: reduced <= 2 ? 0 : Math.log2(reduced) - 1 };
  });
}

/** Steps along the tape by arrows, to its ends by Home and End. */
function stepByKey(event: KeyboardEvent, now: number, last: number, set: (n: number) => void) {
  const to = {
    ArrowLeft: now - 1,
    ArrowDown: now - 1,
    ArrowRight: now + 1,
    ArrowUp: now + 1,
    Home: 0,
    End: last,
  }[event.key];
  if (to === undefined) return;
  event.preventDefault();
  set(Math.min(last, Math.max(0, to)));
}

/** The cell under a finger that slides over the tape. */
function slideTo(event: PointerEvent<HTMLDivElement>, set: (n: number) => void) {
  if (event.buttons === 0 && event.type !== "pointerup") return;
  const cell = document.elementFromPoint(event.clientX, event.clientY)?.closest<HTMLElement>("[data-step]");
  if (cell && event.currentTarget.contains(cell)) set(Number(cell.dataset.step));
}

/** One inch of tape: a cell for each sixteenth (or thirty-second); the inch typed stands left, the next one right. */
export function FractionTape({
  value,
  onChange,
  denominator,
  disabled,
}: TapeProps & { denominator: 16 | 32 }) {
  const now = fractionSteps(value, denominator);
  const { whole } = readPad(value);
  const set = (steps: number) => {
    if (!disabled) onChange(setFraction(value, steps, denominator));
  };
  const cells = cellsOf(denominator);
  return (
    <div className="overflow-x-auto border-y-2 border-ink bg-brass-wash">
      <div
        role="slider"
        tabIndex={disabled ? -1 : 0}
        aria-label="Fraction of an inch"
        aria-valuemin={0}
        aria-valuemax={denominator - 1}
        aria-valuenow={now}
        aria-valuetext={cells[now]?.label ?? "even"}
        aria-disabled={disabled}
        className="relative grid h-24 touch-pan-x"
        style={{
          gridTemplateColumns: `repeat(${denominator}, minmax(48px, 1fr))`,
          minWidth: denominator === 32 ? 32 * 48 : undefined,
        }}
        onKeyDown={(event) => stepByKey(event, now, denominator - 1, set)}
        onPointerMove={(event) => slideTo(event, set)}
        onPointerUp={(event) => slideTo(event, set)}
      >
        {cells.map((cell) => {
          const chosen = cell.steps === now;
          return (
            <span
              key={cell.steps}
              data-step={cell.steps}
              className={`relative flex flex-col items-center justify-end pb-2 ${chosen ? "bg-brass-ink text-chalk" : "text-ink"}`}
            >
              <span
                aria-hidden="true"
                className={`absolute top-0 w-0.5 ${chosen ? "bg-chalk" : "bg-ink"}`}
                style={{ height: Math.max(20, 56 - cell.rank * 12) }}
              />
              <span
                className={`font-label ${cell.rank === 0 ? "text-xl font-bold" : "text-base font-semibold"} ${cell.steps === 0 ? "" : "fr"}`}
              >
                {cell.label}
              </span>
            </span>
          );
        })}
        <b className="pointer-events-none absolute top-8 left-1 font-label text-xl">{whole || "0"}</b>
        <b className="pointer-events-none absolute top-8 right-1 font-label text-xl">
          {Number(whole || 0) + 1}
        </b>
      </div>
    </div>
  );
}

/** One centimetre of tape: its ten millimetres. */
export function CentimetreTape({ value, onChange, disabled }: TapeProps) {
  const now = tenthOf(value) ?? 0;
  const whole = wholeCm(value);
  const set = (tenth: number) => {
    if (!disabled) onChange(setTenth(value, tenth));
  };
  return (
    <div className="border-y-2 border-ink bg-brass-wash">
      <div
        role="slider"
        tabIndex={disabled ? -1 : 0}
        aria-label="Millimetres within the centimetre"
        aria-valuemin={0}
        aria-valuemax={9}
        aria-valuenow={now}
        aria-disabled={disabled}
        className="relative grid h-24 touch-pan-x grid-cols-10"
        onKeyDown={(event) => stepByKey(event, now, 9, set)}
        onPointerMove={(event) => slideTo(event, set)}
        onPointerUp={(event) => slideTo(event, set)}
      >
        {TENTHS.map((tenth) => {
          const chosen = tenthOf(value) === tenth;
          return (
            <span
              key={tenth}
              data-step={tenth}
              className={`relative flex flex-col items-center justify-end pb-2 ${chosen ? "bg-brass-ink text-chalk" : "text-ink"}`}
            >
              <span
                aria-hidden="true"
                className={`absolute top-0 w-0.5 ${chosen ? "bg-chalk" : "bg-ink"}`}
                style={{ height: tenth === 0 ? 56 : tenth === 5 ? 40 : 28 }}
              />
              <span className="font-label text-xl font-semibold">{tenth}</span>
            </span>
          );
        })}
        <b className="pointer-events-none absolute top-8 left-1 font-label text-lg">{whole} cm</b>
        <b className="pointer-events-none absolute top-8 right-1 font-label text-lg">{whole + 1}</b>
      </div>
    </div>
  );
}
