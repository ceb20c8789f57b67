import { degrees, toDegrees, toRadians } from "../../app/domain/units/angle";
import {
  formatDecimalInches,
  formatInches,
  inches,
  mm,
  parseLength,
  roundToStep,
  type Ties,
  toInches,
} from "../../app/domain/units/length";
import { parseAngle } from "../../app/domain/units/parse-angle";
import { decimals } from "../../app/domain/units/rounding";
import type { Check, Status, Topic } from "./check";

const E29 = {
  name: "ASTM E29",
  place: "rounding method, exact halves to even",
  status: "from memory",
} as const;
const TAPE = { name: "common practice, no source", status: "practice" } as const;

const rounding = (value: number, denominator: 16 | 32, even: string, up: string): Check[] => [
  {
    about: `${value} in to 1/${denominator}, halves to even`,
    source: E29,
    got: () => formatInches(inches(value), { denominator, ties: "to-even" }),
    want: even,
  },
  {
    about: `${value} in to 1/${denominator}, halves away from zero`,
    source: TAPE,
    got: () => formatInches(inches(value), { denominator }),
    want: up,
  },
];

const read = (text: string) => {
  const length = parseLength(text, "in");
  return length.ok ? toInches(length.value) : Number.NaN;
};

const angle = (text: string) => {
  const came = parseAngle(text);
  return came.ok ? came.value : Number.NaN;
};
const SP811 = { name: "NIST SP 811", status: "read" } as const;
const iso = (rule: string, status: Status) =>
  ({ name: "ISO 80000-1:2009", place: `annex B, rule ${rule}`, status }) as const;
const DIN = {
  name: "DIN 1333, by the manual of a statistics package",
  place: "rdrr.io, miceadds, round2",
  status: "read",
} as const;
const whole = (values: readonly number[], ties: Ties) =>
  values.map((value) => roundToStep(mm(value), mm(1), ties));
const TABLE = { name: "Machinery's Handbook, 31st edition", status: "recomputed" } as const;

/** Every eighth of an inch to 5 in, half of them half way between two hundredths. */
const EIGHTHS = Array.from({ length: 81 }, (_, i) => (i - 40) / 8);
/** The same by the machine's own formatter, which has both rules. */
const byFormatter = (roundingMode: "halfEven" | "halfExpand") => {
  const options = { minimumFractionDigits: 2, maximumFractionDigits: 2, useGrouping: false, roundingMode };
  const format = new Intl.NumberFormat("en", options as Intl.NumberFormatOptions);
  return EIGHTHS.map((value) =>
    format
      .format(value)
      .replace(/^-(?=0\.00$)/, "")
      .replace("-", "−"),
  ).join(" ");
};
const formatter = (mode: string) =>
  ({ name: "Intl.NumberFormat (ICU)", place: `roundingMode ${mode}`, status: "library" }) as const;

