import { formatInches, type Millimetres, mm } from "../units/length";

/** A leaf spring as measured flat on the bench: eye centre to eye centre, and from the front eye to the pin. */
export type LeafSpring = {
  id: number;
  rackNumber: number;
  length: Millimetres;
  frontHalf: Millimetres;
};

/** The halves as the spring sits: turned end for end they swap. Common practice, no source. */
export function halves(spring: LeafSpring, turned: boolean): { front: Millimetres; rear: Millimetres } {
  const [front, rear] = [spring.frontHalf, mm(spring.length - spring.frontHalf)];
  return turned ? { front: rear, rear: front } : { front, rear };
}

/** Halves nearer to each other than this count as equal: turning the spring changes nothing. */
const SAME = 25.4 / 64;
export const isCentred = (spring: LeafSpring): boolean =>
  Math.abs(spring.length - 2 * spring.frontHalf) < SAME;

/** How far the pin sits ahead of the middle; negative: behind. */
export const pinAhead = (spring: LeafSpring, turned = false): Millimetres =>
  mm(spring.length / 2 - halves(spring, turned).front);

/** "52 in, pin centred" or "52 in, pin 2 in ahead". */
export function describeSpring(spring: LeafSpring, turned = false): string {
  const ahead = pinAhead(spring, turned);
  const pin = isCentred(spring)
    ? "pin centred"
    : `pin ${formatInches(mm(Math.abs(ahead)))} in ${ahead > 0 ? "ahead" : "behind"}`;
  return `${formatInches(spring.length)} in, ${pin}`;
}

/** Which end of the spring does not move: ahead of the axle or behind it. */
export type FixedEye = "ahead" | "behind";

/**
 * Where the axle pin stands with the spring flat: one half from the fixed eye. Flat is about full compression.
 * @param half the half between the fixed eye and the pin
 */
export const axleFromFixedEye = (
  eyeStation: Millimetres,
  half: Millimetres,
  fixedEye: FixedEye,
): Millimetres => mm(fixedEye === "ahead" ? eyeStation - half : eyeStation + half);
