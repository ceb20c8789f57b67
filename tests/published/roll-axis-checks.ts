import { Matrix, solve } from "ml-matrix";
import {
  lateralBarRollAxis,
  type SpaceLink,
  spacePoint,
  triangulatedRollAxis,
} from "../../app/domain/links/roll-axis";
import type { Outcome } from "../../app/domain/outcome";
import { mm } from "../../app/domain/units/length";
import type { Check } from "./check";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
type Triple = readonly [number, number, number];
const space = (axle: Triple, frame: Triple): SpaceLink => ({
  axle: spacePoint(...axle),
  frame: spacePoint(...frame),
});
const mirror = ({ axle, frame }: SpaceLink): SpaceLink => ({
  axle: spacePoint(axle.station, -axle.offset, axle.height),
  frame: spacePoint(frame.station, -frame.offset, frame.height),
});
/** Roll centre height over the station 0, and slope, from the six velocities; no symmetry is used. */
function byVelocities(links: readonly SpaceLink[]): number[] {
  const rows = links.map(({ axle: p, frame }) => {
    const [x, y, z] = [frame.station - p.station, frame.offset - p.offset, frame.height - p.height];
    // The link's end keeps its distance: u·v + (p × u)·ω = 0.
    return [x, y, z, p.offset * z - p.height * y, p.height * x - p.station * z, p.station * y - p.offset * x];
  });
  const answer = solve(
    new Matrix([...rows, [0, 0, 0, 1, 0, 0], [0, 0, 1, 0, 0, 0]]),
    Matrix.columnVector([...links.map(() => 0), 1, 0]),
  );
  const [across, roll, yaw] = [answer.get(1, 0), answer.get(3, 0), answer.get(5, 0)];
  return [across / roll, yaw / roll];
}
const TRIANGULATED: readonly (readonly [string, SpaceLink, SpaceLink])[] = [
  [
    "lowers side by side, uppers meeting behind the axle",
    space([0, 500, 200], [610, 500, 240]),
    space([0, 120, 450], [500, 420, 430]),
  ],
  [
    "lowers meeting far ahead, uppers behind",
    space([0, 550, 203], [610, 450, 254]),
    space([0, 120, 450], [508, 420, 430]),
  ],
  [
    "lowers meeting behind, uppers side by side",
    space([0, 250, 210], [650, 480, 260]),
    space([20, 420, 430], [520, 420, 425]),
  ],
  [
    "both pairs set off the axle's station",
    space([30, 500, 190], [700, 350, 260]),
    space([-40, 90, 480], [430, 390, 470]),
  ],
];
const rolls = TRIANGULATED.map(
  ([name, lower, upper]): Check => ({
    about: `four-link, ${name}: roll centre height and slope of the roll axis from the velocities of the axle`,
    source: { name: "ml-matrix", place: "four links, six velocities", status: "library" },
    got: () => {
      const axis = value(triangulatedRollAxis(lower, upper, mm(0)));
      return [axis.rollCentre, axis.slope];
    },
    want: byVelocities([lower, mirror(lower), upper, mirror(upper)]),
    within: 1e-7,
  }),
);
const BARS: readonly (readonly [string, SpaceLink, SpaceLink])[] = [
  [
    "behind the axle, falling to the left",
    space([0, 450, 203], [610, 450, 240]),
    space([-60, 470, 350], [-60, -480, 390]),
  ],
  ["ahead of the axle, level", space([0, 500, 210], [600, 500, 200]), space([80, -450, 340], [80, 450, 340])],
];
const bars = BARS.map(
  ([name, lower, bar]): Check => ({
    about: `two lower links side by side, one upper link in the middle, lateral bar ${name}: roll centre and slope from the velocities of the axle`,
    source: { name: "ml-matrix", place: "four links, six velocities", status: "library" },
    got: () => {
      const axis = value(lateralBarRollAxis({ lower, bar }, mm(0)));
      return [axis.rollCentre, axis.slope];
    },
    want: byVelocities([lower, mirror(lower), space([0, 0, 430], [500, 0, 425]), bar]),
    within: 1e-7,
  }),
);

/** Roll axes against the axle as a free body in space, held by four links, asked to turn about the vehicle's axis. */
export const rollAxisChecks: Check[] = [...rolls, ...bars];
