import { type Outcome, ok, problem } from "../outcome";
import { inches, type LengthUnit, type Millimetres, mm } from "./millimetres";

const EXAMPLE = "for example 26 1/2";
/** Nothing in a shop is longer; a longer number is a slip of the finger. */
const LONGEST_MM = 100_000;

const VULGAR: Record<string, string> = {
  "½": "1/2",
  "¼": "1/4",
  "¾": "3/4",
  "⅛": "1/8",
  "⅜": "3/8",
  "⅝": "5/8",
  "⅞": "7/8",
  "⅓": "1/3",
  "⅔": "2/3",
  "⅕": "1/5",
  "⅖": "2/5",
  "⅗": "3/5",
  "⅘": "4/5",
  "⅙": "1/6",
  "⅚": "5/6",
};

const METRIC: Record<string, number> = { mm: 1, cm: 10, m: 1000 };

/** Primes, dashes, fraction slashes and odd spaces as the plain signs that they stand for. */
function plain(text: string): string {
  return text
    .normalize("NFC")
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔⅕⅖⅗⅘⅙⅚]/g, (sign) => ` ${VULGAR[sign]} `)
    .replace(/[\u2044\u2215]/g, "/")
    .replace(/[′’‘]/g, "'")
    .replace(/''|[″”“]/g, '"')
    .replace(/[−–—]/g, "-")
    .replace(/[\s\u00a0\u2007\u2009\u202f]+/g, " ")
    .trim()
    .toLowerCase();
}

const NUMBER = /^\d+(?:[.,]\d+)?$|^[.,]\d+$/;
const decimal = (text: string): number | null => (NUMBER.test(text) ? Number(text.replace(",", ".")) : null);

/** "26", "26.5", "1/2", "26 1/2", "26-1/2" as a number of inches. */
function mixed(text: string): Outcome<number> {
  const cleaned = text.trim();
  const fractions = cleaned.match(/\d+\s*\/\s*\d+/g) ?? [];
  if (fractions.length > 1) return problem(`“${cleaned}” has two fractions.`);
  if (cleaned.split("/").length > 2) return problem(`“${cleaned}” has a fraction too many.`);
  const fraction = /^(?:(\d+)(?:\s+|\s*-\s*))?(\d+)\s*\/\s*(\d+)$/.exec(cleaned);
  if (fraction) {
    const [, whole = "0", numerator = "0", denominator = "0"] = fraction;
    if (Number(denominator) === 0) return problem(`${numerator}/${denominator} is not a fraction.`);
    if (whole !== "0" && Number(numerator) >= Number(denominator))
      return problem(`${numerator}/${denominator} is an inch or more: read the tape again.`);
    return ok(Number(whole) + Number(numerator) / Number(denominator));
  }
  if (/\/\s*-/.test(cleaned)) return problem(`“${cleaned}”: a minus goes in front of the whole length.`);
  if (cleaned.includes("/")) return problem(`“${cleaned}” is not a fraction as on the tape, ${EXAMPLE}.`);
  if (/^[\d.,]+ [\d.,]+$/.test(cleaned))
    return problem(`“${cleaned}” is not a length: two numbers, and no fraction, ${EXAMPLE}.`);
  const value = decimal(cleaned);
  return value === null
    ? problem(`“${cleaned}” is not a length: type it as on the tape, ${EXAMPLE}.`)
    : ok(value);
}

/** One, two or three figures, a comma and three more: thousands to one person, thousandths to another. */
const EITHER_WAY = /(?:^|[^\d.,])([1-9]\d{0,2},\d{3})(?![\d])/;

/** What cannot be told from the text alone, in a sentence. */
function doubt(text: string): string | null {
  const figure = EITHER_WAY.exec(text)?.[1];
  if (figure === undefined) return null;
  const [whole, point] = [figure.replace(",", ""), figure.replace(",", ".")];
  return `“${figure}” could be ${whole} or ${point}: leave the comma out, or type a point.`;
}

function imperial(text: string): Outcome<Millimetres> {
  if (/\/.*(?:'|ft|feet|foot)/.test(text))
    return problem(`“${text}” has a fraction of a foot: type feet and inches, for example 2' 6.`);
  const feet = /^([\d.,]+)\s*(?:'|ft\.?|feet|foot)\s*(.*)$/.exec(text);
  if (!feet) {
    const value = mixed(text.replace(/\s*(?:"|in\.?|inch|inches)$/, ""));
    return value.ok ? ok(inches(value.value)) : value;
  }
  const [, feetText = "", restText = ""] = feet;
  const whole = decimal(feetText);
  if (whole === null) return problem(`“${feetText}” is not a number of feet.`);
  const rest = restText
    .replace(/\s*(?:"|in\.?|inch|inches)$/, "")
    .replace(/^-\s*/, "")
    .trim();
  if (rest === "") return ok(inches(whole * 12));
  if (!Number.isInteger(whole))
    return problem("Feet with a decimal and inches besides: type one or the other.");
  const value = mixed(rest);
  if (!value.ok) return value;
  if (value.value >= 12) return problem(`${rest} after the feet is 12 in or more: read the tape again.`);
  return ok(inches(whole * 12 + value.value));
}

/**
 * Reads a length as a person types it off the tape.
 * Takes `26 1/2`, `26-1/2`, `26.5`, `26,5`, `1/2`, `2' 2 1/2"`, `2ft 2.5in`, `26 1/2 in`, `673 mm`, `67.3 cm`, `0.5 m`,
 * with typographic fractions, primes and dashes, and a minus in front.
 * @param text the entry as typed
 * @param bareUnit what a number without a unit means
 * @returns millimetres, or what is wrong with the entry in a sentence; a figure such as 1,500 is refused, which is a
 * thousand and a half to one person and one and a half to another
 * @example parseLength("2' 2 1/2", "in") // 673.1 mm
 */
export function parseLength(text: string, bareUnit: LengthUnit): Outcome<Millimetres> {
  let rest = plain(text);
  if (rest === "") return problem(`Type the length as on the tape, ${EXAMPLE}.`);
  if (rest.length > 30) return problem("That is too long for a length.");
  const doubtful = doubt(rest);
  if (doubtful) return problem(doubtful);
  const negative = rest.startsWith("-");
  if (negative) rest = rest.slice(1).trim();
  const metric = /^(.*?)\s*(mm|cm|m)$/.exec(rest);
  let result: Outcome<Millimetres>;
  if (metric || (bareUnit === "mm" && NUMBER.test(rest))) {
    const [number, unit] = metric ? [metric[1] ?? "", metric[2] ?? "mm"] : [rest, "mm"];
    const value = decimal(number.trim());
    result =
      value === null
        ? problem(
            `“${number.trim()}” is not a number of ${unit}: type it with a point, for example 673.5 ${unit}.`,
          )
        : ok(mm(value * (METRIC[unit] ?? 1)));
  } else result = imperial(rest);
  if (!result.ok) return result;
  if (result.value > LONGEST_MM) return problem("That is longer than 100 m: read the tape again.");
  return ok(mm(negative && result.value !== 0 ? -result.value : result.value));
}
