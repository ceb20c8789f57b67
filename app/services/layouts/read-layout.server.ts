import type { Db, Reader } from "../../db/client.server";
import { readRevision, snapshot } from "../../db/queries/board.server";
import {
  type DropRow,
  readBayOfBuild,
  readLevelReadings,
  readMarks,
  readPerson,
} from "../../db/queries/layouts.server";
import { floorPoint } from "../../domain/geometry/point";
import { DROP_POINTS, dropPoint, pointFromTies } from "../../domain/layout/drops";
import type { Option } from "../../domain/layout/options";
import { lookLabel } from "../../domain/layout/second-look";
import { nextOpenStep, stepStates } from "../../domain/layout/steps";
import type {
  ChoiceView,
  DropReadingView,
  DropView,
  LayoutView,
  LevelView,
  SecondLookView,
  TypedLength,
} from "../../domain/layout/view";
import { degrees } from "../../domain/units/angle";
import { type LengthUnit, type Millimetres, mm } from "../../domain/units/length";
import { axleSureness } from "./axle-sureness";
import { currentReadings, type LoadedLayout, loadLayout } from "./layout-state.server";
import { made, tackView, workView } from "./work-view";

const orNull = <T, R>(value: T | null, make: (value: T) => R): R | null =>
  value === null ? null : make(value);
const typed = (value: number | null, entry: string | null): TypedLength | null =>
  value === null ? null : { mm: mm(value), typed: entry ?? "" };

/**
 * A layout as its screens are handed it: what was typed, what it came to, who did it; one consistent snapshot.
 * @throws Refusal not-found when this shop has no such layout
 */
export function readLayout(db: Db, shopId: number, layoutId: number): Promise<LayoutView> {
  return snapshot(db, async (tx) => {
    const loaded = await loadLayout(tx, shopId, layoutId);
    const { head, shop, geometry, facts, holes, approvalRow, choice, changed } = loaded;
    const { layout, build, vehicle, bay, hanger } = head;
    const marks = (await readMarks(tx, bay.id)).map((mark) => ({
      label: mark.label,
      x: mm(mark.xMm),
      y: mm(mark.yMm),
    }));
    const standing = await readBayOfBuild(tx, build.id);
    const choiceView: ChoiceView | null = choice && {
      id: choice.choice.id,
      key: choice.key,
      made: made(choice, choice.choice.chosenAt),
      changed,
    };
    return {
      id: layout.id,
      revision: await readRevision(tx, shopId),
      shop: { name: shop.name, timeZone: shop.timeZone, isDemo: shop.isDemo },
      unit: shop.unit,
      vehicle: {
        buildId: build.id,
        nickname: vehicle.nickname,
        code: head.code ?? "",
        kind: vehicle.kind,
        lengthMm: vehicle.lengthMm,
        widthMm: vehicle.widthMm,
        tyreTyped: build.tyreTyped,
        wanted: build.wanted,
      },
      bay: { id: bay.id, number: bay.number, marks },
      standsInBay: standing?.id === bay.id,
      fixedEye: layout.fixedEye,
      hanger: {
        name: hanger.name,
        holes: holes.map((hole) => ({ id: hole.id, number: hole.number, ahead: mm(hole.aheadMm) })),
      },
      asked: {
        loadedRadius: orNull(build.loadedRadiusMm, mm),
        tyreRadius: orNull(build.tyreRadiusMm, mm),
        tyreWidth: orNull(build.tyreWidthMm, mm),
        wheelbase: orNull(build.wheelbaseMm, mm),
        approachAtLeast: orNull(build.approachAskedDeg, degrees),
      },
      settings: {
        allowedSlopeDeg: degrees(shop.allowedSlopeDeg),
        shim: mm(shop.shimMm),
        redropTolerance: mm(shop.redropToleranceMm),
        markTolerance: mm(shop.markToleranceMm),
        tapeSigma: mm(shop.tapeSigmaMm),
        dropSigma: mm(shop.dropSigmaMm),
        springSigma: mm(shop.springSigmaMm),
      },
      steps: stepStates(facts),
      next: nextOpenStep(facts),
      stands: orNull(layout.standsAt, (at) => made(head.stander, at)),
      level: await levelView(tx, loaded),
      levelRounds: loaded.checks.length,
      marks:
        layout.marksAt && layout.marksTapedMm !== null
          ? {
              made: made(head.marker, layout.marksAt),
              taped: { mm: mm(layout.marksTapedMm), typed: layout.marksTapedTyped ?? "" },
              off: mm(layout.marksTapedMm - markDistance(marks)),
            }
          : null,
      drops: dropViews(loaded, marks, shop.unit, mm(shop.tapeSigmaMm)),
      frame: geometry.frame,
      openings: geometry.openings,
      axleWays: geometry.axleWays,
      axle:
        geometry.line && layout.axleAt
          ? {
              line: geometry.line,
              asked: typed(layout.axleAskedMm, layout.axleAskedTyped),
              made: made(head.axler, layout.axleAt),
              sureness: axleSureness({
                rows: loaded.rows,
                stands: (row) => loaded.ground.standing.has(row.reading.levelCheckId),
                marks,
                shop,
                method: geometry.line.method,
                asked: mm(layout.axleAskedMm ?? 0),
              }),
            }
          : null,
      holes: geometry.holes,
      options: geometry.options,
      choice: choiceView,
      secondLook: secondLookView(loaded),
      approval: approvalRow && {
        state: approvalRow.approval.voidedAt ? "void" : "approved",
        sheetRevision: approvalRow.approval.sheetRevision,
        made: made(approvalRow, approvalRow.approval.approvedAt),
        // Kept whole by chooseOption.
        signed: approvalRow.choice.figures as unknown as Option,
        voided: orNull(approvalRow.approval.voidedAt, (at) => ({
          at: at.toISOString(),
          reason: approvalRow.approval.voidReason ?? "",
        })),
      },
      tack: tackView(loaded),
      work: workView(loaded),
      missing: geometry.missing,
    };
  });
}

