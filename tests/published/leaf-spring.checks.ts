import { Matrix, solve } from "ml-matrix";
import type { Outcome } from "../../app/domain/outcome";
import { segmentFrom } from "../../app/domain/springs/arc";
import { type LeafPack, packDeflection, packNip, packStress } from "../../app/domain/springs/leaf-pack";
import { leafAtArch } from "../../app/domain/springs/leaf-shape";
import { leafLengths, mainLeafBlank, thicknessFor } from "../../app/domain/springs/leaf-sizing";
import { halves, type LeafSpring } from "../../app/domain/springs/leaf-spring";
import { leafStations, sidePoint } from "../../app/domain/springs/leaf-travel";
import { leafOf, mainLeaf } from "../../app/domain/springs/main-leaf";
import { rideFrequency, rideFrequencyOf } from "../../app/domain/springs/ride-frequency";
import { CANTILEVER_LINK, linksAtArch } from "../../app/domain/springs/three-link";
import { inches, mm, toInches } from "../../app/domain/units/length";
import type { Check, Source, Topic } from "./check";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};

const KHURMI = "Khurmi & Gupta, A Textbook of Machine Design";
const BHANDARI = "Bhandari, Design of Machine Elements";
const HANDBOOK = "Machinery's Handbook, 31st edition";
const PRACTICE: Source = { name: "common practice, no source", status: "practice" };
const companion = (example: string): Source => ({
  name: BHANDARI,
  place: `example ${example}, by its Scilab textbook companion (FOSSEE, 764, chapter 10)`,
  status: "read",
});
const khurmi = (place: string): Source => ({ name: KHURMI, place, status: "recomputed" });
const openText = (place: string): Source => ({
  name: "Open-university text on machine design, leaf springs",
  place: `expertsmind.com question 30129002, ${place}`,
  status: "read",
});

const bare = { seat: { kind: "none" as const }, mainLeafCountsAs: "graduated" as const };
/** 3 extra full-length and 15 graduated leaves, the main leaf among the latter. */
const heavy: LeafPack = {
  ...bare,
  leaves: 18,
  fullLength: 4,
  width: mm(108),
  thickness: mm(12),
  span: mm(1000),
  modulus: 207_000,
};
/** 2 extra full-length and 10 graduated leaves. */
const truck: LeafPack = {
  ...bare,
  leaves: 12,
  fullLength: 3,
  width: mm(60),
  thickness: mm(12),
  span: mm(1200),
  modulus: 207_000,
};
const locomotive: LeafPack = {
  leaves: 18,
  fullLength: 3,
  mainLeafCountsAs: "full-length",
  width: mm(108),
  thickness: mm(12),
  span: mm(1000),
  seat: { kind: "band", length: mm(100) },
  modulus: 210_000,
};
const vehicle: LeafPack = {
  leaves: 7,
  fullLength: 2,
  mainLeafCountsAs: "full-length",
  width: mm(65),
  thickness: mm(9),
  span: mm(1100),
  seat: { kind: "band", length: mm(80) },
  modulus: 210_000,
};
const oneLeaf: LeafPack = {
  ...bare,
  leaves: 1,
  fullLength: 1,
  width: mm(100),
  thickness: mm(12),
  span: mm(1400),
  modulus: 200_000,
};
const fourth = (thickness: number): LeafPack => ({
  ...bare,
  leaves: 10,
  fullLength: 1,
  width: mm(87_500 / (10 * thickness ** 2)),
  thickness: mm(thickness),
  span: mm(1000),
  modulus: 200_000,
});
/** Load that one leaf of the open text carries at 150 MPa. */
const loadPerLeaf = () => 150 / value(packStress(oneLeaf, 1)).largest;

