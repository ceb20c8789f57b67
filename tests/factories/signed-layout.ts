import type { Db } from "~/db/client.server";
import { floorPoint, framePoint } from "~/domain/geometry/point";
import type { DropPointId, DropSide } from "~/domain/layout/drops";
import { frameFromDatums, toFloor } from "~/domain/layout/frame";
import { optionKey } from "~/domain/layout/options";
import { formatDecimalInches, inches, mm, parseLength } from "~/domain/units/length";
import { acknowledgeStands } from "~/services/layouts/acknowledge-stands.server";
import { approveOption } from "~/services/layouts/approve-option.server";
import { checkLevel } from "~/services/layouts/check-level.server";
import { chooseAxleLine } from "~/services/layouts/choose-axle-line.server";
import { chooseOption } from "~/services/layouts/choose-option.server";
import { confirmMarks } from "~/services/layouts/confirm-marks.server";
import { keepDrop } from "~/services/layouts/keep-drop.server";
import { startLayout } from "~/services/layouts/start-layout.server";
import { waiveSecondLook } from "~/services/layouts/waive-second-look.server";
import { contextFor, type TestShop } from "./index";

/*
 * A layout measured and signed by the shop's own services, with the figures of the measured case
 * (app/domain/layout/measured-case.test.ts): spring with its pin ahead in hole 1, axle line at 46.50.
 */

export const typedLength = (typed: string) => {
  const read = parseLength(typed, "in");
  if (!read.ok) throw new Error(read.problem);
  return { mm: read.value, typed };
};

const frame = (() => {
  const at = (x: number, y: number) => floorPoint(inches(x), inches(y));
  const made = frameFromDatums({
    frontLeft: at(100, 16),
    frontRight: at(100, -16.25),
    rearLeft: at(20, 16.25),
    rearRight: at(20, -16),
  });
  if (!made.ok) throw new Error(made.problem);
  return made.value;
})();

/** A place on the frame (inches) as it is read off the floor: along the line and off it, without a sign. */
export function readOnFloor(station: number, offset: number) {
  const p = toFloor(frame, framePoint(inches(station), inches(offset)));
  return {
    station: typedLength(formatDecimalInches(p.x, 6)),
    offset: typedLength(formatDecimalInches(mm(Math.abs(p.y)), 6)),
  };
}

const DROPS: readonly [DropPointId, "left" | "right", string, string][] = [
  ["opening-front", "left", "82 3/8", "30 1/4"],
  ["opening-rear", "left", "46 5/8", "30 1/8"],
  ["opening-front", "right", "82 1/8", "30 3/8"],
  ["opening-rear", "right", "46 1/2", "30 3/16"],
  ["datum-front", "left", "100", "16"],
  ["datum-front", "right", "100", "16 1/4"],
  ["datum-rear", "left", "20", "16 1/4"],
  ["datum-rear", "right", "20", "16"],
];

/** Drops a point by offset; on a point that was dropped before it is a correction. */
export function dropByOffset(
  db: Db,
  shop: TestShop,
  layoutId: number,
  drop: { point: DropPointId; side: DropSide } & ReturnType<typeof readOnFloor>,
  reason: string | null = null,
) {
  return keepDrop(contextFor(db, shop.people.tech), layoutId, {
    ...drop,
    method: "offset",
    height: null,
    reason,
    clientKey: crypto.randomUUID(),
  });
}

/** Puts the option at 46.50 in hand and signs it. @returns its key */
export async function signOption(db: Db, shop: TestShop, layoutId: number): Promise<string> {
  const foreman = contextFor(db, shop.people.foreman);
  const key = optionKey(shop.springs.pinAhead, false, shop.holes[0] ?? 0);
  await chooseOption(foreman, layoutId, key);
  await waiveSecondLook(foreman, layoutId, "one pair of hands today");
  await approveOption(foreman, layoutId, null);
  return key;
}

/** Heights at four stands that make a true level. */
export async function levelTrue(db: Db, shop: TestShop, layoutId: number): Promise<void> {
  const stands = [
    ["left-front", "70", "15", "24 3/8"],
    ["right-front", "70", "-15", "24 5/16"],
    ["left-rear", "-40", "15", "24 5/16"],
    ["right-rear", "-40", "-15", "24 3/8"],
  ] as const;
  await checkLevel(contextFor(db, shop.people.tech), layoutId, {
    method: "heights",
    stands: stands.map(([place, x, y, height]) => ({
      place,
      x: typedLength(x),
      y: typedLength(y),
      height: typedLength(height),
    })),
  });
}

/** A build that stands on a level pad, measured and signed. */
export async function signedLayout(
  db: Db,
  shop: TestShop,
  buildId: number,
): Promise<{ layoutId: number; key: string }> {
  const tech = contextFor(db, shop.people.tech);
  const { layoutId } = await startLayout(tech, { buildId, fixedEye: "ahead" });
  await acknowledgeStands(tech, layoutId);
  await levelTrue(db, shop, layoutId);
  await confirmMarks(tech, layoutId, typedLength("120"));
  for (const [point, side, station, offset] of DROPS)
    await dropByOffset(db, shop, layoutId, {
      point,
      side,
      station: typedLength(station),
      offset: typedLength(offset),
    });
  for (const side of ["left", "right"] as const)
    await dropByOffset(db, shop, layoutId, {
      point: "hanger-hole",
      side,
      ...readOnFloor(70.5, side === "left" ? 15.5 : -15.5),
    });
  await chooseAxleLine(tech, layoutId, { method: "square", asked: null });
  return { layoutId, key: await signOption(db, shop, layoutId) };
}
