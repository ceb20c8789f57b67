import { ruleDiameter, tyreSize } from "../../app/domain/tyres/designation";
import { loadOf, speedOf } from "../../app/domain/tyres/load-index";
import { toInches } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";

const size = (text: string) => {
  const read = tyreSize(text);
  if (!read.ok) throw new Error(read.problem);
  return read.value;
};
const RULE: Source = {
  name: "UN R30",
  place: "6.1.2, D = d + 2H with H to the nearest mm",
  status: "from memory",
};
const nominal = (text: string, exact: number, rule: number): Check[] => [
  {
    about: `${text}: nominal diameter`,
    source: { name: "Metric tyre designation", place: "rim × 25.4 + 2 × width × aspect", status: "derived" },
    got: () => size(text).diameter,
    want: exact,
    within: 0.005,
  },
  {
    about: `${text}: diameter by the rule`,
    source: RULE,
    got: () => ruleDiameter(size(text)) ?? Number.NaN,
    want: rule,
    within: 0,
  },
];
const LOAD: Source = {
  name: "ISO 4000-1",
  place: "load index, as tyre dealers' tables print it",
  status: "read",
};
const SPEED: Source = { ...LOAD, place: "speed symbol, as a table of it prints it" };

export default {
  topic: "Tyres",
  checks: [
    ...nominal("205/55R16", 631.9, 632),
    ...nominal("195/65R15", 634.5, 635),
    ...nominal("225/70R16", 721.4, 722),
    ...nominal("265/70R17", 802.8, 804),
    ...nominal("265/75R16", 803.9, 804),
    ...nominal("235/85R16", 805.9, 806),
    ...nominal("285/75R16", 833.9, 834),
    ...nominal("315/70R17", 872.8, 874),
    {
      about: "P205/60R15: design diameter 24.69 in",
      source: {
        name: "Tire and Rim Association tables",
        place: "quoted at autopedia.com, message 7871",
        status: "read",
      },
      got: () => toInches(size("P205/60R15").diameter),
      want: 24.69,
      within: 0.006,
    },
    ...(
      [
        [81, 462],
        [82, 475],
        [85, 515],
        [86, 530],
        [87, 545],
        [90, 600],
        [91, 615],
        [92, 630],
        [95, 690],
        [96, 710],
        [112, 1120],
      ] as const
    ).map(
      ([index, kilograms]): Check => ({
        about: `load index ${index} carries ${kilograms} kg`,
        source: LOAD,
        got: () => loadOf(index) ?? Number.NaN,
        want: kilograms,
        within: 0,
      }),
    ),
    ...(
      [
        ["N", 140],
        ["Q", 160],
        ["S", 180],
        ["H", 210],
        ["V", 240],
        ["Y", 300],
      ] as const
    ).map(
      ([symbol, speed]): Check => ({
        about: `speed symbol ${symbol} is ${speed} km/h`,
        source: SPEED,
        got: () => speedOf(symbol) ?? Number.NaN,
        want: speed,
        within: 0,
      }),
    ),
  ],
} satisfies Topic;
