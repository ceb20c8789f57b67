import { flatArch } from "../springs/leaf-shape";
import { isCentred } from "../springs/leaf-spring";
import { archSteps } from "../springs/leaf-travel";
import { leafOf, type MainLeaf } from "../springs/main-leaf";
import { pinPath } from "../springs/pin-path";
import { toRadians } from "../units/angle";
import { mm } from "../units/length";
import { approachAngle } from "./approach";
import { rejectionsOf } from "./option-limits";
import { orderOptions } from "./option-order";
import type { Hang, OptionColumns, OptionSearch, SearchSpring, SpacePoint } from "./option-types";
import type { HangerHole } from "./options";
import type { Tyre } from "./room";

const DEFAULT_STEPS = 60;

/**
 * Springs × ways round × pin offsets × holes: where the axle comes to stand, what that changes, and which limits it does
 * not keep. A hole only adds its station to what its spring does, so that travel and room are reckoned once a spring.
 * Angles and wheelbase are those at ride height where the spring's arch is known, else with the spring flat. Eyes level.
 * Lengths millimetres, angles degrees.
 * Source: plane geometry; the leaf as leafAtArch; uncertainty to first order as in JCGM 100, hole, half and arch
 * independent.
 * @returns columns; a spring that cannot be reckoned with has its options rejected, never left out
 * @throws RangeError when travelSteps is not a whole number of 1 or more
 * @example optionSearch({ springs: [52 in, pin centred], holes: [at 71.5 in], … }).flat[0] // 1155.7 (45.5 in)
 */
export function optionSearch(search: OptionSearch): OptionColumns {
  const hangs = hangsOf(search);
  const columns = emptyColumns(hangs, search.holes);
  hangs.forEach((hang, h) => {
    fillHang(search, hang, columns, h * search.holes.length);
  });
  for (let i = 0; i < columns.count; i++) columns.rejected[i] = rejectionsOf(search, columns, i);
  columns.order.set(orderOptions(search, columns));
  return columns;
}

function hangsOf({ springs, pinOffsets = [mm(0)] }: OptionSearch): Hang[] {
  return springs.flatMap((spring) =>
    (looksTheSame(spring) ? [false] : [false, true]).flatMap((turned) =>
      pinOffsets.map((pinOffset) => {
        const { clamped, eyeOffset } = spring;
        const leaf = leafOf(spring, {
          turned,
          pinAhead: pinOffset,
          ...(clamped === undefined ? {} : { clamped }),
          ...(eyeOffset === undefined ? {} : { eyeOffset }),
        });
        return {
          spring,
          turned,
          pinOffset,
          leaf: leaf.ok ? leaf.value : null,
          problem: leaf.ok ? null : leaf.problem,
        };
      }),
    ),
  );
}

/** Turned end for end it is the same spring. */
const looksTheSame = (spring: SearchSpring): boolean =>
  isCentred(spring) && (spring.eyeOffset === undefined || spring.eyeOffset.front === spring.eyeOffset.rear);

function emptyColumns(hangs: readonly Hang[], holes: readonly HangerHole[]): OptionColumns {
  const count = hangs.length * holes.length;
  const column = () => new Float64Array(count).fill(Number.NaN);
  return {
    count,
    hangs,
    holes,
    flat: column(),
    ride: column(),
    droop: column(),
    shift: column(),
    wheelbase: column(),
    approach: column(),
    departure: column(),
    ramp: column(),
    frontRoom: column(),
    rearRoom: column(),
    frontRoomAtLock: column(),
    rearRoomAtLock: column(),
    dragLinkChange: column(),
    propshaftRide: column(),
    propshaftSlip: column(),
    plusMinus: column(),
    rejected: new Uint16Array(count),
    order: new Uint32Array(count),
  };
}

/** What a spring does, from the fixed eye's station: the same for every hole. */
type Travel = {
  flat: number;
  ride: number;
  droop: number;
  /** How far the wheel hangs below full compression at ride and at droop. */
  rideBelow: number;
  droopBelow: number;
  /** What the tyre needs ahead of and behind the fixed eye over the travel. */
  needs: Needs | null;
};
type Needs = { front: number; rear: number; frontAtLock: number; rearAtLock: number };

function fillHang(search: OptionSearch, hang: Hang, columns: OptionColumns, from: number): void {
  const travel = hang.leaf && travelOf(search, hang.spring, hang.leaf);
  if (!travel) {
    hang.problem ??= "The leaf is too short for so much arch.";
    return;
  }
  const { sigma, openingCentre, opening, stock } = search;
  const plusMinus = 2 * Math.hypot(sigma.hole, sigma.half);
  search.holes.forEach((hole, k) => {
    const i = from + k;
    const flat = hole.station + travel.flat;
    columns.flat[i] = flat;
    columns.ride[i] = hole.station + travel.ride;
    columns.droop[i] = hole.station + travel.droop;
    columns.shift[i] = flat - openingCentre;
    columns.plusMinus[i] = plusMinus;
    const onRoad = Number.isNaN(travel.ride) ? flat : hole.station + travel.ride;
    if (stock) {
      const longer = search.axle === "front" ? onRoad - stock.axleStation : stock.axleStation - onRoad;
      columns.wheelbase[i] = stock.wheelbase + longer;
    }
    if (opening && travel.needs) {
      const { needs } = travel;
      columns.frontRoom[i] = opening.front.station - hole.station - needs.front;
      columns.rearRoom[i] = hole.station - opening.rear.station - needs.rear;
      columns.frontRoomAtLock[i] = opening.front.station - hole.station - needs.frontAtLock;
      columns.rearRoomAtLock[i] = hole.station - opening.rear.station - needs.rearAtLock;
    }
    fillAngles(search, columns, i, onRoad);
    fillLinks(search, columns, i, travel, hole.station);
  });
}