export default {
  topic: "Inches and rounding",
  checks: [
    {
      about: "one inch is 25.4 mm",
      source: { name: "NIST SP 811", place: "appendix B", status: "from memory" },
      got: () => inches(1),
      want: 25.4,
      within: 0,
    },
    {
      about: "one yard is 0.9144 m",
      source: {
        name: "International yard and pound agreement",
        place: "1959",
        status: "from memory",
      },
      got: () => inches(36),
      want: 914.4,
      within: 1e-9,
    },
    {
      about: "3 ft typed on the tape is 914.4 mm",
      source: {
        name: "International yard and pound agreement",
        place: "1959",
        status: "from memory",
      },
      got: () => read("3'") * 25.4,
      want: 914.4,
      within: 1e-9,
    },
    {
      about: "100 ft typed is 30.48 m",
      source: { name: "International yard and pound agreement", place: "1959", status: "recomputed" },
      got: () => read("100 ft") * 25.4,
      want: 30_480,
      within: 1e-6,
    },
    {
      about: "1/64, 1/16, 13/32, 31/64 and 63/64 in typed, in mm",
      source: { ...TABLE, place: "fractional inch to millimetre" },
      got: () => ["1/64", "1/16", "13/32", "31/64", "63/64"].map((text) => read(text) * 25.4),
      want: [0.396875, 1.5875, 10.31875, 12.303125, 25.003125],
      within: 5e-9,
    },
    {
      about: "1/64, 3/64, 7/32, 11/16 and 57/64 in as decimals",
      source: { ...TABLE, place: "decimal equivalents of fractions" },
      got: () => ["1/64", "3/64", "7/32", "11/16", "57/64"].map(read),
      want: [0.015625, 0.046875, 0.21875, 0.6875, 0.890625],
      within: 5e-10,
    },
    {
      about: "6.974 951 5 to seven digits: the digit before is odd",
      source: { ...SP811, place: "B.7.1" },
      got: () => decimals(6.9749515, 6, "to-even").size,
      want: "6.974952",
    },
    {
      about: "6.974 950 5 to seven digits: the digit before is even",
      source: { ...SP811, place: "B.7.1" },
      got: () => decimals(6.9749505, 6, "to-even").size,
      want: "6.974950",
    },
    {
      about: "6.974 951 5 to three and five digits",
      source: { ...SP811, place: "B.7.1" },
      got: () => [2, 4].map((places) => decimals(6.9749515, places, "to-even").size).join(" "),
      want: "6.97 6.9750",
    },
    {
      about: "1225.0 and 1235.0 to the nearest 10, halves to even",
      source: iso("A", "read"),
      got: () => [1225, 1235].map((value) => roundToStep(mm(value), mm(10), "to-even")),
      want: [1220, 1240],
      within: 1e-9,
    },
    {
      about: "1225.0 and 1235.0 to the nearest 10, halves away from zero",
      source: iso("B", "recomputed"),
      got: () => [1225, 1235].map((value) => roundToStep(mm(value), mm(10))),
      want: [1230, 1240],
      within: 1e-9,
    },
    {
      about: "12.223, 12.251 and 12.275 to 0.1; 1222.3, 1225.1 and 1227.5 to 10",
      source: { name: "ISO 80000-1:2009", place: "annex B.2", status: "recomputed" },
      got: () => [
        ...[12.223, 12.251, 12.275].map((value) => roundToStep(mm(value), mm(0.1), "to-even")),
        ...[1222.3, 1225.1, 1227.5].map((value) => roundToStep(mm(value), mm(10), "to-even")),
      ],
      want: [12.2, 12.3, 12.3, 1220, 1230, 1230],
      within: 1e-9,
    },
    {
      about: "−1.5, −2.5, −3.5, −1.51 and −1.49 away from zero",
      source: DIN,
      got: () => whole([-1.5, -2.5, -3.5, -1.51, -1.49], "away-from-zero"),
      want: [-2, -3, -4, -2, -1],
      within: 0,
    },
    {
      about: "1.5, 2.5, 3.5, 1.51 and 1.49 away from zero",
      source: DIN,
      got: () => whole([1.5, 2.5, 3.5, 1.51, 1.49], "away-from-zero"),
      want: [2, 3, 4, 2, 1],
      within: 0,
    },
    {
      about: "the same ten to even",
      source: { ...DIN, name: "IEEE 754, by the manual of a statistics package" },
      got: () => whole([1.5, 2.5, 3.5, 1.51, 1.49, -1.5, -2.5, -3.5, -1.51, -1.49], "to-even"),
      want: [2, 2, 4, 2, 1, -2, -2, -4, -2, -1],
      within: 0,
    },
    {
      about: "81 lengths from −5 to 5 in by eighths to two decimals, halves to even",
      source: formatter("halfEven"),
      got: () => EIGHTHS.map((value) => formatDecimalInches(inches(value), 2, "to-even")).join(" "),
      want: byFormatter("halfEven"),
    },
    {
      about: "the same lengths, halves away from zero",
      source: formatter("halfExpand"),
      got: () => EIGHTHS.map((value) => formatDecimalInches(inches(value))).join(" "),
      want: byFormatter("halfExpand"),
    },
    {
      about: "one degree, one minute and one second typed, in radians",
      source: { name: "NIST SP 811", place: "appendix B.8, plane angle", status: "recomputed" },
      got: () => ["1°", "1'", '1"'].map((text, i) => toRadians(degrees(angle(text))) * 100 ** (i + 1)),
      want: [1.745329, 2.908882, 4.848137],
      within: 5e-7,
    },
    {
      about: "one radian is 57° 17' 44.8\"",
      source: { name: "NIST SP 811", place: "appendix B.8, plane angle", status: "derived" },
      got: () => angle("57° 17' 44.8\""),
      want: toDegrees(1),
      within: 0.05 / 3600,
    },
    ...rounding(12.53125, 16, "12 1/2", "12 9/16"),
    ...rounding(3.03125, 16, "3", "3 1/16"),
    ...rounding(5.40625, 16, "5 3/8", "5 7/16"),
    ...rounding(7.015625, 32, "7", "7 1/32"),
    ...rounding(12.53125, 32, "12 17/32", "12 17/32"),
    ...rounding(5.40625, 32, "5 13/32", "5 13/32"),
  ],
} satisfies Topic;
