import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";
import { archOf, bending, type EyesFromPin, type LeafShape, leafAtArch, shapeOf } from "./leaf-shape";
import { archSteps } from "./leaf-travel";
import type { MainLeaf } from "./main-leaf";
import { solveBetween } from "./small-angle";

/** How the end of a bending half moves, as seen from its clamped end. */
export type LinkModel = {
  /** Radius of the eye's path as a share of what bends of the half. */
  radiusShare: number;
  /** Slope at the eye over deflection by length: 2 for a circular arc. */
  endSlope: number;
};

/**
 * A half that bends in a circular arc: from x = ℓ − ⅔y²/ℓ its eye goes round a point ¾ℓ away. Derived here, and what three
 * links stand for in the usual suspension layout manuals; no published figure was read.
 */
export const ARC_LINK: LinkModel = { radiusShare: 3 / 4, endSlope: 2 };
/** A half of one section loaded at its end shortens by ⅗y²/ℓ, which is a radius of ⅚ℓ. Derived likewise. */
export const CANTILEVER_LINK: LinkModel = { radiusShare: 5 / 6, endSlope: 3 / 2 };

/** A spring as three stiff links: front leaf, clamped middle, rear leaf. The shackle is the fourth. */
export type ThreeLinks = {
  frontLink: Millimetres;
  /** Between the two pivots. */
  middle: Millimetres;
  rearLink: Millimetres;
  /** The front pivot ahead of the pin, and the rear one behind it. */
  frontPivot: Millimetres;
  rearPivot: Millimetres;
  /** The pivots below the leaf's middle, where the eyes stand above it. */
  frontPivotBelow: Millimetres;
  rearPivotBelow: Millimetres;
};

/** Links are not turned further than this against the clamp, radians: 60° (ours, no source). */
const FURTHEST = Math.PI / 3;
const NEAR_ENOUGH = 1e-9;

/**
 * The links that carry a leaf's eyes as its bending does, to the second order of the deflection: each of length radiusShare
 * of what bends of the half. An eye that stands e above the leaf moves e·slope nearer as the end turns; a pivot placed
 * (endSlope·radiusShare − 1)·e below the leaf does the same: half the eye's height for a circular arc.
 * Source: derived from the arc; the scheme of links is that of the usual suspension layout manuals (from memory).
 * @returns millimetres; a problem when the share is not above 0 and below or equal to 1, or the slope not above 0
 * @example threeLinks(leaf of 26 and 26 in, 4 in clamped) // links 18 in, middle 16 in
 */
export function threeLinks(leaf: MainLeaf, model: LinkModel = ARC_LINK): Outcome<ThreeLinks> {
  const { radiusShare, endSlope } = model;
  if (!(radiusShare > 0 && radiusShare <= 1))
    return problem("The link's share of the half is more than nothing and no more than all of it.");
  if (!(endSlope > 0)) return problem("The end slope is more than nothing.");
  const { front, rear } = bending(leaf);
  const below = endSlope * radiusShare - 1;
  const [frontPivot, rearPivot] = [leaf.front - radiusShare * front, leaf.rear - radiusShare * rear];
  const [frontBelow, rearBelow] = [below * leaf.eyeOffset.front, below * leaf.eyeOffset.rear];
  return ok({
    frontLink: mm(Math.hypot(leaf.front - frontPivot, leaf.eyeOffset.front + frontBelow)),
    middle: mm(Math.hypot(frontPivot + rearPivot, frontBelow - rearBelow)),
    rearLink: mm(Math.hypot(leaf.rear - rearPivot, leaf.eyeOffset.rear + rearBelow)),
    frontPivot: mm(frontPivot),
    rearPivot: mm(rearPivot),
    frontPivotBelow: mm(frontBelow),
    rearPivotBelow: mm(rearBelow),
  });
}

/**
 * The eyes seen from the pin with the links turned. Shackle and fixed eye alone leave the links free: their angles are kept
 * in the ratio of the bending lengths, as one curvature all along would have it.
 */
function eyesOfLinks(leaf: MainLeaf, links: ThreeLinks, turn: number): EyesFromPin {
  const { front, rear } = bending(leaf);
  const [atFront, atRear] = front > rear ? [turn, (turn * rear) / front] : [(turn * front) / rear, turn];
  const eye = (half: number, offset: number, pivot: number, below: number, by: number) => {
    const [along, up] = [half - pivot, offset + below];
    const [c, s] = [Math.cos(by), Math.sin(by)];
    return { along: pivot + along * c - up * s, up: along * s + up * c - below };
  };
  const f = eye(leaf.front, leaf.eyeOffset.front, links.frontPivot, links.frontPivotBelow, atFront);
  const r = eye(leaf.rear, leaf.eyeOffset.rear, links.rearPivot, links.rearPivotBelow, atRear);
  return { frontAlong: f.along, frontUp: f.up, rearAlong: r.along, rearUp: r.up };
}

/**
 * How the spring stands at one arch by the three links.
 * @param arch the pin below the line of the eyes, millimetres
 * @returns a problem as threeLinks, or when the links would turn more than 60°
 * @example linksAtArch(leaf of 26 and 26 in, inches(5)) // eye distance 50.69615 in; by the arc 50.69501
 */
export function linksAtArch(
  leaf: MainLeaf,
  arch: Millimetres,
  model: LinkModel = ARC_LINK,
): Outcome<LeafShape> {
  const links = threeLinks(leaf, model);
  if (!links.ok) return links;
  const archAt = (turn: number) => archOf(eyesOfLinks(leaf, links.value, turn));
  const { front, rear } = bending(leaf);
  const guess = (arch - archAt(0)) / (model.radiusShare * Math.min(front, rear));
  const turn = solveBetween(archAt, arch, -FURTHEST, FURTHEST, guess, NEAR_ENOUGH);
  return turn === null
    ? problem("The links are too short for so much arch.")
    : ok({ ...shapeOf(eyesOfLinks(leaf, links.value, turn)), arch });
}

export type LinkComparison = {
  rows: { arc: LeafShape; links: LeafShape }[];
  /** The largest difference of the pin from the front eye, and of the eyes from each other. */
  pinApart: Millimetres;
  eyesApart: Millimetres;
};

/**
 * The leaf as an arc beside the leaf as three links through the travel: what the simpler model costs.
 * @returns a problem as leafAtArch and linksAtArch
 * @throws RangeError as archSteps
 * @example compareLinks(leaf of 26 and 26 in, { from: inches(5), to: inches(-2), steps: 14 }) // pin at most 0.00057 in apart
 */
export function compareLinks(
  leaf: MainLeaf,
  { from, to, steps }: { from: Millimetres; to: Millimetres; steps: number },
  model: LinkModel = ARC_LINK,
): Outcome<LinkComparison> {
  const rows: LinkComparison["rows"] = [];
  for (const arch of archSteps(from, to, steps)) {
    const arc = leafAtArch(leaf, arch);
    if (!arc.ok) return arc;
    const links = linksAtArch(leaf, arch, model);
    if (!links.ok) return links;
    rows.push({ arc: arc.value, links: links.value });
  }
  const most = (apart: (row: LinkComparison["rows"][number]) => number) =>
    mm(Math.max(...rows.map((row) => Math.abs(apart(row)))));
  return ok({
    rows,
    pinApart: most((row) => row.arc.fromFront - row.links.fromFront),
    eyesApart: most((row) => row.arc.eyeDistance - row.links.eyeDistance),
  });
}
