import { useState } from "react";
import { Button } from "./button";
import { CentimetreTape, FractionTape } from "./number-pad-tape";
import { asFeet, type PadUnit, typeDigit, wipe } from "./number-pad-text";
import { Sign } from "./sign";

type Props = {
  /** The entry as text, as on the tape. */
  value: string;
  onChange: (text: string) => void;
  onKeep: () => void;
  unit: PadUnit;
  onUnit: (unit: PadUnit) => void;
  keepLabel: string;
  keepDetail?: string;
  caution?: string;
  disabled?: boolean;
  busy?: boolean;
  /** For a screen that lies on its side. */
  compact?: boolean;
};

const KEYS = [1, 2, 3, 4, 5, 6, 7, 8, 9] as const;

/**
 * The tape and the keys for a length: whole inches on keys, sixteenths on the tape; finer, or in centimetres, when
 * asked. It edits the caller's text and keeps nothing of its own, so a keyboard can type beside it.
 */
export function NumberPad(props: Props) {
  const {
    value,
    onChange,
    onKeep,
    unit,
    onUnit,
    keepLabel,
    keepDetail,
    caution,
    disabled = false,
    busy = false,
    compact = false,
  } = props;
  const [fine, setFine] = useState(false);
  const key = `min-h-16 rounded border-[1.5px] border-paint-edge border-b-4 bg-chalk ${compact ? "text-2xl" : "text-4xl"} font-semibold text-ink active:bg-brass-wash`;
  const keyFor = (digit: number) => (
    <button
      key={digit}
      type="button"
      className={key}
      onClick={() => onChange(typeDigit(value, digit, unit))}
      disabled={disabled}
    >
      {digit}
    </button>
  );
  return (
    <section aria-label="Number pad" className="bg-concrete-200 select-none">
      {unit === "in" ? (
        <FractionTape value={value} onChange={onChange} denominator={fine ? 32 : 16} disabled={disabled} />
      ) : (
        <CentimetreTape value={value} onChange={onChange} disabled={disabled} />
      )}
      <div
        className={`grid gap-2 p-3 ${compact ? "grid-cols-[minmax(0,1fr)_minmax(0,1fr)]" : "grid-cols-[minmax(0,7fr)_minmax(0,6fr)]"}`}
      >
        <div className="grid grid-cols-3 gap-2">
          {KEYS.map(keyFor)}
          <button
            type="button"
            className={`${key} flex items-center justify-center gap-2 text-lg`}
            onClick={() => onChange(wipe(value, unit))}
            disabled={disabled}
          >
            <Sign name="wipe" size={22} />
            Wipe
          </button>
          {keyFor(0)}
          {unit === "in" ? (
            <button
              type="button"
              className={`${key} text-lg`}
              onClick={() => onChange(asFeet(value))}
              disabled={disabled}
            >
              feet ′
            </button>
          ) : (
            <span />
          )}
        </div>
        <div className="grid content-start gap-2">
          <Button
            tone="go"
            size="xl"
            className="flex-col gap-1"
            onClick={onKeep}
            disabled={disabled || value.trim() === ""}
            busy={busy}
          >
            <span>{keepLabel}</span>
            {keepDetail ? <span className="text-base font-medium">{keepDetail}</span> : null}
          </Button>
          <div className="grid grid-cols-2 gap-2">
            {unit === "in" ? (
              <Button size="l" aria-pressed={fine} onClick={() => setFine(!fine)} disabled={disabled}>
                {fine ? "Sixteenths" : "Finer: 1/32"}
              </Button>
            ) : (
              <span />
            )}
            <Button size="l" onClick={() => onUnit(unit === "in" ? "mm" : "in")} disabled={disabled}>
              {unit === "in" ? "Centimetres" : "Inches"}
            </Button>
          </div>
          {caution ? (
            <p className="flex items-center gap-3 px-1 text-[15px] leading-snug text-concrete-700">
              <Sign name="stand" size={24} className="text-ink" />
              {caution}
            </p>
          ) : null}
        </div>
      </div>
    </section>
  );
}
