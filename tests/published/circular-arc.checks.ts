import { arcByHuygens, arcByParabola, type SegmentGiven, segmentFrom } from "../../app/domain/springs/arc";
import { degrees } from "../../app/domain/units/angle";
import { inches, mm, toInches } from "../../app/domain/units/length";
import type { Check, Topic } from "./check";

const HANDBOOK = "Machinery's Handbook, 31st edition";

const segment = (given: SegmentGiven) => {
  const answer = segmentFrom(given);
  if (!answer.ok) throw new Error(answer.problem);
  return answer.value;
};

/** Angle, arc, chord, rise, area of a circle of radius 1. The page was not seen: worked out from its formulas elsewhere. */
const UNIT_SEGMENTS = `
  1 0.01745 0.01745 0.000038 0.000000
  5 0.08727 0.08724 0.000952 0.000055
  10 0.17453 0.17431 0.003805 0.000442
  15 0.26180 0.26105 0.008555 0.001490
  20 0.34907 0.34730 0.015192 0.003523
  25 0.43633 0.43288 0.023704 0.006857
  30 0.52360 0.51764 0.034074 0.011799
  45 0.78540 0.76537 0.076120 0.039146
  60 1.04720 1.00000 0.133975 0.090586
  90 1.57080 1.41421 0.292893 0.285398
  120 2.09440 1.73205 0.500000 0.614185
  180 3.14159 2.00000 1.000000 1.570796
`
  .trim()
  .split("\n")
  .map((line) => line.trim().split(" ").map(Number));

const unitRows: Check[] = UNIT_SEGMENTS.flatMap(
  ([angle = 0, arc = 0, chord = 0, rise = 0, area = 0]): Check[] => {
    const one = () => segment({ radius: mm(1), angle: degrees(angle) });
    const source = {
      name: HANDBOOK,
      place: "p. 84, segments of circles for radius 1",
      status: "derived" as const,
    };
    return [
      {
        about: `radius 1, angle ${angle}°: arc and chord`,
        source,
        got: () => [one().arc, one().chord],
        want: [arc, chord],
        within: 5.001e-6,
      },
      {
        about: `radius 1, angle ${angle}°: rise and area`,
        source,
        got: () => [one().rise, one().area],
        want: [rise, area],
        within: 5.001e-7,
      },
    ];
  },
);

/** Chord, rise, then radius, angle and arc; then the arc by Huygens and by the parabola. Inches. */
const LEAVES = [
  [48, 6, 51, 56.145, 49.97565, 49.96969, 50],
  [50, 4, 80.125, 36.3611, 50.84901, 50.84794, 50.85333],
  [60, 6.5, 72.4808, 48.9005, 61.86049, 61.85624, 61.87778],
] as const;

const leafRows: Check[] = LEAVES.flatMap(([chord, rise, radius, angle, arc, huygens, parabola]): Check[] => {
  const one = () => segment({ chord: inches(chord), rise: inches(rise) });
  const of = `chord ${chord} in, rise ${rise} in`;
  return [
    {
      about: `${of}: radius and angle`,
      source: { name: HANDBOOK, place: "pp. 79 and 83", status: "derived" },
      got: () => [toInches(one().radius ?? mm(0)), one().angle],
      want: [radius, angle],
      within: 5.001e-5,
    },
    {
      about: `${of}: arc, and arc and rise give the chord again`,
      source: { name: HANDBOOK, place: "pp. 79 and 83", status: "derived" },
      got: () => [toInches(one().arc), toInches(segment({ arc: inches(arc), rise: inches(rise) }).chord)],
      want: [arc, chord],
      // The second is from a printed arc: its last place, a little enlarged.
      within: 6e-6,
    },
    {
      about: `${of}: arc by Huygens's rule`,
      source: { name: "Building Trades Pocketbook", place: "mensuration, part 2", status: "derived" },
      got: () => toInches(arcByHuygens(inches(chord), inches(rise))),
      want: huygens,
      within: 5.001e-6,
    },
    {
      about: `${of}: arc as of a parabola`,
      source: { name: "Series of the arc length", place: "first term", status: "derived" },
      got: () => toInches(arcByParabola(inches(chord), inches(rise))),
      want: parabola,
      within: 5.001e-6,
    },
  ];
});

export default {
  topic: "Circular arc",
  checks: [
    {
      about: "radius 60, rise 8: chord printed 59.86 (cut, not rounded: 59.8665)",
      source: { name: HANDBOOK, place: "p. 79", status: "read" },
      got: () => segment({ rise: mm(8), radius: mm(60) }).chord,
      want: 59.86,
      within: 0.01,
    },
    {
      about: "chord 16, rise 6: radius 8 1/3",
      source: { name: HANDBOOK, place: "p. 79", status: "read" },
      got: () => segment({ chord: mm(16), rise: mm(6) }).radius ?? 0,
      want: 8 + 1 / 3,
      within: 1e-9,
    },
    {
      about: "leaf of 1100 mm with 30 mm camber: radius 5056.67 mm, from camber·(2R − camber) = (span/2)²",
      source: {
        name: "Khurmi & Gupta, A Textbook of Machine Design",
        place: "radius of leaves",
        status: "recomputed",
      },
      got: () => segment({ chord: mm(1100), rise: mm(30) }).radius ?? 0,
      want: 5056.667,
      within: 0.0005,
    },
    ...leafRows,
    ...unitRows,
  ],
} satisfies Topic;
