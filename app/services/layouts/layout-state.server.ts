import type { Reader } from "../../db/client.server";
import { readFirstApproval, readTackChecks, readWorkItems } from "../../db/queries/layout-work.server";
import {
  type DropRow,
  type LevelCheckRow,
  readApproval,
  readChoice,
  readDrops,
  readHoles,
  readLayoutHead,
  readLevelChecks,
  readRack,
  readSecondLooks,
  readWaiver,
} from "../../db/queries/layouts.server";
import { readShop } from "../../db/queries/shop.server";
import { DROP_POINTS, DROPS_NEEDED } from "../../domain/layout/drops";
import { type LevelGround, levelGround, type Round } from "../../domain/layout/level-chain";
import { optionKey } from "../../domain/layout/options";
import type { StepFacts } from "../../domain/layout/steps";
import type { LeafSpring } from "../../domain/springs/leaf-spring";
import { mm } from "../../domain/units/length";
import { Refusal } from "../errors";
import { computeGeometry, standingDrops } from "./compute-layout";
import { layoutWork } from "./layout-work-state";
import { secondLookState } from "./second-look-state";

const asRound = (row: LevelCheckRow): Round => ({
  id: row.id,
  bayId: row.bayId,
  isTrue: row.isTrue,
  isVoid: row.voidedAt !== null,
  carriesId: row.carriesId,
  carryOffMm: row.carryOffMm,
});

/** The readings that count: not superseded. */
export const currentReadings = (rows: readonly DropRow[]) =>
  rows.filter((row) => row.reading.supersededAt === null);

/** Old drops wait for one of them to be dropped again under the level that stands. */
export const redropWanted = (ground: LevelGround, rows: readonly DropRow[]) =>
  ground.state === "true" &&
  ground.waiting.size > 0 &&
  currentReadings(rows).some((row) => ground.waiting.has(row.reading.levelCheckId));

/** Axle positions nearer to each other than this are the same choice. */
const SAME_MM = 0.25;

/**
 * Everything that is known of a layout and follows from it, read in one go. Screens, the sheet and every change look
 * at the same state.
 * @throws Refusal not-found when this shop has no such layout
 */
export async function loadLayout(tx: Reader, shopId: number, layoutId: number) {
  const head = await readLayoutHead(tx, shopId, layoutId);
  if (!head) throw new Refusal("not-found", "There is no such layout.");
  const shop = await readShop(tx, shopId);
  const checks = await readLevelChecks(tx, layoutId);
  const rounds = checks.map(asRound);
  const ground = levelGround(rounds);
  const rows = await readDrops(tx, layoutId);
  const holes = await readHoles(tx, head.layout.hangerId);
  const rack: LeafSpring[] = (await readRack(tx, shopId)).map((spring) => ({
    id: spring.id,
    rackNumber: spring.rackNumber,
    length: mm(spring.lengthMm),
    frontHalf: mm(spring.frontHalfMm),
  }));
  const standing = standingDrops(rows, (row) => ground.standing.has(row.reading.levelCheckId));
  const geometry = computeGeometry({ head, shop, rack, holes, drops: standing });
  const choiceRow = await readChoice(tx, layoutId);
  const approvalRow = await readApproval(tx, layoutId);
  const choice = choiceRow && {
    ...choiceRow,
    key: optionKey(choiceRow.choice.springId, choiceRow.choice.turned, choiceRow.choice.holeId),
  };
  const option = choice ? (geometry.options?.find((one) => one.key === choice.key) ?? null) : null;
  const changed =
    choice !== null &&
    (option === null ||
      !option.stands ||
      Math.abs(option.axleStation - choice.choice.axleStationMm) > SAME_MM);

  const secondLook = secondLookState({
    drops: standing,
    rows,
    looks: await readSecondLooks(tx, layoutId),
    method: head.layout.axleMethod,
    sigma: shop,
  });
  const work = layoutWork({
    approvalId: approvalRow?.approval.id ?? null,
    since: approvalRow ? await readFirstApproval(tx, approvalRow.choice.id) : null,
    checks: await readTackChecks(tx, layoutId),
    items: await readWorkItems(tx, layoutId),
  });
  const waiver = choice ? await readWaiver(tx, choice.choice.id) : null;

  const last = checks.at(-1) ?? null;
  const alive = (row: DropRow) =>
    ground.standing.has(row.reading.levelCheckId) || ground.waiting.has(row.reading.levelCheckId);
  const current = currentReadings(rows).filter(alive);
  const facts: StepFacts = {
    standsAcknowledged: head.layout.standsAt !== null,
    level: ground.state,
    levelVoidReason: last?.voidReason ?? null,
    redropWanted: redropWanted(ground, rows),
    marksConfirmed: head.layout.marksAt !== null,
    dropsKept: current.filter((row) =>
      DROP_POINTS.some((point) => point.id === row.drop.point && point.needed),
    ).length,
    dropsNeeded: DROPS_NEEDED,
    dropsSuspect: current.filter((row) => row.reading.suspect).length,
    axleLineChosen: head.layout.axleMethod !== null,
    optionsKnown: geometry.options !== null,
    optionChosen: choice !== null && !changed,
    secondLook: waiver ? "waived" : secondLook.state,
    approval: approvalRow ? (approvalRow.approval.voidedAt ? "void" : "approved") : "none",
    tack: work.tack,
    work: work.work,
  };
  return {
    head,
    shop,
    checks,
    rounds,
    ground,
    rows,
    geometry,
    holes,
    rack,
    choice,
    option,
    changed,
    approvalRow,
    secondLook,
    waiver,
    work,
    facts,
  };
}
export type LoadedLayout = Awaited<ReturnType<typeof loadLayout>>;
