import { clearanceAngles } from "../../app/domain/dimensions/clearance-angles";
import { OFF_ROAD_RULES } from "../../app/domain/dimensions/off-road";
import { approachAngle } from "../../app/domain/layout/approach";
import { mm } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";

const DEFINITION: Source = {
  name: "49 CFR 523.2",
  place: "approach and breakover angle, formula of the tangent to the static loaded radius",
  status: "derived",
};
const approach = (r: number, d: number, z: number, want: number): Check => ({
  about: `approach: loaded radius ${r}, point ${d} ahead and ${z} high`,
  source: DEFINITION,
  got: () => approachAngle(mm(r), mm(d), mm(z)) ?? Number.NaN,
  want,
  within: 5e-5,
});
const ramp = (wheelbase: number, r: number, at: number, height: number, want: number): Check => ({
  about: `ramp: wheelbase ${wheelbase}, loaded radius ${r}, point ${at} from the rear axle and ${height} high`,
  source: DEFINITION,
  got: () =>
    clearanceAngles(
      { station: mm(wheelbase), loadedRadius: mm(r) },
      { station: mm(0), loadedRadius: mm(r) },
      [{ station: mm(at), height: mm(height) }],
    ).ramp?.angle ?? Number.NaN,
  want,
  within: 5e-5,
});
const DIRECTIVE: Source = {
  name: "Directive 87/403/EEC",
  place: "annex, category G, as two law pages give it",
  status: "read",
};

export default {
  topic: "Vehicle dimensions",
  checks: [
    approach(16, 30, 14, 28.3369),
    approach(15.5, 36, 20, 32.417),
    approach(375, 800, 420, 31.1247),
    approach(375, 900, 350, 23.0231),
    ramp(100, 16, 50, 10, 23.3647),
    ramp(100, 16, 40, 10, 24.4478),
    ramp(2700, 375, 1350, 250, 21.534),
    ...(
      [
        ["approach", 25],
        ["departure", 20],
        ["ramp", 20],
        ["frontAxleClearance", 180],
        ["rearAxleClearance", 180],
        ["runningClearance", 200],
      ] as const
    ).map(
      ([figure, want]): Check => ({
        about: `off-road: ${figure} at least ${want}`,
        source: DIRECTIVE,
        got: () => OFF_ROAD_RULES[0]?.criteria.find((one) => one.figure === figure)?.least ?? Number.NaN,
        want,
        within: 0,
      }),
    ),
    {
      about: "off-road: five of the six criteria",
      source: DIRECTIVE,
      got: () => OFF_ROAD_RULES[0]?.atLeast ?? Number.NaN,
      want: 5,
      within: 0,
    },
    {
      about: "49 CFR 523.5(b): approach, ramp and departure at least 28, 14 and 20°",
      source: { name: "49 CFR 523.5", place: "(b)", status: "from memory" },
      got: () =>
        (["approach", "ramp", "departure"] as const).map(
          (figure) => OFF_ROAD_RULES[1]?.criteria.find((one) => one.figure === figure)?.least ?? Number.NaN,
        ),
      want: [28, 14, 20],
      within: 0,
    },
  ],
} satisfies Topic;