function travelOf(search: OptionSearch, spring: SearchSpring, leaf: MainLeaf): Travel | null {
  const flatAt = flatArch(leaf);
  const { arch } = spring;
  const steps = search.travelSteps ?? DEFAULT_STEPS;
  const arches = arch ? archSteps(arch.droop, flatAt, steps) : [flatAt];
  const found = pinPath(leaf, search.fixedEye, arch ? [...arches, arch.ride] : arches);
  if (!found.ok) return null;
  const path = found.value;
  const last = arches.length - 1;
  return {
    flat: path[last] ?? Number.NaN,
    droop: arch ? (path[0] ?? Number.NaN) : Number.NaN,
    ride: arch ? (path[last + 1] ?? Number.NaN) : Number.NaN,
    rideBelow: arch ? arch.ride - flatAt : Number.NaN,
    droopBelow: arch ? arch.droop - flatAt : Number.NaN,
    needs: needsOf(search, arches, path, flatAt),
  };
}

/** The furthest that the tyre reaches ahead and behind, over travel and steering, from the fixed eye's station. */
function needsOf(
  { tyre, opening }: OptionSearch,
  arches: readonly number[],
  path: Float64Array,
  flatAt: number,
): Needs | null {
  if (!tyre || !opening) return null;
  const atLock = reachAtLock(tyre);
  const needs: Needs = {
    front: Number.NEGATIVE_INFINITY,
    rear: Number.NEGATIVE_INFINITY,
    frontAtLock: Number.NEGATIVE_INFINITY,
    rearAtLock: Number.NEGATIVE_INFINITY,
  };
  arches.forEach((arch, k) => {
    const at = path[k] ?? Number.NaN;
    const below = arch - flatAt;
    const front = chordAt(tyre.freeRadius, opening.front.lip, below);
    const rear = chordAt(tyre.freeRadius, opening.rear.lip, below);
    // A tyre wholly below the lip cannot touch it.
    if (front !== null) {
      needs.front = Math.max(needs.front, at + front);
      needs.frontAtLock = Math.max(needs.frontAtLock, at + atLock(front));
    }
    if (rear !== null) {
      needs.rear = Math.max(needs.rear, rear - at);
      needs.rearAtLock = Math.max(needs.rearAtLock, atLock(rear) - at);
    }
  });
  return needs;
}

/** The furthest reach of a chord over the whole steering sweep, as worstReach, with the sines taken once. */
function reachAtLock(tyre: Tyre): (chord: number) => number {
  const side = tyre.width / 2;
  const [cos, sin] = [Math.cos(toRadians(tyre.lock)), Math.sin(toRadians(tyre.lock))];
  // The corner is furthest out where it points straight ahead, if the lock goes so far.
  return (chord) =>
    side * cos <= chord * sin ? Math.sqrt(chord * chord + side * side) : chord * cos + side * sin;
}

/**
 * How far the tyre reaches ahead of its centre at the lip's height; the whole radius where the lip was not measured, which
 * is more than it can be. Null when the tyre stays below the lip.
 */
function chordAt(radius: number, lip: number | null, below: number): number | null {
  if (lip === null) return radius;
  const over = lip + below;
  return over >= radius ? null : Math.sqrt(radius * radius - over * over);
}

function fillAngles(search: OptionSearch, columns: OptionColumns, i: number, axle: number): void {
  const { loadedRadius, lowPoints, otherAxle } = search;
  if (!loadedRadius || !lowPoints) return;
  const ahead = search.axle === "front" ? 1 : -1;
  let [own, ramp] = [Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY];
  for (const point of lowPoints) {
    const away = (point.station - axle) * ahead;
    if (away > 0) own = Math.min(own, approachAngle(loadedRadius, mm(away), point.height) ?? own);
    else if (otherAxle && (point.station - otherAxle.station) * ahead > 0) {
      const near = approachAngle(loadedRadius, mm(-away), point.height);
      const far = approachAngle(
        otherAxle.loadedRadius,
        mm((point.station - otherAxle.station) * ahead),
        point.height,
      );
      if (near !== null && far !== null) ramp = Math.min(ramp, near + far);
    }
  }
  const column = search.axle === "front" ? columns.approach : columns.departure;
  if (Number.isFinite(own)) column[i] = own;
  if (Number.isFinite(ramp)) columns.ramp[i] = ramp;
}

const between = (a: SpacePoint, b: SpacePoint, ahead: number, up: number): number =>
  Math.hypot(b.station + ahead - a.station, b.offset - a.offset, b.height + up - a.height);

function fillLinks(
  { dragLink, propshaft, stock }: OptionSearch,
  columns: OptionColumns,
  i: number,
  travel: Travel,
  hole: number,
): void {
  if (!stock) return;
  const onRoad = Number.isNaN(travel.ride) ? travel.flat : travel.ride;
  const moved = (station: number) => hole + station - stock.axleStation;
  if (dragLink) {
    const { box, axle } = dragLink;
    columns.dragLinkChange[i] = between(box, axle, moved(onRoad), 0) - between(box, axle, 0, 0);
  }
  if (!propshaft) return;
  const { box, axle } = propshaft;
  const ride = between(box, axle, moved(onRoad), 0);
  columns.propshaftRide[i] = ride;
  if (Number.isNaN(travel.ride)) return;
  const flat = between(box, axle, moved(travel.flat), travel.rideBelow);
  const droop = between(box, axle, moved(travel.droop), travel.rideBelow - travel.droopBelow);
  columns.propshaftSlip[i] = Math.max(ride, flat, droop) - Math.min(ride, flat, droop);
}
