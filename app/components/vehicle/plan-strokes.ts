/*
 * Plan-view drawings of the vehicle kinds, in feet, nose at x = 0, left edge at y = 0. Drawn to the vehicle's own length
 * and width; details keep their proportion.
 */
import type { VehicleKind } from "../../domain/builds/vehicle-kinds";

/** What a stroke or fill is for; the tone of the drawing gives it its colour. */
export type Ink = "body" | "wheel" | "glass" | "detail" | "faint" | "outline" | "heavy" | "tube";
export type Stroke = { d: string; ink: Ink };

type Car = { length: number; width: number; front: number; rear: number };

const box = (x: number, y: number, w: number, h: number, r = 0.15): string => {
  const k = Math.min(r, w / 2, h / 2);
  return `M${x + k},${y}h${w - 2 * k}q${k},0 ${k},${k}v${h - 2 * k}q0,${k} ${-k},${k}h${-(w - 2 * k)}q${-k},0 ${-k},${-k}v${-(h - 2 * k)}q0,${-k} ${k},${-k}z`;
};
const circle = (x: number, y: number, r: number) =>
  `M${x - r},${y}a${r},${r} 0 1 0 ${2 * r},0a${r},${r} 0 1 0 ${-2 * r},0z`;

const TYRE = { length: 2.55, width: 0.82 };
const wheels = ({ width, front, rear }: Car): Stroke[] =>
  [front, rear].flatMap((x) => [
    { d: box(x - TYRE.length / 2, -0.05, TYRE.length, TYRE.width, 0.2), ink: "wheel" as const },
    {
      d: box(x - TYRE.length / 2, width + 0.05 - TYRE.width, TYRE.length, TYRE.width, 0.2),
      ink: "wheel" as const,
    },
  ]);

function shell(from: number, to: number, W: number): Stroke {
  const i = 0.28;
  const d = `M${from + 1.2},${i}C${from + 0.45},${i + 0.05} ${from + 0.12},${i + 0.5} ${from + 0.08},${i + 1.3}L${from},${W / 2}L${from + 0.08},${W - i - 1.3}C${from + 0.12},${W - i - 0.5} ${from + 0.45},${W - i - 0.05} ${from + 1.2},${W - i}L${to - 0.4},${W - i + 0.02}Q${to},${W - i} ${to},${W - i - 0.45}L${to},${i + 0.45}Q${to},${i} ${to - 0.4},${i - 0.02}Z`;
  return { d, ink: "body" };
}
const hood = (at: number, W: number): Stroke => ({
  d: `M.75,1.05L${at},.85M.75,${W - 1.05}L${at},${W - 0.85}M${at},.7Q${at - 0.25},${W / 2} ${at},${W - 0.7}`,
  ink: "detail",
});
const windscreen = (a: number, b: number, W: number): Stroke => ({
  d: `M${a},.72Q${a - 0.3},${W / 2} ${a},${W - 0.72}L${b},${W - 1.05}Q${b - 0.15},${W / 2} ${b},1.05Z`,
  ink: "glass",
});
const backGlass = (a: number, b: number, W: number): Stroke => ({
  d: `M${a},1.1Q${a + 0.12},${W / 2} ${a},${W - 1.1}L${b},${W - 0.85}Q${b + 0.1},${W / 2} ${b},.85Z`,
  ink: "glass",
});
const mirrors = (x: number, W: number): Stroke => ({
  d: `M${x},.3l.35,-.5h.45M${x},${W - 0.3}l.35,.5h.45`,
  ink: "outline",
});
const spareWheel = (x: number, W: number): Stroke => ({
  d: box(x, W / 2 - 1.25, 0.75, 2.5, 0.2),
  ink: "wheel",
});

