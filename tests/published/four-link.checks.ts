import { Matrix, solve } from "ml-matrix";
import { antiSquat } from "../../app/domain/links/anti-squat";
import { type FourLink, fourLinkAtRise, fourLinkAtSwing } from "../../app/domain/links/four-link";
import { type InstantCentre, instantCentre } from "../../app/domain/links/instant-centre";
import { ladderBarAtRise } from "../../app/domain/links/ladder-bar";
import { linkLength, linkSlope, type SideLink } from "../../app/domain/links/side-link";
import type { Outcome } from "../../app/domain/outcome";
import { type SidePoint, sidePoint } from "../../app/domain/springs/leaf-travel";
import { degrees } from "../../app/domain/units/angle";
import { mm } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";
import { rollAxisChecks } from "./roll-axis-checks";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
type Pair = readonly [number, number];
const link = (axle: Pair, frame: Pair): SideLink => ({
  axle: sidePoint(...axle),
  frame: sidePoint(...frame),
});
const GILLESPIE = "Gillespie, Fundamentals of Vehicle Dynamics";
const point = (centre: InstantCentre): SidePoint => {
  if (centre.kind !== "point") throw new Error("The links are parallel.");
  return centre.point;
};
const squat = (centre: InstantCentre, height: number, wheelbase: number) =>
  value(antiSquat(centre, { contact: sidePoint(0, 0), cgHeight: mm(height), wheelbase: mm(wheelbase) }));

/* Norton's four-bar: ground 100, crank 40 (our lower link), coupler 120 (our axle), rocker 80 (our upper link). */

const [GROUND, CRANK, COUPLER, ROCKER] = [100, 40, 120, 80];
const out = (from: Pair, length: number, angle: number): Pair => [
  from[0] + length * Math.cos(angle),
  from[1] + length * Math.sin(angle),
];
/** The rocker's angle from the crank's by Freudenstein's equation; sign −1 for the open circuit, 1 for the crossed one. */
function rockerAngle(crank: number, sign: number): number {
  const [k1, k2] = [GROUND / CRANK, GROUND / ROCKER];
  const k3 = (CRANK ** 2 - COUPLER ** 2 + ROCKER ** 2 + GROUND ** 2) / (2 * CRANK * ROCKER);
  const [a, b] = [Math.cos(crank) - k1 - k2 * Math.cos(crank) + k3, -2 * Math.sin(crank)];
  const c = k1 - (k2 + 1) * Math.cos(crank) + k3;
  return 2 * Math.atan2(-b + sign * Math.sqrt(b * b - 4 * a * c), 2 * a);
}
const RAD = Math.PI / 180;
/** The four-bar put together with its crank at an angle, then swung to 40°; answers coupler and rocker in degrees. */
function swungToForty(from: number, sign: number): number[] {
  const [a, b] = [out([0, 0], CRANK, from * RAD), out([GROUND, 0], ROCKER, rockerAngle(from * RAD, sign))];
  const lower = link(a, [0, 0]);
  const upper = link(b, [GROUND, 0]);
  const got = value(fourLinkAtSwing({ lower, upper, axle: lower.axle }, degrees(40 - from)));
  const angle = (p: SidePoint, q: SidePoint) => Math.atan2(q.height - p.height, q.station - p.station) / RAD;
  return [angle(got.lower.axle, got.upper.axle), angle(got.upper.frame, got.upper.axle)];
}
const norton = [70, 100, 10, -20].flatMap((from): Check[] => [
  {
    about: `four-bar of 40, 120, 80 on 100, put together with the crank at ${from}° and swung to 40°: coupler and rocker`,
    source: { name: "Norton, Design of Machinery", place: "example 4-1, open circuit", status: "recomputed" },
    got: () => swungToForty(from, -1),
    want: [20.297883, 57.32488],
    within: 5e-6,
  },
  {
    about: `the same from ${from}°, the other way together`,
    source: {
      name: "Norton, Design of Machinery",
      place: "example 4-1, crossed circuit",
      status: "recomputed",
    },
    got: () => swungToForty(from, 1),
    want: [-60.977967, -98.004964],
    within: 5e-6,
  },
]);

/* Three four-links for the methods that take any. */

