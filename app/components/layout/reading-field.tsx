import { type KeyboardEvent, type ReactNode, type Ref, useId, useRef } from "react";

type Props = {
  label: string;
  /** Words of the label that a picture beside it already says; read out only. */
  quietLabel?: string;
  name: string;
  value: string;
  onChange: (value: string) => void;
  onKeep?: () => void;
  onHand?: () => void;
  /** The number pad is up: the device's own keys stay down. */
  padUp: boolean;
  readOnly?: boolean;
  error?: string;
  hint?: ReactNode;
  size?: "m" | "l";
  placeholder?: string;
  inputRef?: Ref<HTMLInputElement>;
};

/** One reading: Enter keeps it, Esc brings back what stood there before, Tab goes on. */
export function ReadingField(props: Props) {
  const {
    label,
    quietLabel,
    name,
    value,
    onChange,
    onKeep,
    onHand,
    padUp,
    readOnly,
    error,
    hint,
    size = "m",
  } = props;
  const id = useId();
  const before = useRef(value);
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === "Enter" && onKeep) {
      event.preventDefault();
      before.current = value;
      onKeep();
    } else if (event.key === "Escape" && value !== before.current) {
      event.stopPropagation();
      onChange(before.current);
    }
  };
  return (
    <div className="grid min-w-0 content-start gap-1">
      <label htmlFor={id} className="text-[15px] leading-tight font-semibold text-concrete-700">
        {label}
        {quietLabel ? <span className="sr-only"> {quietLabel}</span> : null}
      </label>
      <input
        ref={props.inputRef}
        id={id}
        name={name}
        value={value}
        readOnly={readOnly}
        placeholder={props.placeholder}
        inputMode={padUp ? "none" : "text"}
        autoComplete="off"
        autoCapitalize="off"
        spellCheck={false}
        enterKeyHint="done"
        className={`layout-reading ${size === "l" ? "layout-reading-l" : ""}`}
        aria-invalid={error ? true : undefined}
        aria-describedby={error || hint ? `${id}-words` : undefined}
        onFocus={() => {
          before.current = value;
          onHand?.();
        }}
        onChange={(event) => onChange(event.target.value)}
        onKeyDown={onKeyDown}
      />
      {error || hint ? (
        <p
          id={`${id}-words`}
          className={`text-[15px] leading-tight ${error ? "font-medium text-oxide" : "text-concrete-500"}`}
        >
          {error ?? hint}
        </p>
      ) : null}
    </div>
  );
}
