import { type Outcome, ok, problem } from "../outcome";
import { type Millimetres, mm } from "../units/length";
import { halves, type LeafSpring } from "./leaf-spring";

/** A length for the front end of a spring and one for the rear, as it sits under the vehicle. */
export type BothEnds = { readonly front: Millimetres; readonly rear: Millimetres };

/** The main leaf as it sits under the vehicle. */
export type MainLeaf = {
  /** Front eye centre to pin, along the leaf: measured flat. */
  readonly front: Millimetres;
  /** Pin to rear eye centre, likewise. */
  readonly rear: Millimetres;
  /** Length about the pin that the U-bolts keep straight; half of it to either side. */
  readonly clamped: Millimetres;
  /** Eye centre above the leaf's own middle: an upturned eye is positive, a Berlin eye 0, a downturned one negative. */
  readonly eyeOffset: BothEnds;
};

export type MainLeafInput = {
  front: Millimetres;
  rear: Millimetres;
  clamped?: Millimetres | undefined;
  eyeOffset?: { front?: Millimetres | undefined; rear?: Millimetres | undefined } | undefined;
};

/** An eye further off than this share of what bends of the shorter half is no eye of a leaf spring (ours, no source). */
export const LARGEST_EYE_OFFSET = 1 / 4;

/** Less than this is not a half of a spring but a slip of the finger, and too little to divide by (ours, no source). */
export const SHORTEST_HALF = mm(1);

const NOUGHT = mm(0);

/**
 * A main leaf that can be reckoned with.
 * @param input millimetres; nothing clamped and eyes in line with the leaf unless told
 * @returns a problem when a half is shorter than 1 mm, the clamp takes all of it, or an eye stands too far off
 * @example mainLeaf({ front: inches(24), rear: inches(28) }) // clamped 0, eye offsets 0
 */
export function mainLeaf({ front, rear, clamped = NOUGHT, eyeOffset }: MainLeafInput): Outcome<MainLeaf> {
  const offset = { front: eyeOffset?.front ?? NOUGHT, rear: eyeOffset?.rear ?? NOUGHT };
  if (front < SHORTEST_HALF || rear < SHORTEST_HALF)
    return problem("Both halves are longer than 1 mm: the pin stands between the eyes.");
  if (clamped < 0) return problem("The clamped length cannot be negative.");
  const bends = Math.min(front, rear) - clamped / 2;
  if (bends < SHORTEST_HALF)
    return problem("The U-bolts clamp the whole of the shorter half: nothing is left to bend.");
  if (Math.max(Math.abs(offset.front), Math.abs(offset.rear)) > LARGEST_EYE_OFFSET * bends)
    return problem("The eye centre stands too far off the leaf for so short a half.");
  return ok({ front, rear, clamped, eyeOffset: offset });
}

/**
 * The main leaf of a spring from the rack, either way round. Eye offsets are those of the spring's own ends and turn with it.
 * @param pinAhead axle located so far ahead of the spring's own pin, by another hole in the leaf or the perch; negative: behind
 * @returns a problem as mainLeaf
 * @example leafOf({ id: 1, rackNumber: 7, length: inches(52), frontHalf: inches(24) }, { turned: true }) // front 28, rear 24 in
 */
export function leafOf(
  spring: LeafSpring,
  options: {
    turned?: boolean;
    pinAhead?: Millimetres;
    clamped?: Millimetres;
    eyeOffset?: BothEnds;
  } = {},
): Outcome<MainLeaf> {
  const { turned = false, pinAhead = NOUGHT, clamped = NOUGHT, eyeOffset } = options;
  const { front, rear } = halves(spring, turned);
  return mainLeaf({
    front: mm(front - pinAhead),
    rear: mm(rear + pinAhead),
    clamped,
    eyeOffset: eyeOffset && turned ? { front: eyeOffset.rear, rear: eyeOffset.front } : eyeOffset,
  });
}

/**
 * The same leaf turned end for end: halves and eyes swap.
 * @example turnedLeaf(leaf) // of 24 and 28 in: 28 and 24 in
 */
export const turnedLeaf = (leaf: MainLeaf): MainLeaf => ({
  front: leaf.rear,
  rear: leaf.front,
  clamped: leaf.clamped,
  eyeOffset: { front: leaf.eyeOffset.rear, rear: leaf.eyeOffset.front },
});