const packs: Check[] = [
  {
    about:
      "75 kN on 18 leaves (3 extra full-length), span 1000, width 9 thicknesses, 450 MPa with nip: thickness 11.556021 mm",
    source: companion("10.24"),
    got: () => value(thicknessFor({ ...heavy, nipped: true, width: { thicknesses: 9 } }, 75_000, 450)),
    want: 11.556021,
    within: 5e-7,
  },
  {
    about: "the same at 108 × 12 mm: nip 13.482205 mm",
    source: companion("10.24"),
    got: () => value(packNip(heavy, 75_000)).gap,
    want: 13.482205,
    within: 5e-7,
  },
  {
    about: "the same: bolt load 4807.692308 N",
    source: companion("10.24"),
    got: () => value(packNip(heavy, 75_000)).boltLoad,
    want: 4807.692308,
    within: 5e-7,
  },
  {
    about:
      "30 kN on 12 leaves (2 extra full-length) 60 mm wide, span 1200, 1500/2.5 MPa with nip: 12 mm, rounded up",
    source: companion("10.25"),
    got: () =>
      Math.ceil(
        value(thicknessFor({ ...truck, nipped: true, width: { millimetres: mm(60) } }, 30_000, 1500 / 2.5)),
      ),
    want: 12,
    within: 0,
  },
  {
    about: "30 kN on 12 leaves (2 extra full-length) of 60 × 12 mm, span 1200: deflection 69.676700 mm",
    source: companion("10.25"),
    got: () => value(packDeflection(truck, 30_000)),
    want: 69.6767,
    within: 5e-7,
  },
  {
    about: "one leaf 100 × 12 mm, span 1400, 150 MPa: load 1029 N",
    source: openText("load on a leaf"),
    got: loadPerLeaf,
    want: 1029,
    within: 0.5,
  },
  {
    about: "the same leaf under that load: deflection 30.6 mm",
    source: openText("deflection"),
    got: () => value(packDeflection(oneLeaf, loadPerLeaf())),
    want: 30.6,
    within: 0.05,
  },
  {
    about: "125 000 N·mm to store: 7.94 such leaves (printed “n = 79; 8”, a slip for 7.9)",
    source: openText("number of leaves"),
    got: () => 125_000 / ((loadPerLeaf() * value(packDeflection(oneLeaf, loadPerLeaf()))) / 2),
    want: 7.9,
    within: 0.05,
  },
  {
    about: "initial radius 8007 mm from span²/8δ with δ = 30.6; the exact circle is half a δ more",
    source: openText("initial curvature"),
    got: () => (value(segmentFrom({ chord: mm(1400), rise: mm(30.6) })).radius ?? 0) - 30.6 / 2,
    want: 8007,
    within: 0.5,
  },
  {
    about:
      "70 kN, 3 full-length and 15 graduated, span 1000, band 100, depth twice the width, 400 MPa: thickness",
    source: khurmi("locomotive spring"),
    got: () => value(thicknessFor({ ...locomotive, nipped: true, width: { thicknesses: 9 } }, 70_000, 400)),
    want: 11.3402,
    within: 5e-5,
  },
  {
    about: "the same at 108 × 12 mm: nip 9.04 mm",
    source: khurmi("locomotive spring"),
    got: () => value(packNip(locomotive, 70_000)).gap,
    want: 9.0422,
    within: 5e-5,
  },
  {
    about: "the same: bolt load 4487 N",
    source: khurmi("locomotive spring"),
    got: () => value(packNip(locomotive, 70_000)).boltLoad,
    want: 4487.18,
    within: 0.005,
  },
  {
    about:
      "6000 N, 7 leaves (2 full-length) 65 wide, span 1100, U-bolts 80 as a band, 350 MPa: thickness 8.7 mm",
    source: khurmi("vehicle spring of seven leaves"),
    got: () => value(thicknessFor({ ...vehicle, nipped: false, width: { millimetres: mm(65) } }, 6000, 350)),
    want: 8.6982,
    within: 5e-5,
  },
  {
    about: "the same at 9 mm: deflection 30 mm",
    source: khurmi("vehicle spring of seven leaves"),
    got: () => value(packDeflection(vehicle, 6000)),
    want: 29.9939,
    within: 5e-5,
  },
  {
    about: "the same: lengths of the leaves",
    source: { ...khurmi("vehicle spring of seven leaves"), status: "from memory" },
    got: () => value(leafLengths(vehicle)),
    want: [250, 420, 590, 760, 930, 1100, 1100],
    within: 1e-9,
  },
  {
    about: "the same: main leaf with its eyes of 20 mm, 1282.2 mm",
    source: khurmi("vehicle spring of seven leaves"),
    got: () => mainLeafBlank(mm(1100), mm(20), mm(9)),
    want: 1282.212,
    within: 0.0005,
  },
  {
    about: "35 kN, 10 leaves, span 1000: nbt² = 87 500 mm³ brings 600 MPa",
    source: khurmi("truck spring of ten leaves"),
    got: () => value(packStress(fourth(10), 35_000)).largest,
    want: 600,
    within: 1e-9,
  },
  {
    about: "the same with deflection 80 mm: nbt³ = 0.82 × 10⁶ mm⁴",
    source: khurmi("truck spring of ten leaves"),
    got: () => (87_500 * value(packDeflection(fourth(1), 35_000))) / 80,
    want: 820_312.5,
    within: 0.05,
  },
  {
    about: "a full-length leaf alone is a simple beam: PL³/(4Ebt³) for 1000 N, 1000 × 50 × 8 mm",
    source: { name: HANDBOOK, place: "p. 345, flat springs, simple beam", status: "derived" },
    got: () =>
      value(
        packDeflection(
          { ...oneLeaf, mainLeafCountsAs: "full-length", width: mm(50), thickness: mm(8), span: mm(1000) },
          1000,
        ),
      ),
    want: (1000 * 1000 ** 3) / (4 * 200_000 * 50 * 8 ** 3),
    within: 1e-9,
  },
  {
    about: "half a graduated leaf is a triangular cantilever: 6PL³/(Ebt³) for 500 N, 500 × 50 × 8 mm",
    source: { name: HANDBOOK, place: "p. 345, flat springs, triangular plan", status: "derived" },
    got: () => value(packDeflection({ ...oneLeaf, width: mm(50), thickness: mm(8), span: mm(1000) }, 1000)),
    want: (6 * 500 * 500 ** 3) / (200_000 * 50 * 8 ** 3),
    within: 1e-9,
  },
];

