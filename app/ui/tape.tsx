const SIZE = {
  s: "h-[27px] px-[11px] text-[15px]",
  m: "h-[32px] px-3 text-lg",
  l: "h-[44px] px-4 text-2xl",
} as const;

/** A name on masking tape, with the tag's short code. */
export function Tape({
  name,
  code,
  size = "s",
  className = "",
}: {
  name: string;
  code?: string;
  size?: keyof typeof SIZE;
  className?: string;
}) {
  return (
    <span className={`tape ${SIZE[size]} ${className}`}>
      <span>{name}</span>
      {code ? <span className="tape-code">{code}</span> : null}
    </span>
  );
}
