/** A QR picture, black on the paper it lies on, with its quiet zone. `name`: what it is, for those who do not see it. */
export function QrSvg({
  size,
  path,
  name,
  className,
}: {
  size: number;
  path: string;
  /** Left out for a second print of the same picture on one page. */
  name?: string;
  className?: string;
}) {
  const square = <path d={path} fill="#000" />;
  const box = { viewBox: `0 0 ${size} ${size}`, shapeRendering: "crispEdges" as const, className };
  return name ? (
    <svg {...box} role="img" aria-label={name}>
      {square}
    </svg>
  ) : (
    <svg {...box} aria-hidden="true">
      {square}
    </svg>
  );
}