const FOUR_LINKS: readonly (readonly [string, FourLink])[] = [
  [
    "24 and 20 in links that meet ahead",
    { lower: link([0, 8], [24, 10]), upper: link([0, 16], [20, 15]), axle: sidePoint(0, 12) },
  ],
  [
    "24 and 18 in links that meet near",
    { lower: link([0, 10], [24, 11]), upper: link([0, 18], [18, 15]), axle: sidePoint(0, 14) },
  ],
  [
    "links that meet behind the axle, upper pivot set back",
    { lower: link([0, 8], [26, 7]), upper: link([-2, 17], [18, 18.5]), axle: sidePoint(0.5, 12.5) },
  ],
];
const RISES = [-3, 0, 3];

/** Instant centre from how the axle moves and turns in a small step: v = ω × r. */
function byMovement(fourLink: FourLink, rise: number): number[] {
  const step = 1e-4;
  const [a, b] = [rise - step, rise + step].map((r) => value(fourLinkAtRise(fourLink, mm(r))));
  const at = value(fourLinkAtRise(fourLink, mm(rise)));
  if (!a || !b) throw new Error("no step");
  const turn = (b.turn - a.turn) * RAD;
  return [
    at.axle.station - (b.axle.height - a.axle.height) / turn,
    at.axle.height + (b.axle.station - a.axle.station) / turn,
  ];
}
const movement = FOUR_LINKS.flatMap(([name, fourLink]) =>
  RISES.map(
    (rise): Check => ({
      about: `${name}, axle ${rise} in up: instant centre from a small step of the axle along its path`,
      source: { name: "Rigid body in the plane, v = ω × r", place: "by differences", status: "derived" },
      got: () => {
        const at = value(fourLinkAtRise(fourLink, mm(rise)));
        const { station, height } = point(value(instantCentre(at.lower, at.upper)));
        return [station, height];
      },
      want: byMovement(fourLink, rise),
      within: 2e-4,
    }),
  ),
);

/** Freudenstein's equation, its two sides' difference, for a four-link at a rise. */
function freudenstein(fourLink: FourLink, rise: number): number {
  const at = value(fourLinkAtRise(fourLink, mm(rise)));
  const gap = (p: SidePoint, q: SidePoint) => linkLength({ frame: p, axle: q });
  const ground = gap(at.lower.frame, at.upper.frame);
  const base = Math.atan2(
    at.upper.frame.height - at.lower.frame.height,
    at.upper.frame.station - at.lower.frame.station,
  );
  const angle = (l: SideLink) => linkSlope({ frame: l.axle, axle: l.frame }) * RAD - base;
  const [crank, rocker] = [angle(at.lower), angle(at.upper)];
  const [a, c] = [linkLength(at.lower), linkLength(at.upper)];
  const b = gap(fourLink.lower.axle, fourLink.upper.axle);
  const k3 = (a * a - b * b + c * c + ground * ground) / (2 * a * c);
  return (ground / a) * Math.cos(rocker) - (ground / c) * Math.cos(crank) + k3 - Math.cos(crank - rocker);
}
const residuals = FOUR_LINKS.flatMap(([name, fourLink]) =>
  [-4, 4].map(
    (rise): Check => ({
      about: `${name}, axle ${rise} in up: the angles satisfy Freudenstein's equation`,
      source: {
        name: "Freudenstein's equation",
        place: "K1 cos θ4 − K2 cos θ2 + K3 = cos(θ2 − θ4)",
        status: "derived",
      },
      got: () => freudenstein(fourLink, rise),
      want: 0,
      within: 1e-10,
    }),
  ),
);

/**
 * Anti-squat from the forces: axle and wheels as one body under thrust, load, both link forces and the spring over the axle.
 * What of the load transfer the spring does not see is anti-squat.
 */
function byStatics({ lower, upper, axle }: FourLink, height: number, wheelbase: number): number {
  const along = ({ frame, axle: at }: SideLink) => {
    const length = linkLength({ frame, axle: at });
    return [(frame.station - at.station) / length, (frame.height - at.height) / length] as const;
  };
  const [[lx, lz], [ux, uz]] = [along(lower), along(upper)];
  const thrust = 1;
  const load = (thrust * height) / wheelbase;
  const moment = (p: SidePoint, x: number, z: number) => p.station * z - p.height * x;
  // Forward thrust and load act on the axle at the ground under it; the spring pushes it down.
  const contact = sidePoint(axle.station, 0);
  const forces = solve(
    new Matrix([
      [lx, ux, 0],
      [lz, uz, -1],
      [moment(lower.axle, lx, lz), moment(upper.axle, ux, uz), -axle.station],
    ]),
    Matrix.columnVector([-thrust, -load, -moment(contact, thrust, load)]),
  );
  return 100 * (1 - forces.get(2, 0) / load);
}
const statics = [
  ...FOUR_LINKS,
  [
    "parallel links rising 2 in 24",
    { lower: link([0, 8], [24, 10]), upper: link([0, 16], [24, 18]), axle: sidePoint(0, 12) },
  ] as const,
].map(
  ([name, fourLink]): Check => ({
    about: `${name}, CG 24 in over 108 in: anti-squat from the forces on the axle`,
    source: { name: "ml-matrix", place: "equilibrium of the axle, three equations", status: "library" },
    got: () =>
      value(
        antiSquat(value(instantCentre(fourLink.lower, fourLink.upper)), {
          contact: sidePoint(fourLink.axle.station, 0),
          cgHeight: mm(24),
          wheelbase: mm(108),
        }),
      ),
    want: byStatics(fourLink, 24, 108),
    within: 1e-8,
  }),
);