/** A half of 1000 mm with the pin so far below the eyes: how far the eye is, and the radius round which it went. */
const half = value(mainLeaf({ front: mm(1000), rear: mm(1000) }));
const eyeAt = (arch: number) => value(leafAtArch(half, mm(arch))).fromFront;
const radiusAt = (arch: number) => ((1000 - eyeAt(arch)) ** 2 + arch ** 2) / (2 * (1000 - eyeAt(arch)));
const arcLink: Source = {
  name: "Circular arc of fixed length",
  place: "series of x against y",
  status: "derived",
};

const links: Check[] = [
  {
    about: "arc of a half, deflection a tenth of its length: eye at 0.993302, effective radius 0.74983",
    source: arcLink,
    got: () => [eyeAt(100) / 1000, radiusAt(100) / 1000],
    want: [0.993302, 0.74983],
    within: 5e-6,
  },
  {
    about: "the same, two tenths: eye at 0.972816, effective radius 0.74931",
    source: arcLink,
    got: () => [eyeAt(200) / 1000, radiusAt(200) / 1000],
    want: [0.972816, 0.74931],
    within: 5e-6,
  },
  {
    about: "radius of the circle that best fits the eye's path over ±5 % of the half: three quarters",
    source: { name: "ml-matrix", place: "least-squares circle", status: "library" },
    got: () => {
      const rises = Array.from({ length: 41 }, (_, i) => (i - 20) * 2.5);
      const points = rises.map((rise) => [eyeAt(rise) / 1000, rise / 1000] as const);
      const fit = solve(
        new Matrix(points.map(([x, y]) => [2 * x, 2 * y, 1])),
        Matrix.columnVector(points.map(([x, y]) => x * x + y * y)),
      );
      return Math.sqrt(fit.get(2, 0) + fit.get(0, 0) ** 2 + fit.get(1, 0) ** 2);
    },
    want: 0.75,
    within: 0.0005,
  },
  {
    about:
      "link of five sixths against the shortening of a uniform cantilever, ½∫slope², deflection 3 % of its length",
    source: {
      name: "Cantilever of one section with an end load",
      place: "slope 3/2·y/ℓ·(2ξ − ξ²)",
      status: "derived",
    },
    got: () => 1000 - value(linksAtArch(half, mm(30), CANTILEVER_LINK)).fromFront,
    want: Array.from({ length: 1000 }, (_, i) => (i + 0.5) / 1000).reduce(
      (sum, at) => sum + (1.5 * 0.03 * (2 * at - at * at)) ** 2 / 2,
      0,
    ),
    within: 0.0005,
  },
];

