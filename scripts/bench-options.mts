/**
 * How long an option table takes and how it grows: `npm run bench`. Times are this machine's; the growth is what counts.
 */
import { optionSearch } from "../app/domain/layout/option-search";
import type { OptionSearch } from "../app/domain/layout/option-types";
import { degrees } from "../app/domain/units/angle";
import { inches, mm } from "../app/domain/units/length";

const search = (springs: number, holes: number): OptionSearch => ({
  springs: Array.from({ length: springs }, (_, i) => ({
    id: i,
    rackNumber: i,
    length: inches(44 + (i % 16)),
    frontHalf: inches(20 + (i % 16) / 2),
    arch: { droop: inches(7 + (i % 3)), ride: inches(4 + (i % 2)) },
    clamped: inches(4),
    eyeOffset: { front: inches(0.75), rear: inches(0.75) },
  })),
  holes: Array.from({ length: holes }, (_, i) => ({ id: i, number: i + 1, station: inches(60 + i) })),
  fixedEye: "ahead",
  pinOffsets: [mm(-25.4), mm(0), mm(25.4)],
  travelSteps: 60,
  axle: "front",
  openingCentre: inches(44.4),
  opening: {
    front: { station: inches(62), lip: inches(9) },
    rear: { station: inches(26), lip: null },
  },
  tyre: { freeRadius: inches(17.5), width: inches(12.5), lock: degrees(32) },
  loadedRadius: inches(16.5),
  stock: { axleStation: inches(43), wheelbase: inches(93.5) },
  otherAxle: { station: inches(-50), loadedRadius: inches(16.5) },
  lowPoints: [
    { station: inches(76), height: inches(22) },
    { station: inches(0), height: inches(16) },
  ],
  limits: { approachAtLeast: degrees(40), noRubAtLock: true },
  sigma: { hole: mm(0.8), half: mm(0.8) },
});

const median = (values: number[]) =>
  values.sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;

console.log("springs  holes    options      median       per option");
for (const [springs, holes] of [
  [25, 24],
  [50, 24],
  [100, 24],
  [200, 24],
  [200, 48],
  [400, 24],
] as const) {
  const asked = search(springs, holes);
  const times: number[] = [];
  let options = 0;
  for (let i = 0; i < 12; i++) {
    const before = performance.now();
    options = optionSearch(asked).count;
    if (i >= 3) times.push(performance.now() - before);
  }
  const ms = median(times);
  console.log(
    `${String(springs).padStart(7)} ${String(holes).padStart(6)} ${String(options).padStart(10)} ${ms.toFixed(1).padStart(9)} ms ${((1e6 * ms) / options).toFixed(0).padStart(9)} ns`,
  );
}
