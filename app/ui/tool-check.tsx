type Props = {
  initials: string;
  state?: "on" | "free" | "away" | "stop";
  size?: number | string;
  /** Height of the letters against the disc. */
  letters?: number;
  /** The person's name; without it the check is decoration beside the name. */
  title?: string;
};

/** A person is a tool check: a stamped disc with a lug. */
export function ToolCheck({ initials, state = "on", size = 26, letters = 0.46, title }: Props) {
  const box = typeof size === "number" ? `${size}px` : size;
  const look = {
    className: `tool-check ${state}`,
    style: { width: box, height: box, fontSize: `calc(${box} * ${letters})` },
  };
  if (title === undefined) return <span {...look}>{initials}</span>;
  return (
    <span {...look} role="img" aria-label={title} title={title}>
      {initials}
    </span>
  );
}