const rack = (frontHalf: number): LeafSpring => ({
  id: 1,
  rackNumber: 1,
  length: inches(52),
  frontHalf: inches(frontHalf),
});
const axleAt = (frontHalf: number, turned = false) => {
  const setting = {
    leaf: value(leafOf(rack(frontHalf), { turned })),
    fixedEye: "ahead" as const,
    eye: sidePoint(inches(71.5), 0),
  };
  return toInches(value(leafStations(setting, { droop: inches(6), ride: inches(4) })).flat.axle.station);
};

const practice: Check[] = [
  {
    about: "52 in spring, pin centred: halves 26 and 26 in",
    source: PRACTICE,
    got: () => Object.values(halves(rack(26), false)).map(toInches),
    want: [26, 26],
    within: 1e-9,
  },
  {
    about: "52 in spring, pin 2 in ahead of centre: halves 24 and 28 in, turned 28 and 24",
    source: PRACTICE,
    got: () => [false, true].flatMap((turned) => Object.values(halves(rack(24), turned)).map(toInches)),
    want: [24, 28, 28, 24],
    within: 1e-9,
  },
  {
    about:
      "hole at 71.5 in, fixed eye ahead, flat: axle at 45.5 in centred, 47.5 in with the pin 2 in ahead, 43.5 in turned",
    source: PRACTICE,
    got: () => [axleAt(26), axleAt(24), axleAt(24, true)],
    want: [45.5, 47.5, 43.5],
    within: 1e-9,
  },
];

const GILLESPIE = "Gillespie, Fundamentals of Vehicle Dynamics";
const ofInches = [1, 2, 3, 4, 5, 6, 8, 10, 12];
const ofMillimetres = [25, 50, 100, 150, 200, 250];
const frequency: Check[] = [
  {
    about: "ride frequency at 10 and 5 in of static deflection: about 1 and 1.4 Hz",
    source: { name: GILLESPIE, place: "chapter 5", status: "from memory" },
    got: () => [10, 5].map((one) => value(rideFrequency(inches(one)))),
    want: [1, 1.4],
    within: 0.05,
  },
  {
    about: "ride frequency at 1 in of static deflection: 3.13 Hz",
    source: { name: GILLESPIE, place: "chapter 5", status: "from memory" },
    got: () => value(rideFrequency(inches(1))),
    want: 3.13,
    within: 0.005,
  },
  {
    about: `ride frequency at ${ofInches.join(", ")} in`,
    source: { name: GILLESPIE, place: "f = √(g/δ)/2π, standard gravity", status: "derived" },
    got: () => ofInches.map((one) => value(rideFrequency(inches(one)))),
    want: [3.1273, 2.2113, 1.8055, 1.5636, 1.3986, 1.2767, 1.1057, 0.9889, 0.9028],
    within: 5.001e-5,
  },
  {
    about: `ride frequency at ${ofMillimetres.join(", ")} mm, from rate and load`,
    source: { name: GILLESPIE, place: "f = √(g/δ)/2π, standard gravity", status: "derived" },
    got: () => ofMillimetres.map((one) => value(rideFrequencyOf(25, 25 * one))),
    want: [3.1522, 2.2289, 1.5761, 1.2869, 1.1145, 0.9968],
    within: 5.001e-5,
  },
];

export default {
  topic: "Leaf spring",
  checks: [...packs, ...links, ...practice, ...frequency],
} satisfies Topic;
