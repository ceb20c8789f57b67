/** A stencilled number: bridges are cut through the paint, down (`v`) or across (`h`). */
export function Stencil({
  n,
  size = 66,
  cut = "v",
  className = "",
}: {
  n: number | string;
  size?: number | string;
  cut?: "v" | "h";
  className?: string;
}) {
  return (
    <span
      className={`stencil ${cut === "h" ? "stencil-h" : ""} ${className}`}
      style={{ fontSize: typeof size === "number" ? `${size}px` : size }}
    >
      {n}
    </span>
  );
}
