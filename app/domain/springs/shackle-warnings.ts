import type { Outcome } from "../outcome";
import { type Degrees, formatDegrees } from "../units/angle";
import type { Millimetres } from "../units/length";
import { fromStraight } from "./shackle";
import type { ShacklePosition } from "./shackle-position";

/** Where in the travel. */
export type TravelPlace = "droop" | "ride" | "flat" | "bump" | "between";
export type ShackleWarning = { at: TravelPlace; words: string };

const NAMES = { droop: "At droop", ride: "At ride height", flat: "With the spring flat", bump: "At bump" };
type Places = Record<keyof typeof NAMES, Outcome<ShacklePosition> | null>;

/**
 * What to beware of at the places that have a name; null: left out. Bump is often flat, and then said once.
 * @example placeWarnings(places with the shackle at 176° at droop, degrees(5)) // one warning, at droop
 */
export function placeWarnings(places: Places, near: Degrees): ShackleWarning[] {
  const warnings: ShackleWarning[] = [];
  const said = new Set<string>();
  for (const at of ["droop", "ride", "flat", "bump"] as const) {
    const place = places[at];
    if (!place) continue;
    const words = place.ok ? straightWords(place.value.shackleAngle, near) : place.problem;
    // Bump is often flat: once is enough.
    const key = place.ok ? `${place.value.arch} ${words}` : `${words}`;
    if (words === null || (at === "bump" && said.has(key))) continue;
    said.add(key);
    warnings.push({ at, words: `${NAMES[at]}: ${words.charAt(0).toLowerCase()}${words.slice(1)}` });
  }
  return warnings;
}

function straightWords(angle: Degrees, near: Degrees): string | null {
  const left = fromStraight(angle);
  if (left >= near) return null;
  const way = angle > 90 ? "away from" : "towards";
  return `the shackle is ${formatDegrees(left, 1)} from straight, laid ${way} the fixed eye: it may go over centre.`;
}

/**
 * What shows only between the places that have a name.
 * @param lost arches at which the shackle binds
 * @example wayWarnings(path, [], named, degrees(5)) // none when the worst has a name
 */
export function wayWarnings(
  path: readonly ShacklePosition[],
  lost: readonly Millimetres[],
  named: readonly Millimetres[],
  near: Degrees,
): ShackleWarning[] {
  const warnings: ShackleWarning[] = [];
  if (lost.length > 0 && lost.every((arch) => !named.includes(arch)))
    warnings.push({ at: "between", words: "The shackle binds on the way between the named places." });
  const worst = path.reduce<ShacklePosition | null>(
    (a, b) => (a && fromStraight(a.shackleAngle) <= fromStraight(b.shackleAngle) ? a : b),
    null,
  );
  const words = worst && !named.includes(worst.arch) ? straightWords(worst.shackleAngle, near) : null;
  if (words !== null) warnings.push({ at: "between", words: `On the way: ${words}` });
  return warnings;
}
