import type { Degrees } from "../units/angle";
import type { Millimetres } from "../units/length";

/** What the criteria look at; null: not measured. */
export type OffRoadFigures = {
  approach: Degrees | null;
  departure: Degrees | null;
  ramp: Degrees | null;
  frontAxleClearance: Millimetres | null;
  rearAxleClearance: Millimetres | null;
  /** Between the axles. */
  runningClearance: Millimetres | null;
};

export type OffRoadRule = {
  name: string;
  /** How sure the figures are: see tests/published. */
  status: "read" | "from memory";
  /** So many of the criteria have to be met. */
  atLeast: number;
  criteria: readonly { figure: keyof OffRoadFigures; least: number }[];
  /** What else the rule asks for, in words. */
  besides: string;
};

/** The geometric part of two published rules for off-road vehicles. Degrees and millimetres. */
export const OFF_ROAD_RULES: readonly OffRoadRule[] = [
  {
    name: "Directive 87/403/EEC (category G of M1, and N1 to 2 t)",
    status: "read",
    atLeast: 5,
    criteria: [
      { figure: "approach", least: 25 },
      { figure: "departure", least: 20 },
      { figure: "ramp", least: 20 },
      { figure: "frontAxleClearance", least: 180 },
      { figure: "rearAxleClearance", least: 180 },
      { figure: "runningClearance", least: 200 },
    ],
    besides: "All-wheel drive, a differential lock, and 30 % of gradient alone.",
  },
  {
    name: "49 CFR 523.5(b)",
    status: "from memory",
    atLeast: 4,
    criteria: [
      { figure: "approach", least: 28 },
      { figure: "ramp", least: 14 },
      { figure: "departure", least: 20 },
      { figure: "runningClearance", least: 200 },
      { figure: "frontAxleClearance", least: 180 },
    ],
    besides: "Four-wheel drive, or more than 6000 lb of gross weight.",
  },
];

export type OffRoadVerdict = {
  rule: OffRoadRule;
  met: (keyof OffRoadFigures)[];
  missed: (keyof OffRoadFigures)[];
  notMeasured: (keyof OffRoadFigures)[];
  /** Null: with what was not measured it could go either way. */
  isMet: boolean | null;
};

/**
 * Which criteria of a rule are met; equal to the least is met. In 49 CFR 523.5(b) front and rear axle clearance are one
 * criterion: give the smaller of the two as front axle clearance.
 * @example offRoadVerdict(OFF_ROAD_RULES[0], figures).isMet // true
 */
export function offRoadVerdict(rule: OffRoadRule, figures: OffRoadFigures): OffRoadVerdict {
  const sort = (is: (value: number | null, least: number) => boolean) =>
    rule.criteria.filter(({ figure, least }) => is(figures[figure], least)).map(({ figure }) => figure);
  const met = sort((value, least) => value !== null && value >= least);
  const missed = sort((value, least) => value !== null && value < least);
  const notMeasured = sort((value) => value === null);
  const isMet =
    met.length >= rule.atLeast ? true : met.length + notMeasured.length < rule.atLeast ? false : null;
  return { rule, met, missed, notMeasured, isMet };
}
