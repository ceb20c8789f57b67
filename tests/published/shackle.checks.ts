import { Matrix, solve } from "ml-matrix";
import type { Outcome } from "../../app/domain/outcome";
import { leafAtArch } from "../../app/domain/springs/leaf-shape";
import { type SidePoint, sidePoint } from "../../app/domain/springs/leaf-travel";
import { mainLeaf } from "../../app/domain/springs/main-leaf";
import {
  movingEye,
  placeHanger,
  type ShackleLoad,
  type ShackleMounting,
  shackleAngle,
} from "../../app/domain/springs/shackle";
import { shacklePosition } from "../../app/domain/springs/shackle-position";
import { inches, mm, toInches } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const PRACTICE: Source = { name: "common practice, no source", status: "practice" };
const direction = (from: SidePoint, to: SidePoint) =>
  (Math.atan2(to.height - from.height, to.station - from.station) * 180) / Math.PI;

/** Crank 40 at 40°, coupler 120, rocker 80, ground 100: the crank's pin is our fixed eye, the rocker our shackle. */
const crank = sidePoint(40 * Math.cos((40 * Math.PI) / 180), 40 * Math.sin((40 * Math.PI) / 180));
const fourBar = (load: ShackleLoad): ShackleMounting => ({
  fixedEye: "behind",
  eye: crank,
  hanger: sidePoint(100, 0),
  shackle: mm(80),
  load,
});
const fourBarAngles = (load: ShackleLoad) => {
  const moving = value(movingEye(fourBar(load), mm(120)));
  return [direction(crank, moving), direction(sidePoint(100, 0), moving)];
};
const norton = (branch: string): Source => ({
  name: "Norton, Design of Machinery",
  place: `example 4-1, ${branch} circuit`,
  status: "recomputed",
});

/** Triangles with whole sides: eye distance, shackle, distance of the hangers; cosine at the moving eye. */
const TRIANGLES = [
  [1200, 500, 1300, 0],
  [1400, 1300, 1500, 5 / 13],
  [1500, 700, 2000, -3 / 5],
  [800, 300, 700, 1 / 2],
] as const;

const triangles: Check[] = TRIANGLES.flatMap(([distance, shackle, base, cosine]): Check[] =>
  (["compression", "tension"] as const).map((load) => ({
    about: `triangle ${distance}, ${shackle}, ${base}: shackle angle with cosine ${cosine.toFixed(4)}, in ${load}`,
    source: {
      name: "Euclid, Elements",
      place: "book II, propositions 12 and 13 (law of cosines)",
      status: "derived",
    },
    got: () => {
      const mounting: ShackleMounting = {
        fixedEye: "ahead",
        eye: sidePoint(300, 500),
        hanger: sidePoint(300 - base, 500),
        shackle: mm(shackle),
        load,
      };
      return shackleAngle(mounting.eye, value(movingEye(mounting, mm(distance))), mounting.hanger);
    },
    want: (Math.acos(cosine) * 180) / Math.PI,
    within: 1e-9,
  })),
);

/** Newton's method on the two circles, each step solved by the library. */
function byNewton(mounting: ShackleMounting, distance: number, from: SidePoint): [number, number] {
  let [x, z] = [Number(from.station), Number(from.height)];
  const { eye, hanger, shackle } = mounting;
  for (let i = 0; i < 30; i++) {
    const [ax, az, bx, bz] = [x - eye.station, z - eye.height, x - hanger.station, z - hanger.height];
    const step = solve(
      new Matrix([
        [2 * ax, 2 * az],
        [2 * bx, 2 * bz],
      ]),
      Matrix.columnVector([distance ** 2 - ax * ax - az * az, shackle ** 2 - bx * bx - bz * bz]),
    );
    x += step.get(0, 0);
    z += step.get(1, 0);
  }
  return [x, z];
}

const leaf = value(mainLeaf({ front: inches(26), rear: inches(26) }));
const atRide = value(leafAtArch(leaf, inches(4))).eyeDistance;
const square = (load: ShackleLoad): ShackleMounting => {
  const common = { fixedEye: "ahead" as const, eye: sidePoint(inches(71.5), 0), shackle: inches(4), load };
  return { ...common, ...value(placeHanger({ ...common, eyeDistance: atRide, movingEyeHigher: mm(0) })) };
};
const newton: Check[] = (["compression", "tension"] as const).flatMap((load) =>
  [6, 2, 0].map((arch): Check => {
    const distance = value(leafAtArch(leaf, inches(arch))).eyeDistance;
    const ride = value(movingEye(square(load), atRide));
    return {
      about: `52 in spring, 4 in shackle in ${load}, square at 4 in of arch: moving eye at ${arch} in of arch`,
      source: { name: "ml-matrix", place: "Newton's method on two circles", status: "library" },
      got: () => {
        const moving = value(movingEye(square(load), distance));
        return [moving.station, moving.height];
      },
      want: byNewton(square(load), distance, ride),
      within: 1e-6,
    };
  }),
);

export default {
  topic: "Shackle and second hanger",
  checks: [
    {
      about: "four-bar of 40, 120, 80 on 100, crank at 40°: coupler 20.298°, rocker 57.325°",
      source: norton("open"),
      got: () => fourBarAngles("tension"),
      want: [20.297883, 57.32488],
      within: 5e-7,
    },
    {
      about: "the same, the other way together: coupler −60.978°, rocker −98.005°",
      source: norton("crossed"),
      got: () => fourBarAngles("compression"),
      want: [-60.977967, -98.004964],
      within: 5e-7,
    },
    ...triangles,
    ...newton,
    {
      about: "the hanger placed square puts the shackle at 90° to the line of the eyes at ride height",
      source: PRACTICE,
      got: () => value(shacklePosition(leaf, square("compression"), inches(4))).shackleAngle,
      want: 90,
      within: 1e-6,
    },
    {
      about: "a shackle 1 in longer in the same hangers moves a centred axle by half an inch",
      source: PRACTICE,
      got: () => {
        const height = (shackle: number) =>
          value(shacklePosition(leaf, { ...square("compression"), shackle: inches(shackle) }, inches(4))).axle
            .height;
        return toInches(mm(height(4) - height(5)));
      },
      want: 0.5,
      within: 0.05,
    },
  ],
} satisfies Topic;