const OWN: Source = { name: GILLESPIE, place: "chapter 7, anti-squat of a solid axle", status: "derived" };
const FULL: Source = {
  name: GILLESPIE,
  place: "chapter 7, full anti-squat at e/d = h/L",
  status: "from memory",
};

export default {
  topic: "Four-link and ladder bar",
  checks: [
    {
      about: "lower (0, 8) to (24, 10), upper (0, 16) to (20, 15): instant centre (60, 13)",
      source: { name: "Intersection of two lines", status: "derived" },
      got: () => {
        const { station, height } = point(
          value(instantCentre(link([0, 8], [24, 10]), link([0, 16], [20, 15]))),
        );
        return [station, height];
      },
      want: [60, 13],
      within: 1e-9,
    },
    {
      about: "lower (0, 10) to (24, 11), upper (0, 18) to (18, 15): instant centre (38.4, 11.6)",
      source: { name: "Intersection of two lines", status: "derived" },
      got: () => {
        const { station, height } = point(
          value(instantCentre(link([0, 10], [24, 11]), link([0, 18], [18, 15]))),
        );
        return [station, height];
      },
      want: [38.4, 11.6],
      within: 1e-9,
    },
    {
      about: "centre (60, 13), CG 24 in, wheelbase 108 in: 97.5 %",
      source: OWN,
      got: () => squat({ kind: "point", point: sidePoint(60, 13) }, 24, 108),
      want: 97.5,
      within: 1e-9,
    },
    {
      about: "centre (38.4, 11.6), CG 22 in, wheelbase 110 in: 151.0417 %",
      source: OWN,
      got: () => squat({ kind: "point", point: sidePoint(38.4, 11.6) }, 22, 110),
      want: 151.0417,
      within: 5e-5,
    },
    {
      about: "parallel links rising 2 in 24, CG 24 in, wheelbase 108 in: slope over h/L, 37.5 %",
      source: OWN,
      got: () => squat(value(instantCentre(link([0, 8], [24, 10]), link([0, 16], [24, 18]))), 24, 108),
      want: 37.5,
      within: 1e-9,
    },
    {
      about: "a centre on the line from the tyre's contact to the CG height over the front axle: 100 %",
      source: FULL,
      got: () =>
        [27, 54, 81].map((x) => squat({ kind: "point", point: sidePoint(x, (x * 24) / 108) }, 24, 108)),
      want: [100, 100, 100],
      within: 1e-9,
    },
    {
      about: "a centre on the ground: none",
      source: FULL,
      got: () => squat({ kind: "point", point: sidePoint(50, 0) }, 24, 108),
      want: 0,
      within: 1e-12,
    },
    ...norton,
    ...movement,
    ...residuals,
    ...statics,
    ...rollAxisChecks,
    {
      about: "ladder bar 36 in long and level, axle 4 in up: pinion down by asin(4/36)",
      source: { name: "Geometry of a circle", status: "derived" },
      got: () => value(ladderBarAtRise({ pivot: sidePoint(36, 14), axle: sidePoint(0, 14) }, mm(4))).turn,
      want: (-Math.asin(4 / 36) * 180) / Math.PI,
      within: 1e-9,
    },
    {
      about: "equal parallel links do not turn the pinion: 4 in up",
      source: { name: "common practice, no source", status: "practice" },
      got: () =>
        value(
          fourLinkAtRise(
            { lower: link([0, 8], [24, 9]), upper: link([0, 16], [24, 17]), axle: sidePoint(0, 12) },
            mm(4),
          ),
        ).turn,
      want: 0,
      within: 1e-9,
    },
  ],
} satisfies Topic;
