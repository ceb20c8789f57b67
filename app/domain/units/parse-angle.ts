import { type Outcome, ok, problem } from "../outcome";
import { type Degrees, degrees } from "./angle";

const EXAMPLE = "for example 12.5 or 12° 30'";
/** A turn is the most that a gauge shows. */
const MOST_DEGREES = 360;
const LONGEST = 30;
const FIGURE = String.raw`\d+(?:[.,]\d+)?|[.,]\d+`;
/** What follows the degrees: their sign, a space or the end, so that 30' is not read as 3° 0'. */
const ANGLE = new RegExp(
  String.raw`^(?:(${FIGURE})(?:\s*(?:°|deg\.?|degrees?)\s*|\s+|$))?(?:(${FIGURE})\s*(?:'|min\.?|minutes?)\s*)?(?:(${FIGURE})\s*(?:"|sec\.?|seconds?))?$`,
);

/** Primes, degree signs, dashes and odd spaces as the plain signs that they stand for. */
const plain = (text: string): string =>
  text
    .normalize("NFC")
    .replace(/[º˚]/g, "°")
    .replace(/[′’‘]/g, "'")
    .replace(/''|[″”“]/g, '"')
    .replace(/[−–—]/g, "-")
    .replace(/[\s\u00a0\u2007\u2009\u202f]+/g, " ")
    .trim()
    .toLowerCase();

/**
 * Reads an angle as a person types it off a gauge: `12.5`, `12,5°`, `12 deg`, `12° 30'`, `12 30'`, `12° 30' 15"`, `30'`,
 * with a minus in front.
 * @param text the entry as typed
 * @returns degrees, or what is wrong with the entry in a sentence
 * @example parseAngle("12° 30'") // 12.5
 */
export function parseAngle(text: string): Outcome<Degrees> {
  const typed = plain(text);
  if (typed === "") return problem(`Type the angle in degrees, ${EXAMPLE}.`);
  if (typed.length > LONGEST) return problem("That is too long for an angle.");
  const negative = typed.startsWith("-");
  const found = ANGLE.exec(negative ? typed.slice(1).trim() : typed);
  if (!found || found.slice(1).every((part) => part === undefined))
    return problem(`“${typed}” is not an angle: type it in degrees, ${EXAMPLE}.`);
  const parts = found.slice(1).map((part) => (part === undefined ? null : Number(part.replace(",", "."))));
  const fault = faultOf(parts);
  if (fault) return problem(fault);
  const [whole, minutes, seconds] = parts;
  const size = (whole ?? 0) + (minutes ?? 0) / 60 + (seconds ?? 0) / 3600;
  if (size > MOST_DEGREES) return problem("That is more than a whole turn: read the gauge again.");
  return ok(degrees(negative && size !== 0 ? -size : size));
}

/** Only the last part may have decimals, and what follows a larger part is less than one of it. */
function faultOf(parts: readonly (number | null)[]): string | null {
  const given = parts.filter((part) => part !== null);
  if (given.slice(0, -1).some((part) => !Number.isInteger(part)))
    return "A decimal and a smaller part besides: type one or the other.";
  const [, minutes, seconds] = parts;
  if ((minutes ?? 0) >= 60 && parts[0] !== null)
    return `${minutes}' is a degree or more: read the gauge again.`;
  if ((seconds ?? 0) >= 60 && given.length > 1)
    return `${seconds}" is a minute or more: read the gauge again.`;
  return null;
}
