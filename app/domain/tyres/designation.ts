import { type Outcome, ok, problem } from "../outcome";
import { inches, type Millimetres, mm } from "../units/length";

/** A tyre as its side says. */
export type TyreSize = {
  system: "metric" | "flotation";
  /** P, LT or none. */
  service: "" | "P" | "LT";
  width: Millimetres;
  /** Section height over width; null for flotation sizes, which give the diameter instead. */
  aspect: number | null;
  /** Nominal rim diameter in inches. */
  rimInches: number;
  /** Nominal outside diameter, unloaded. */
  diameter: Millimetres;
  sectionHeight: Millimetres;
  loadIndex: number | null;
  speedSymbol: string | null;
};

const METRIC =
  /^(P|LT)?\s*(\d{3})\s*\/\s*(\d{2})\s*(?:Z?R|-|D|B)\s*(\d{2}(?:\.5)?)\s*(LT|C)?(?:\s+(\d{2,3})(?:\/\d{2,3})?\s*([A-Z]\d?)?)?$/i;
const FLOTATION =
  /^(\d{2}(?:\.\d{1,2})?)\s*[x×]\s*(\d{1,2}(?:\.\d{1,2})?)\s*(?:R|-|D|B)\s*(\d{2}(?:\.5)?)\s*(LT)?(?:\s+(\d{2,3})(?:\/\d{2,3})?\s*([A-Z]\d?)?)?$/i;

/** Beyond these it is a slip of the finger, or no road tyre. */
const WIDTHS = { least: 100, most: 500 };
const RIMS = { least: 8, most: 30 };

/**
 * Reads a tyre's size as it stands on its side: `265/70R17`, `P205/60R15`, `LT285/75R16 126/123Q`, `35x12.50R15LT`.
 * The diameter is nominal: rim × 25.4 + 2 × width × aspect, or the flotation size's own first number. A mounted tyre is
 * measured, not reckoned: makers differ, and flotation sizes as a rule measure under their number.
 * Source: metric and flotation designations as in the tyre standards' annexes (from memory).
 * @returns a problem in words when it is no size
 * @example tyreSize("265/70R17").value.diameter // 802.8
 */
export function tyreSize(text: string): Outcome<TyreSize> {
  const plain = text.trim().replace(/\s+/g, " ").replace(/,/g, ".");
  const metric = METRIC.exec(plain);
  if (metric) {
    const [, before = "", width = "", aspect = "", rim = "", after = "", index, symbol] = metric;
    const service = (before || (/^LT$/i.test(after) ? "LT" : "")).toUpperCase() as TyreSize["service"];
    const w = Number(width);
    const height = (w * Number(aspect)) / 100;
    return checked({
      system: "metric",
      service,
      width: mm(w),
      aspect: Number(aspect) / 100,
      rimInches: Number(rim),
      diameter: mm(inches(Number(rim)) + 2 * height),
      sectionHeight: mm(height),
      loadIndex: index === undefined ? null : Number(index),
      speedSymbol: symbol?.toUpperCase() ?? null,
    });
  }
  const flotation = FLOTATION.exec(plain);
  if (flotation) {
    const [, diameter = "", width = "", rim = "", after = "", index, symbol] = flotation;
    const d = inches(Number(diameter));
    if (Number(diameter) <= Number(rim))
      return problem("The tyre is no larger than its rim: is it the size?");
    return checked({
      system: "flotation",
      service: after ? "LT" : "",
      width: inches(Number(width)),
      aspect: null,
      rimInches: Number(rim),
      diameter: d,
      sectionHeight: mm((d - inches(Number(rim))) / 2),
      loadIndex: index === undefined ? null : Number(index),
      speedSymbol: symbol?.toUpperCase() ?? null,
    });
  }
  return problem("That is no tyre size: type it as on the side, such as 265/70R17 or 35x12.50R15.");
}

function checked(size: TyreSize): Outcome<TyreSize> {
  if (size.width < WIDTHS.least || size.width > WIDTHS.most)
    return problem("No road tyre is so wide: read the side again.");
  if (size.rimInches < RIMS.least || size.rimInches > RIMS.most)
    return problem("There is no such rim: read the side again.");
  return ok(size);
}

/** Nominal rim diameters in the regulation's own millimetres. Source: UN R30, annex (from memory). */
const RIM_MM: Record<number, number> = {
  10: 254,
  12: 305,
  13: 330,
  14: 356,
  15: 381,
  16: 406,
  17: 432,
  18: 457,
  19: 483,
  20: 508,
  21: 533,
  22: 559,
};

/**
 * Outside diameter by the regulation's rule: d + 2H, H = width × aspect to the nearest millimetre, halves up.
 * Source: UN R30 and R54, 6.1.2 (from memory).
 * @returns null for flotation sizes, which have a table of their own, and for rims that are not in the list
 * @example ruleDiameter(tyreSize("265/70R17").value) // 804
 */
export function ruleDiameter(size: TyreSize): Millimetres | null {
  const rim = RIM_MM[size.rimInches];
  if (size.aspect === null || rim === undefined) return null;
  // The product of two whole numbers over a hundred: exact halves are halves.
  const height = Math.floor((Math.round(size.width) * Math.round(size.aspect * 100)) / 100 + 0.5);
  return mm(rim + 2 * height);
}

/**
 * Turns in a kilometre of a tyre that rolls on a radius.
 * @param rollingRadius measured: it lies between the loaded and the free radius
 * @throws RangeError when it is not above zero
 * @example turnsPerKilometre(mm(400)) // 397.887
 */
export function turnsPerKilometre(rollingRadius: Millimetres): number {
  if (!(rollingRadius > 0)) throw new RangeError(`${rollingRadius} mm is not a radius`);
  return 1e6 / (2 * Math.PI * rollingRadius);
}
