import { framePoint } from "../../app/domain/geometry/point";
import { compareAsBuilt, thrustFromToe, toeAngle, wheelbases } from "../../app/domain/layout/square";
import { squareVerdict } from "../../app/domain/layout/square-words";
import type { Outcome } from "../../app/domain/outcome";
import { degrees } from "../../app/domain/units/angle";
import { inches, mm, toInches } from "../../app/domain/units/length";
import type { Topic } from "./check";

function must<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
}
const ends = (station: number, left = 0, right = 0) => ({
  left: framePoint(inches(station + left), inches(30)),
  right: framePoint(inches(station + right), inches(-30)),
});
const verdict = (left: number, right: number) =>
  squareVerdict(
    must(
      compareAsBuilt(ends(44, left, right), {
        method: "square",
        station: inches(44),
        turn: degrees(0),
        residualLeft: mm(0),
        residualRight: mm(0),
      }),
    ),
  );
const practice = { name: "common practice, no source", status: "practice" } as const;

export default {
  topic: "Square",
  checks: [
    {
      about: "1/8 in of total toe over 28 in: 0.25578° in all, 0.12789° at each wheel",
      source: { name: "Plane trigonometry", place: "atan(0.125/28)", status: "derived" },
      got: () => {
        const toe = must(toeAngle(inches(1 / 8), inches(28)));
        return [toe, toe / 2];
      },
      want: [0.25578, 0.12789],
      within: 0.000005,
    },
    {
      about: "rear toe +0.20° left and −0.10° right: thrust angle 0.15°",
      source: { name: "Wheel alignment: thrust angle as half the difference of rear toe", status: "derived" },
      got: () => thrustFromToe(degrees(0.2), degrees(-0.1)),
      want: 0.15,
      within: 1e-12,
    },
    {
      about: "a whole axle turned by t has toe +t and −t: thrust from toe and from the axle's ends agree",
      source: { name: "Plane trigonometry", place: "identity of both definitions", status: "derived" },
      got: () => {
        const t = (Math.atan(2 / 60) * 180) / Math.PI;
        return must(wheelbases(ends(110), ends(0, 1, -1))).thrust - thrustFromToe(degrees(t), degrees(-t));
      },
      want: 0,
      within: 1e-9,
    },
    {
      about: "diagonals of 110 by 60 in: 125.30 in both",
      source: { name: "Euclid, Elements", place: "book I, proposition 47", status: "derived" },
      got: () => {
        const { leftDiagonal, rightDiagonal } = must(wheelbases(ends(110), ends(0)));
        return [toInches(leftDiagonal), toInches(rightDiagonal)];
      },
      want: [125.3, 125.3],
      within: 0.005,
    },
    {
      about: "3, 4, 5: an axle of 3 and a wheelbase of 4 have diagonals of 5, whatever the unit",
      source: { name: "Euclid, Elements", place: "book I, proposition 47", status: "derived" },
      got: () => {
        const axle = (station: number) => ({
          left: framePoint(station, 900),
          right: framePoint(station, -900),
        });
        return must(wheelbases(axle(2400), axle(0))).leftDiagonal;
      },
      want: 3000,
      within: 1e-9,
    },
    {
      about:
        "square when both diagonals are alike: difference of the squared diagonals is 2·width·(L − R) of wheelbase",
      source: {
        name: "Euclid, Elements",
        place: "book II, propositions 12 and 13 (law of cosines)",
        status: "derived",
      },
      got: () => {
        const base = must(wheelbases(ends(110), ends(0, 0.5, -0.5)));
        return toInches(base.leftDiagonal) ** 2 - toInches(base.rightDiagonal) ** 2;
      },
      // FL–RR: (110 + 0.5)² + 60², FR–RL: (110 − 0.5)² + 60².
      want: 110.5 ** 2 - 109.5 ** 2,
      within: 1e-9,
    },
    {
      about: "an eighth passes",
      source: practice,
      got: () => verdict(1 / 8, 0).headline,
      want: "True within 1/8 in: left end 1/8 in ahead, right end on the line.",
    },
    {
      about: "left end 3/16 in back: what to move",
      source: practice,
      got: () =>
        verdict(-3 / 16, 0)
          .moves.map((move) => move.words)
          .join(" "),
      want: "Move the left end ahead 3/16 in.",
    },
  ],
} satisfies Topic;
