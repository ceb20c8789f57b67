import { SIGNS, type SignName } from "./signs";

export type { SignName } from "./signs";

const SPRITE = Object.entries(SIGNS)
  .map(([name, drawing]) => `<symbol id="sg-${name}" viewBox="0 0 24 24">${drawing}</symbol>`)
  .join("");

/** All signs, once a page; `Sign` points into it. */
export function SignSprite() {
  return (
    <svg width="0" height="0" className="absolute" aria-hidden="true" focusable="false">
      {/* Our own constant drawings: nothing from outside gets in here. */}
      {/* biome-ignore lint/security/noDangerouslySetInnerHtml: constant markup of our own */}
      <defs dangerouslySetInnerHTML={{ __html: SPRITE }} />
    </svg>
  );
}

/** A sign beside its word. Hidden from screen readers unless it is given a title of its own. */
export function Sign({
  name,
  size = 20,
  className = "",
  title,
}: {
  name: SignName;
  size?: number | string;
  className?: string;
  title?: string;
}) {
  const box = { width: size, height: size };
  return (
    <svg
      className={`inline-block flex-none ${className}`}
      style={box}
      role={title ? "img" : undefined}
      aria-label={title}
      aria-hidden={title ? undefined : true}
      focusable="false"
    >
      <use href={`#sg-${name}`} />
    </svg>
  );
}
