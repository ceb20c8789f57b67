import { type Outcome, ok, problem } from "../outcome";
import { type SidePoint, sidePoint } from "../springs/leaf-travel";
import { type Degrees, degrees, toDegrees, toRadians } from "../units/angle";
import type { Millimetres } from "../units/length";
import { linkLength, type SideLink } from "./side-link";

/** An axle carried by a lower and an upper link (each a pair seen as one from the side), as it stands at ride height. */
export type FourLink = { lower: SideLink; upper: SideLink; axle: SidePoint };

/** The axle somewhere in its travel. */
export type LinkPosition = {
  axle: SidePoint;
  /** How far the axle has turned since ride height: pinion nose up positive. */
  turn: Degrees;
  lower: SideLink;
  upper: SideLink;
  /** How far the lower link has swung since ride height, its axle end up positive when it lies behind the frame pivot. */
  swing: Degrees;
};

/** Steps in which the lower link is swung so as not to lose the way, and how far at most, degrees (ours, no source). */
export const SWING_STEP = 0.25;
export const FURTHEST_SWING = 90;

const OUT_OF_REACH = "The links cannot reach so far: one is stretched straight or would turn over.";

/** Which side of the line from the lower axle pivot to the upper frame pivot the upper axle pivot lies on. */
const sideOf = (a: SidePoint, frame: SidePoint, b: SidePoint): number =>
  (frame.station - a.station) * (b.height - a.height) - (frame.height - a.height) * (b.station - a.station);

const gap = (a: SidePoint, b: SidePoint): number => Math.hypot(a.station - b.station, a.height - b.height);

function turnedAbout(centre: SidePoint, point: SidePoint, radians: number): SidePoint {
  const [c, s] = [Math.cos(radians), Math.sin(radians)];
  const [x, z] = [point.station - centre.station, point.height - centre.height];
  return sidePoint(centre.station + c * x - s * z, centre.height + s * x + c * z);
}

/** The upper axle pivot on both circles, on the side told; null when they do not meet. */
function upperPivot(fourLink: FourLink, a: SidePoint): SidePoint | null {
  const { lower, upper } = fourLink;
  const [bar, link] = [gap(lower.axle, upper.axle), linkLength(upper)];
  const side = Math.sign(sideOf(lower.axle, upper.frame, upper.axle));
  const base = gap(a, upper.frame);
  // With the pivots in one line at ride height either side would do.
  if (side === 0 || base === 0 || base > bar + link || base < Math.abs(bar - link)) return null;
  const along = (base * base + bar * bar - link * link) / (2 * base);
  const across = Math.sqrt(Math.max(0, bar * bar - along * along));
  const [ux, uz] = [(upper.frame.station - a.station) / base, (upper.frame.height - a.height) / base];
  return sidePoint(a.station + along * ux - side * across * uz, a.height + along * uz + side * across * ux);
}

/**
 * The axle with the lower link swung by an angle, the upper axle pivot on the same side as at ride height.
 * Source: position of a planar four-bar linkage by two circles, as in Norton, Design of Machinery, chapter 4 (from memory).
 * @param swing degrees, the way a wheel turns from forward to up (x to z)
 * @returns a problem when the upper link cannot reach
 * @example fourLinkAtSwing(any four-link, degrees(0)) // the axle as it was given, turned by 0
 */
export function fourLinkAtSwing(fourLink: FourLink, swing: Degrees): Outcome<LinkPosition> {
  const { lower, upper } = fourLink;
  const a = turnedAbout(lower.frame, lower.axle, toRadians(swing));
  const b = upperPivot(fourLink, a);
  if (!b) return problem(OUT_OF_REACH);
  const was = Math.atan2(upper.axle.height - lower.axle.height, upper.axle.station - lower.axle.station);
  const is = Math.atan2(b.height - a.height, b.station - a.station);
  const turn = Math.atan2(Math.sin(is - was), Math.cos(is - was));
  const carried = turnedAbout(lower.axle, fourLink.axle, turn);
  return ok({
    axle: sidePoint(
      carried.station + a.station - lower.axle.station,
      carried.height + a.height - lower.axle.height,
    ),
    turn: toDegrees(turn),
    lower: { frame: lower.frame, axle: a },
    upper: { frame: upper.frame, axle: b },
    swing,
  });
}

/** Between two swings whose heights lie on either side of the one sought. */
function between(fourLink: FourLink, low: number, high: number, height: number): Outcome<LinkPosition> {
  let [below, above] = [low, high];
  for (let i = 0; i < 60; i++) {
    const middle = (below + above) / 2;
    const position = fourLinkAtSwing(fourLink, degrees(middle));
    if (!position.ok) return position;
    if (position.value.axle.height < height) below = middle;
    else above = middle;
  }
  return fourLinkAtSwing(fourLink, degrees((below + above) / 2));
}

/**
 * The axle raised (bump) or lowered (droop) from ride height by links of fixed length, followed from ride height in small
 * swings of the lower link so that it never jumps to the other way of putting the links together.
 * @param rise of the axle's centre against the frame, millimetres, up positive
 * @returns a problem when the links cannot reach so far
 * @example lower (610, 254)–(0, 203), upper (508, 381)–(0, 406), axle (0, 305), raised 50 // turned 1.9941° nose down
 */
export function fourLinkAtRise(fourLink: FourLink, rise: Millimetres): Outcome<LinkPosition> {
  const start = fourLinkAtSwing(fourLink, degrees(0));
  if (!start.ok || rise === 0) return start;
  const height = fourLink.axle.height + rise;
  const way = swingThatRaises(fourLink) * Math.sign(rise);
  if (way === 0) return problem("The links stand so that the axle cannot move up or down.");
  let [last, lastHeight] = [0, Number(fourLink.axle.height)];
  for (let swing = SWING_STEP; swing <= FURTHEST_SWING; swing += SWING_STEP) {
    const next = fourLinkAtSwing(fourLink, degrees(way * swing));
    if (!next.ok) return next;
    const nextHeight = next.value.axle.height;
    if ((nextHeight - height) * Math.sign(rise) >= 0)
      return rise > 0
        ? between(fourLink, last, way * swing, height)
        : between(fourLink, way * swing, last, height);
    if ((nextHeight - lastHeight) * Math.sign(rise) <= 0) return problem(OUT_OF_REACH);
    [last, lastHeight] = [way * swing, nextHeight];
  }
  return problem(OUT_OF_REACH);
}

/** 1 or −1: the way of swinging that raises the axle; 0 when neither does. */
function swingThatRaises(fourLink: FourLink): number {
  const step = SWING_STEP / 100;
  const at = (swing: number) => fourLinkAtSwing(fourLink, degrees(swing));
  const [forth, back] = [at(step), at(-step)];
  if (!forth.ok || !back.ok) return 0;
  return Math.sign(forth.value.axle.height - back.value.axle.height);
}