/** A to B as the bay's marks are set; 0 when one of them is missing. */
export function markDistance(marks: readonly { label: string; x: Millimetres; y: Millimetres }[]): number {
  const [a, b] = ["A", "B"].map((label) => marks.find((mark) => mark.label === label));
  return a && b ? Math.hypot(a.x - b.x, a.y - b.y) : 0;
}

async function levelView(
  tx: Reader,
  { checks, ground, facts, rows }: LoadedLayout,
): Promise<LevelView | null> {
  const check = checks.at(-1);
  if (!check || ground.state === "none") return null;
  const readings = await readLevelReadings(tx, check.id);
  const gone =
    ground.state === "true" &&
    currentReadings(rows).some((row) => !ground.standing.has(row.reading.levelCheckId));
  const carried = check.carriesId !== null && (check.carryOffMm ?? 0) > 0;
  const redropState = facts.redropWanted ? "wanted" : gone ? "void" : carried ? "stands" : "none";
  return {
    id: check.id,
    method: check.method,
    state: ground.state,
    noseHighDeg: degrees(check.noseHighDeg),
    rightHighDeg: degrees(check.rightHighDeg),
    twistMm: orNull(check.twistMm, mm),
    twistDeg: orNull(check.twistDeg, degrees),
    allowedDeg: degrees(check.allowedDeg),
    made: made(await readPerson(tx, check.madeBy), check.madeAt),
    voided: check.voidedAt
      ? {
          made: made(check.voidedBy === null ? null : await readPerson(tx, check.voidedBy), check.voidedAt),
          reason: check.voidReason ?? "",
        }
      : null,
    readings: readings.map((reading) => ({
      place: reading.place,
      x: typed(reading.xMm, reading.xTyped),
      y: typed(reading.yMm, reading.yTyped),
      height: typed(reading.heightMm, reading.heightTyped),
      firstDeg: orNull(reading.firstDeg, degrees),
      turnedDeg: orNull(reading.turnedDeg, degrees),
    })),
    redrop: { state: redropState, offMm: orNull(check.carryOffMm, mm) },
  };
}

