export const DROP_SIDES = ["left", "right", "centre"] as const;
export type DropSide = (typeof DROP_SIDES)[number];

export type DropPointId =
  | "opening-front"
  | "opening-rear"
  | "datum-front"
  | "datum-rear"
  | "axle-end"
  | "hanger-hole"
  | "low-front"
  | "steering-arm";

export type DropPoint = {
  id: DropPointId;
  label: string;
  sides: readonly DropSide[];
  /** Without it there is no axle line. */
  needed: boolean;
  /** Its height above the ground at ride is asked for as well. */
  withHeight: boolean;
  /** Where to hang the bob. */
  where: string;
};

const BOTH = ["left", "right"] as const;

/** The points of a front leaf-spring layout, in the order in which they are dropped. */
export const DROP_POINTS: readonly DropPoint[] = [
  {
    id: "opening-front",
    label: "Opening, front edge",
    sides: BOTH,
    needed: true,
    withHeight: false,
    where: "On the lip of the wheel opening, where it is furthest forward.",
  },
  {
    id: "opening-rear",
    label: "Opening, rear edge",
    sides: BOTH,
    needed: true,
    withHeight: false,
    where: "On the lip of the wheel opening, where it is furthest back.",
  },
  {
    id: "datum-front",
    label: "Frame datum, front",
    sides: BOTH,
    needed: true,
    withHeight: false,
    where: "On the same hole or edge of each rail, ahead of the axle.",
  },
  {
    id: "datum-rear",
    label: "Frame datum, rear",
    sides: BOTH,
    needed: true,
    withHeight: false,
    where: "On the same hole or edge of each rail, well behind the axle.",
  },
  {
    id: "axle-end",
    label: "Axle end, as it came",
    sides: BOTH,
    needed: false,
    withHeight: false,
    where: "On the middle of the hub face, before anything is unbolted.",
  },
  {
    id: "hanger-hole",
    label: "Hanger hole 1",
    sides: BOTH,
    needed: false,
    withHeight: false,
    where: "Through the middle of the rearmost hole of the clamped hanger.",
  },
  {
    id: "low-front",
    label: "Lowest point in front",
    sides: ["centre"],
    needed: false,
    withHeight: true,
    where: "On what would touch a bank first: bumper, winch or cross-member.",
  },
  {
    id: "steering-arm",
    label: "Steering-box arm",
    sides: ["left"],
    needed: false,
    withHeight: false,
    where: "On the middle of the ball at the end of the steering-box arm.",
  },
];

/** The point by its id; null for an id that is none. */
export const dropPoint = (id: string): DropPoint | null =>
  DROP_POINTS.find((point) => point.id === id) ?? null;

/** How many single drops the axle line needs. */
export const DROPS_NEEDED = DROP_POINTS.filter((point) => point.needed).reduce(
  (sum, point) => sum + point.sides.length,
  0,
);