function bed(a: number, b: number, car: Car): Stroke[] {
  const W = car.width;
  const boards = Array.from({ length: 5 }, (_, i) => 0.62 + ((W - 1.24) * (i + 1)) / 6);
  return [
    { d: box(a, 0.62, b - a, W - 1.24, 0.12), ink: "detail" },
    { d: boards.map((y) => `M${a + 0.25},${y}H${b - 0.25}`).join(""), ink: "faint" },
    {
      d: box(car.rear - 1.5, 0.62, 3, 0.62, 0.3) + box(car.rear - 1.5, W - 1.24, 3, 0.62, 0.3),
      ink: "detail",
    },
  ];
}

type Cab = { hood: number; screen: number; back: number; backEnd: number; bed: number };
const SINGLE: Cab = { hood: 0.29, screen: 0.37, back: 0.52, backEnd: 0.55, bed: 0.575 };
const LONG: Cab = { hood: 0.27, screen: 0.345, back: 0.475, backEnd: 0.503, bed: 0.525 };
const CREW: Cab = { hood: 0.235, screen: 0.3, back: 0.56, backEnd: 0.585, bed: 0.605 };

function pickup(car: Car, cab: Cab): Stroke[] {
  const { length: L, width: W } = car;
  const doors =
    cab === CREW
      ? [{ d: `M${0.43 * L},.75V1.15M${0.43 * L},${W - 0.75}V${W - 1.15}`, ink: "detail" as const }]
      : [];
  return [
    ...wheels(car),
    shell(0, L, W),
    ...bed(cab.bed * L, L - 0.35, car),
    hood(cab.hood * L, W),
    windscreen(cab.hood * L + 0.08, cab.screen * L, W),
    backGlass(cab.back * L, cab.backEnd * L, W),
    mirrors(cab.hood * L + 0.1, W),
    ...doors,
  ];
}

function flatbed(car: Car): Stroke[] {
  const { length: L, width: W } = car;
  const at = LONG.bed * L;
  const boards = Array.from({ length: 6 }, (_, i) => (W * (i + 1)) / 7);
  return [
    ...wheels(car),
    shell(0, at - 0.1, W),
    { d: box(at, 0.02, L - at, W - 0.04, 0.1), ink: "body" },
    { d: boards.map((y) => `M${at},${y}H${L}`).join(""), ink: "faint" },
    { d: `M${at + 0.35},.02V${W - 0.02}`, ink: "detail" },
    hood(LONG.hood * L, W),
    windscreen(LONG.hood * L + 0.08, LONG.screen * L, W),
    backGlass(LONG.back * L, LONG.backEnd * L, W),
    mirrors(LONG.hood * L + 0.1, W),
  ];
}

function closed(car: Car, spare: boolean): Stroke[] {
  const { length: L, width: W } = car;
  const [at, screen] = spare ? [0.3, 0.37] : [0.26, 0.335];
  const end = spare ? L - 0.7 : L;
  const rails = spare
    ? ""
    : `M${screen * L + 0.6},1.45H${end - 1.5}M${screen * L + 0.6},${W - 1.45}H${end - 1.5}`;
  return [
    ...wheels(car),
    ...(spare ? [spareWheel(L - 0.75, W)] : []),
    shell(0, end, W),
    hood(at * L, W),
    windscreen(at * L + 0.08, screen * L, W),
    backGlass(end - 0.95, end - 0.45, W),
    mirrors(at * L + 0.1, W),
    {
      d: `M${screen * L + 0.3},.95H${end - 1.1}M${screen * L + 0.3},${W - 0.95}H${end - 1.1}${rails}`,
      ink: "detail",
    },
  ];
}

function openTop(car: Car): Stroke[] {
  const { length: L, width: W } = car;
  return [
    ...wheels(car),
    spareWheel(L - 0.7, W),
    shell(0, L - 0.65, W),
    hood(0.33 * L, W),
    { d: `M${0.36 * L},.7V${W - 0.7}`, ink: "heavy" },
    {
      d:
        box(0.36 * L + 0.3, 0.65, 0.55 * L - 0.6, W - 1.3, 0.3) +
        box(0.47 * L, 1.05, 1.7, 1.55, 0.3) +
        box(0.47 * L, W - 2.6, 1.7, 1.55, 0.3),
      ink: "detail",
    },
    {
      d: `M${0.68 * L},.45V${W - 0.45}M${0.68 * L},1.3H${0.88 * L}M${0.68 * L},${W - 1.3}H${0.88 * L}`,
      ink: "heavy",
    },
  ];
}

