import { formatInches, inches, parseLength, toInches } from "../../app/domain/units/length";
import type { Check, Topic } from "./check";

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
    ...rounding(12.53125, 16, "12 1/2", "12 9/16"),
    ...rounding(3.03125, 16, "3", "3 1/16"),
    ...rounding(5.40625, 16, "5 3/8", "5 7/16"),
    ...rounding(7.015625, 32, "7", "7 1/32"),
    ...rounding(12.53125, 32, "12 17/32", "12 17/32"),
    ...rounding(5.40625, 32, "5 13/32", "5 13/32"),
  ],
} satisfies Topic;
