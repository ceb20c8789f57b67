import {
  jointAngle,
  mostLag,
  peakAcceleration,
  residualAngle,
  SPEED_LIMITS,
  unevenness,
  velocityRatio,
} from "../../app/domain/driveline/joint";
import { degrees } from "../../app/domain/units/angle";
import type { Check, Source, Topic } from "./check";

const HANDBOOK: Source = {
  name: "Machinery's Handbook, 31st edition",
  place: "universal joints, table of speeds (1/cos β and cos β; page not seen)",
  status: "derived",
};
const row = (angle: number, most: number, least: number, uneven: number, lag: number): Check => ({
  about: `joint at ${angle}°: fastest, slowest, unevenness, greatest lag`,
  source: HANDBOOK,
  got: () => [
    velocityRatio(degrees(angle), degrees(0)),
    velocityRatio(degrees(angle), degrees(90)),
    unevenness(degrees(angle)),
    mostLag(degrees(angle)),
  ],
  want: [most, least, uneven, lag],
  within: 5e-5,
});
const KHURMI: Source = {
  name: "Khurmi & Gupta, Theory of Machines",
  place: "ch. 9, Hooke's joint",
  status: "recomputed",
};
const MAKER: Source = { name: "A driveshaft maker's handbook", status: "read" };
const space = (plan: number, side: number) =>
  jointAngle({ plan: degrees(0), side: degrees(0) }, { plan: degrees(plan), side: degrees(side) });
/** The joint angle at which the driven shaft's fluctuation is a share of the mean, found by halving. */
const angleFor = (fluctuation: number) => {
  let [low, high] = [0, 45];
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (unevenness(degrees(middle)) < fluctuation) low = middle;
    else high = middle;
  }
  return low;
};

export default {
  topic: "Universal joints",
  checks: [
    row(1, 1.000152, 0.999848, 0.000305, 0.0044),
    row(3, 1.001372, 0.99863, 0.002743, 0.0393),
    row(5, 1.00382, 0.996195, 0.007625, 0.1092),
    row(8, 1.009828, 0.990268, 0.01956, 0.2802),
    row(10, 1.015427, 0.984808, 0.030619, 0.4386),
    row(15, 1.035276, 0.965926, 0.06935, 0.9931),
    row(20, 1.064178, 0.939693, 0.124485, 1.7817),
    row(25, 1.103378, 0.906308, 0.19707, 2.8171),
    row(30, 1.154701, 0.866025, 0.288675, 4.1172),
    row(35, 1.220775, 0.819152, 0.401623, 5.7054),
    row(40, 1.305407, 0.766044, 0.539363, 7.6126),
    row(45, Math.SQRT2, Math.SQRT1_2, Math.SQRT1_2, 9.8793),
    {
      about: "1200 rpm, fluctuation at most 100 rpm: 16.4°",
      source: KHURMI,
      got: () => angleFor(100 / 1200),
      want: 16.4,
      within: 0.05,
    },
    {
      about: "the same: fastest 1251 and slowest 1151 rpm",
      source: { ...KHURMI, status: "read" },
      got: () => [
        1200 * velocityRatio(degrees(angleFor(100 / 1200)), degrees(0)),
        1200 * velocityRatio(degrees(angleFor(100 / 1200)), degrees(90)),
      ],
      want: [1251, 1151],
      within: 0.5,
    },
    {
      about: "500 rpm ± 6 %: 19.64°",
      source: KHURMI,
      got: () => angleFor(0.12),
      want: 19.64,
      within: 0.005,
    },
    {
      about: "18°: both shafts equally fast at 44.3° and 135.7°",
      source: KHURMI,
      got: () => [velocityRatio(degrees(18), degrees(44.3)), velocityRatio(degrees(18), degrees(135.7))],
      want: [1, 1],
      within: 5e-5,
    },
    {
      about: "20°, 1500 rpm: peak acceleration 3083.40 rad/s² (the book's rounding gives 3090)",
      source: { ...KHURMI, status: "derived" },
      got: () => peakAcceleration(degrees(20), 1500),
      want: 3083.4,
      within: 0.005,
    },
    {
      about: "20°, 1500 rpm, 0.12 kg·m²: torque about 370 N·m (371 in the book, from memory)",
      source: KHURMI,
      got: () => 0.12 * peakAcceleration(degrees(20), 1500),
      want: 371,
      within: 1.5,
    },
    {
      about: "3° drives as unevenly as the makers allow a residual joint: 0.0027",
      source: MAKER,
      got: () => unevenness(degrees(3)),
      want: 0.0027,
      within: 0.00005,
    },
    {
      about: "2.15° from above and 2.50° from the side: 3.3°",
      source: MAKER,
      got: () => space(2.15, 2.5),
      want: 3.3,
      within: 0.05,
    },
    ...(
      [
        [3, 4, 4.99417],
        [2, 5, 5.38141],
        [6, 8, 9.95378],
        [10, 10, 14.00194],
      ] as const
    ).map(
      ([plan, side, want]): Check => ({
        about: `${plan}° and ${side}°: the angle in space, not ${Math.hypot(plan, side).toFixed(3)} by squares`,
        source: { name: "Solid geometry", place: "tan² of both views added", status: "derived" },
        got: () => space(plan, side),
        want,
        within: 5e-6,
      }),
    ),
    {
      about: "two joints in phase, 4° and 3°, 5° and 4°: residual 2.6458° and 3°",
      source: { name: "Joints in series", place: "√|β1² − β2²|", status: "derived" },
      got: () => [
        residualAngle(degrees(4), degrees(3), degrees(0)),
        residualAngle(degrees(5), degrees(4), degrees(0)),
      ],
      want: [2.6458, 3],
      within: 5e-5,
    },
    {
      about: "makers' limits at 5000, 4500, 4000 and 3500 rpm",
      source: MAKER,
      got: () => SPEED_LIMITS.slice(0, 4).map((limit) => limit.angle),
      want: [3.2, 3.7, 4.2, 5],
      within: 0,
    },
    {
      about: "3° at 3000 rpm: peak acceleration, exact 270.71 and by β²ω² 270.58",
      source: {
        name: "Single universal joint",
        place: "second derivative, worked by hand",
        status: "derived",
      },
      got: () => [peakAcceleration(degrees(3), 3000), ((3 * Math.PI) / 180) ** 2 * (100 * Math.PI) ** 2],
      want: [270.71, 270.58],
      within: 0.005,
    },
  ],
} satisfies Topic;
