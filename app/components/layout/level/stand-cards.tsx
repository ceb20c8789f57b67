import type { LengthUnit, Millimetres } from "../../../domain/units/length";
import { Inches } from "../../../ui/length";
import { Sign } from "../../../ui/sign";
import { lengthIn, understood } from "../lengths";
import { ReadingField } from "../reading-field";
import type { Draft } from "../use-draft";
import type { Place } from "./heights";

type Props = {
  place: Place;
  draft: Draft;
  unit: LengthUnit;
  inHand: boolean;
  /** How far to raise it; undefined while the level cannot be told. */
  raise: Millimetres | undefined;
  before: string | null;
  padUp: boolean;
  readOnly: boolean;
  error: string | undefined;
  onChange: (value: string) => void;
  onKeep: () => void;
  onHand: () => void;
};

/** One stand: its height as read, and what to do with it. */
export function StandCard({
  place,
  draft,
  unit,
  inHand,
  raise,
  before,
  padUp,
  readOnly,
  error,
  onChange,
  onKeep,
  onHand,
}: Props) {
  const value = draft[`height.${place.id}`] ?? "";
  const read = understood(value, unit);
  const problem = read && "problem" in read && !inHand ? read.problem : undefined;
  return (
    <div className={`stand-card stand-${place.id}`} data-in-hand={inHand}>
      <ReadingField
        label={place.label}
        quietLabel="stand height"
        name={`height.${place.id}`}
        value={value}
        onChange={onChange}
        onKeep={onKeep}
        onHand={onHand}
        padUp={padUp}
        readOnly={readOnly}
        error={error ?? problem}
        placeholder={before ? `was ${before}` : "to read"}
        size="l"
      />
      <Raise raise={lengthIn(value, unit) === null ? undefined : raise} unit={unit} />
    </div>
  );
}

function Raise({ raise, unit }: { raise: Millimetres | undefined; unit: LengthUnit }) {
  if (raise === undefined) return <p className="stand-do" />;
  if (raise === 0)
    return (
      <p className="stand-do text-concrete-500">
        <Sign name="leave" size={18} /> Leave it
      </p>
    );
  return (
    <p className="stand-do">
      <Sign name="up" size={18} />
      <span>
        Raise {unit === "in" ? <Inches mm={raise} /> : Math.round(raise)} {unit}
      </span>
    </p>
  );
}
