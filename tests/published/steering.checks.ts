import { davisAngle, innerAngle, outerAngle } from "../../app/domain/steering/ackermann";
import { bumpSteer, swingBack } from "../../app/domain/steering/bump-steer";
import { vehiclePoint } from "../../app/domain/steering/drag-link";
import { fourBar } from "../../app/domain/steering/four-bar";
import { degrees } from "../../app/domain/units/angle";
import { inches, mm, toInches } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";

const CORRECT: Source = {
  name: "Khurmi & Gupta, Theory of Machines",
  place: "ch. 9, cot φo − cot φi = c/b",
  status: "derived",
};
const outer = (b: number, c: number, inner: number, want: number): Check => ({
  about: `wheelbase ${b}, pivots ${c}, inner wheel ${inner}°: the outer one`,
  source: CORRECT,
  got: () => outerAngle(degrees(inner), mm(1000 * c), mm(1000 * b)),
  want,
  within: 5e-5,
});
const NORTON: Source = { name: "Norton, Design of Machinery", place: "example 4-1", status: "recomputed" };
const bars = () => {
  const came = fourBar({ ground: 100, crank: 40, coupler: 120, rocker: 80 }, degrees(40));
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};
const ARCS: Source = { name: "Two arcs", place: "R − √(R² − y²), worked by hand", status: "derived" };
const swing = (radius: number, rise: number) =>
  toInches(swingBack(inches(radius), inches(rise)) ?? mm(Number.MAX_SAFE_INTEGER));
const steer = (link: number, arc: number, travel: number) => {
  const came = bumpSteer({
    box: vehiclePoint(inches(link), inches(6), 0),
    arm: vehiclePoint(0, inches(6), 0),
    kingpin: vehiclePoint(0, 0, 0),
    path: [{ rise: inches(travel), ahead: swingBack(inches(arc), inches(travel)) ?? mm(0) }],
  });
  if (!came.ok) throw new Error(came.problem);
  return Math.abs(came.value[0]?.turn ?? Number.NaN);
};

export default {
  topic: "Steering",
  checks: [
    outer(2.6, 1.5, 28, 22.1411),
    outer(2.7, 1.2, 40, 31.4321),
    outer(2.8, 1.25, 44, 34.0108),
    {
      about: "wheelbase 2.8, pivots 1.5, outer wheel 30°: the inner one",
      source: CORRECT,
      got: () => innerAngle(degrees(30), mm(1500), mm(2800)),
      want: 39.8918,
      within: 5e-5,
    },
    {
      about: "Davis's gear, pivots 1.2 m, wheelbase 2.7 m: 12.5°",
      source: { ...CORRECT, place: "ch. 9, Davis's steering gear", status: "recomputed" },
      got: () => davisAngle(mm(1200), mm(2700)),
      want: 12.5,
      within: 0.05,
    },
    {
      about:
        "ground 100, crank 40, coupler 120, rocker 80, crank at 40°, open: 20.30° and 57.33° (57.325 unrounded)",
      source: NORTON,
      got: () => [bars().open.coupler, bars().open.rocker],
      want: [20.3, 57.33],
      within: 0.0055,
    },
    {
      about: "the same, crossed: −60.98° and −98.01° (−98.005 unrounded)",
      source: NORTON,
      got: () => [bars().crossed.coupler, bars().crossed.rocker],
      want: [-60.98, -98.01],
      within: 0.0055,
    },
    {
      about: "Freudenstein's equation closes for the same linkage",
      source: {
        name: "Freudenstein's equation",
        place: "K1 cos θ4 − K2 cos θ2 + K3 = cos(θ2 − θ4)",
        status: "derived",
      },
      got: () => {
        const [t2, t4] = [40, bars().open.rocker].map((d) => (d * Math.PI) / 180) as [number, number];
        const k3 = (40 ** 2 - 120 ** 2 + 80 ** 2 + 100 ** 2) / (2 * 40 * 80);
        return (100 / 40) * Math.cos(t4) - (100 / 80) * Math.cos(t2) + k3 - Math.cos(t2 - t4);
      },
      want: 0,
      within: 1e-12,
    },
    {
      about: "a 30 in link and an axle on 24 in, 3 in up: each end's way back",
      source: ARCS,
      got: () => [swing(30, 3), swing(24, 3)],
      want: [0.15038, 0.18824],
      within: 5e-6,
    },
    {
      about: "a 36 in link and an axle on 22 in, 4 in up",
      source: ARCS,
      got: () => [swing(36, 4), swing(22, 4)],
      want: [0.22291, 0.36669],
      within: 5e-6,
    },
    {
      about: "their difference over a 6 in arm, in degrees (0.3616, and 1.3731 for the second)",
      source: ARCS,
      got: () => [steer(30, 24, 3), steer(36, 22, 4)],
      want: [0.3616, 1.3731],
      within: 0.002,
    },
  ],
} satisfies Topic;
