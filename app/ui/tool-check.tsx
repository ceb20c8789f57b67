type Props = {
  initials: string;
  state?: "on" | "free" | "away" | "stop";
  size?: number | string;
  /** Height of the letters against the disc. */
  letters?: number;
  title?: string;
};

/** A person is a tool check: a stamped disc with a lug. The title says the name. */
export function ToolCheck({ initials, state = "on", size = 26, letters = 0.46, title }: Props) {
  const box = typeof size === "number" ? `${size}px` : size;
  return (
    <span className={`tool-check ${state}`} style={{ width: box, height: box, fontSize: `calc(${box} * ${letters})` }} title={title} role={title ? "img" : undefined} aria-label={title}>
      <span aria-hidden={title ? true : undefined}>{initials}</span>
    </span>
  );
}