/** The first reading stays hidden until a second person has read the point: nobody leans on a number they saw. */
function secondLookView({ secondLook, waiver }: LoadedLayout): SecondLookView {
  return {
    state: waiver ? "waived" : secondLook.state,
    within: secondLook.within,
    items: secondLook.items.map((item) => ({
      point: item.point,
      side: item.side,
      label: lookLabel(item),
      where: dropPoint(item.point)?.where ?? "",
      share: item.share,
      state: item.state,
      firstBy: item.row.name,
      first:
        item.state === "to-do"
          ? null
          : { typed: readingWords(item.row), made: made(item.row, item.row.reading.takenAt) },
      looks: item.looks.map(({ look, ...person }) => ({
        typed: `${look.stationTyped}, ${look.offsetTyped}`,
        made: made(person, look.takenAt),
        apart: mm(look.apartMm),
        agrees: look.agrees,
      })),
      setAside: item.setAside.map(({ look, ...person }) => ({
        typed: `${look.stationTyped}, ${look.offsetTyped}`,
        made: made(person, look.takenAt),
        reason: look.supersededReason ?? "",
      })),
    })),
    waived: waiver && { made: made(waiver, waiver.waiver.waivedAt), reason: waiver.waiver.reason },
  };
}

type Mark = { label: string; x: Millimetres; y: Millimetres };

/** The entry of a reading in one line, as it was typed. */
export const readingWords = (row: DropRow): string =>
  row.reading.method === "offset"
    ? `${row.reading.stationTyped ?? ""}, ${row.reading.offsetTyped ?? ""}`
    : row.ties.map((tie) => `${tie.mark} ${tie.distanceTyped}`).join(", ");

function dropViews(
  loaded: LoadedLayout,
  marks: Mark[],
  unit: LengthUnit,
  tapeSigma: Millimetres,
): DropView[] {
  const { rows, ground } = loaded;
  return DROP_POINTS.flatMap((point) =>
    point.sides.map((side): DropView => {
      const own = rows.filter((row) => row.drop.point === point.id && row.drop.side === side);
      const current = currentReadings(own).at(-1) ?? null;
      return {
        point: point.id,
        side,
        label: point.sides.length > 1 ? `${point.label}, ${side}` : point.label,
        needed: point.needed,
        reading:
          current &&
          readingView(current, marks, unit, tapeSigma, ground.standing.has(current.reading.levelCheckId)),
        superseded: own
          .filter((row) => row !== current)
          .reverse()
          .map((row) => ({
            typed: readingWords(row),
            made: made(row, row.reading.takenAt),
            reason: row.reading.reason,
          })),
      };
    }),
  );
}

function readingView(
  row: DropRow,
  marks: Mark[],
  unit: LengthUnit,
  tapeSigma: Millimetres,
  stands: boolean,
): DropReadingView {
  const { reading, drop } = row;
  const ties = row.ties.flatMap((tie) => {
    const mark = marks.find((one) => one.label === tie.mark);
    return mark ? [{ mark: tie.mark, at: { x: mark.x, y: mark.y }, distance: mm(tie.distanceMm) }] : [];
  });
  const fit =
    reading.method === "ties" && drop.side !== "centre" && ties.length > 1
      ? pointFromTies(ties, drop.side, tapeSigma, unit)
      : null;
  return {
    id: reading.id,
    method: reading.method,
    stationTyped: reading.stationTyped,
    offsetTyped: reading.offsetTyped,
    ties: row.ties.map((tie) => ({
      mark: tie.mark,
      distance: { mm: mm(tie.distanceMm), typed: tie.distanceTyped },
    })),
    at: floorPoint(reading.xMm, reading.yMm),
    height: typed(reading.heightMm, reading.heightTyped),
    suspect: reading.suspect,
    checked: reading.checked,
    fit: fit?.ok ? fit.value : null,
    stands,
    reason: reading.reason,
    made: made(row, reading.takenAt),
  };
}