function buggy({ length: L, width: W, front, rear }: Car): Stroke[] {
  const corners = [front, rear].flatMap((x): Stroke[] => [
    { d: box(x - 1.3, 0, 2.6, 1, 0.3) + box(x - 1.3, W - 1, 2.6, 1, 0.3), ink: "wheel" },
    {
      d: `M${x - 0.4},1L${x + 0.1},2M${x + 0.4},1L${x + 0.1},2M${x - 0.4},${W - 1}L${x + 0.1},${W - 2}M${x + 0.4},${W - 1}L${x + 0.1},${W - 2}`,
      ink: "detail",
    },
  ]);
  return [
    ...corners,
    {
      d: `M.3,${W / 2 - 0.7}L${0.33 * L},1.5L${0.62 * L},1.3L${L - 0.3},2V${W - 2}L${0.62 * L},${W - 1.3}L${0.33 * L},${W - 1.5}L.3,${W / 2 + 0.7}Z`,
      ink: "body",
    },
    {
      d: `M${0.33 * L},1.5V${W - 1.5}M${0.62 * L},1.3V${W - 1.3}M${0.33 * L},1.5L${0.62 * L},${W - 1.3}M${0.33 * L},${W - 1.5}L${0.62 * L},1.3`,
      ink: "tube",
    },
    { d: box(0.7 * L, 2.1, 2, W - 4.2, 0.2), ink: "detail" },
  ];
}

function chassis({ length: L, width: W, front, rear }: Car): Stroke[] {
  const [left, right] = [1.75, W - 2.05];
  const members = [0.02, 0.34, 0.5, 0.655, 0.93]
    .map((q) => box(q * L, left + 0.3, 0.26, right - left - 0.3, 0.05))
    .join("");
  return [
    {
      d:
        box(front - 1.1, 0.35, 2.2, 0.55, 0.2) +
        box(front - 1.1, W - 0.9, 2.2, 0.55, 0.2) +
        box(rear - 1.35, 0, 2.7, 1.35, 0.25) +
        box(rear - 1.35, W - 1.35, 2.7, 1.35, 0.25),
      ink: "wheel",
    },
    {
      d: box(rear - 0.22, 1.3, 0.44, W - 2.6, 0.1) + box(front - 0.14, 0.9, 0.28, W - 1.8, 0.1),
      ink: "body",
    },
    { d: circle(rear, W / 2, 0.62), ink: "body" },
    { d: box(0.2, left, L - 0.5, 0.3, 0.05) + box(0.2, right, L - 0.5, 0.3, 0.05) + members, ink: "body" },
    {
      d: box(0.1 * L, W / 2 - 1, 0.22 * L, 2, 0.2) + box(0.33 * L, W / 2 - 0.5, 0.17 * L, 1, 0.2),
      ink: "detail",
    },
    { d: `M${0.5 * L},${W / 2}H${rear - 0.6}`, ink: "heavy" },
  ];
}

/** The strokes of a vehicle's plan, back to front. Lengths in feet. */
export function planOf(kind: VehicleKind, length: number, width: number): Stroke[] {
  const car: Car = { length, width, front: 0.19 * length, rear: 0.76 * length };
  switch (kind) {
    case "short-bed-pickup":
      return pickup(car, SINGLE);
    case "long-bed-pickup":
      return pickup(car, LONG);
    case "crew-pickup":
      return pickup(car, CREW);
    case "flatbed":
      return flatbed(car);
    case "two-door-utility":
      return closed(car, true);
    case "wagon":
      return closed(car, false);
    case "open-top":
      return openTop(car);
    case "buggy":
      return buggy(car);
    case "bare-chassis":
      return chassis(car);
  }
}
