import { Link } from "react-router";

/** A column's head that sorts by it. `up`: sorted by it, smallest first; `none`: this column does not sort. */
export function SortHead({
  label,
  to,
  state,
  numeric = false,
}: {
  label: string;
  to: string;
  state: "up" | "down" | "off" | "none";
  numeric?: boolean;
}) {
  const sorted = state === "up" ? "ascending" : state === "down" ? "descending" : undefined;
  const side = numeric ? "text-right" : "text-left";
  return (
    <th scope="col" aria-sort={sorted} className={`whitespace-nowrap pr-4 ${side}`}>
      {state === "none" ? (
        <span className="label inline-flex min-h-11 items-center">{label}</span>
      ) : (
        <Link
          to={to}
          replace
          preventScrollReset
          className={`label inline-flex min-h-11 items-center gap-1 hover:text-ink ${sorted ? "text-ink" : ""}`}
        >
          {label}
          {sorted ? (
            <svg
              viewBox="0 0 10 12"
              className={`h-3 w-2.5 ${numeric ? "order-first" : ""}`}
              aria-hidden="true"
            >
              <path d={state === "up" ? "M5 1l4 5H6v5H4V6H1z" : "M5 11L1 6h3V1h2v5h3z"} fill="currentColor" />
            </svg>
          ) : null}
        </Link>
      )}
    </th>
  );
}
