import { and, eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { contextFor, makeBuild, makeTestShop, type TestPerson, type TestShop } from "#tests/factories";
import {
  dropByOffset,
  levelTrue,
  readOnFloor,
  signedLayout,
  typedLength,
} from "#tests/factories/signed-layout";
import { testDatabase } from "#tests/setup/database";
import { type Db, schema } from "~/db/client.server";
import { readBoard } from "~/db/queries/board.server";
import { linesOf, type WorkListId } from "~/domain/layout/work-list";
import { approveOption } from "~/services/layouts/approve-option.server";
import { chooseOption } from "~/services/layouts/choose-option.server";
import { keepTackCheck } from "~/services/layouts/keep-tack-check.server";
import { readLayout } from "~/services/layouts/read-layout.server";
import { signWork } from "~/services/layouts/sign-work.server";
import { voidLevelByHand } from "~/services/layouts/void-level-by-hand.server";
import { moveVehicle } from "~/services/move-vehicle.server";
import { readTackForm, readWorkForm } from "~/validation/layout-work";

let db: Db;
let shop: TestShop;
let buildId: number;
let layoutId: number;
let optionKey: string;
let serial = 0;

const as = (person: TestPerson) => contextFor(db, person);
const tech = () => as(shop.people.tech);
const welder = () => as(shop.people.welder);
const foreman = () => as(shop.people.foreman);
const view = () => readLayout(db, shop.shopId, layoutId);
const stateOf = async (step: string) => (await view()).steps.find((one) => one.id === step)?.state;

/** Both ends of the axle, so many inches ahead of the line at 46.5 that was signed. */
function tacked(left: number, right: number, over: { sheet?: number | null; clientKey?: string } = {}) {
  const end = (ahead: number, offset: number) => readOnFloor(46.5 + ahead, offset);
  return {
    left: end(left, 30),
    right: end(right, -30),
    sheet: over.sheet ?? null,
    clientKey: over.clientKey ?? crypto.randomUUID(),
  };
}
const checkTack = (left: number, right: number, who = tech()) =>
  keepTackCheck(who, layoutId, tacked(left, right));

function form(item: string, fields: Record<string, string> = {}) {
  const data = new FormData();
  for (const [name, value] of Object.entries({ item, state: "pass", ...fields })) data.set(name, value);
  const read = readWorkForm(data);
  if (!read.ok) throw new Error(JSON.stringify(read.fields));
  return read.value;
}
const TYPED: Record<WorkListId, Record<string, string>> = {
  weld: { tool: "Card 12, all positions" },
  torque: { wanted: "110 ft lb", read: "112 ft lb", tool: "Wrench 4" },
  finish: {},
};
const sign = (item: string, fields: Record<string, string> = {}, who = welder()) =>
  signWork(who, layoutId, form(item, fields));
async function signList(list: WorkListId, who = welder()) {
  for (const { id } of linesOf(list)) await sign(id, TYPED[list], who);
}
const stages = async () =>
  new Map(
    (await db.select().from(schema.stages).where(eq(schema.stages.buildId, buildId))).map((row) => [
      row.kind,
      row,
    ]),
  );
/** Level again after a void, and one old point dropped where it was: the old drops stand. */
async function levelAgain() {
  await levelTrue(db, shop, layoutId);
  await dropByOffset(db, shop, layoutId, {
    point: "datum-front",
    side: "left",
    station: typedLength("100"),
    offset: typedLength("16"),
  });
}
async function moveAway() {
  const card = (await readBoard(db, shop.shopId, new Date())).bays.find(
    (one) => one.vehicle?.buildId === buildId,
  );
  await moveVehicle(foreman(), {
    buildId,
    placementId: card?.vehicle?.placementId ?? 0,
    toBayId: null,
    confirmed: true,
  });
}
const conflict = (words: RegExp | string) =>
  expect.objectContaining({
    kind: "conflict",
    message: typeof words === "string" ? expect.stringContaining(words) : expect.stringMatching(words),
  });

beforeEach(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db);
  const made = await makeBuild(db, shop.shopId, {
    nickname: "Old Mule",
    code: `V${(++serial).toString(36).padStart(3, "0")}`,
    by: shop.people.foreman.personId ?? 0,
    bayId: shop.bays[1],
    standsSince: new Date(Date.now() - 60_000),
    at: "level",
  });
  buildId = made.buildId;
  ({ layoutId, key: optionKey } = await signedLayout(db, shop, buildId));
});

describe("the tack check", () => {
  it("out of square says what to move, keeps Weld shut, and stays in the list", async () => {
    const answer = await checkTack(-3 / 16, 0);
    expect(answer).toMatchObject({
      passes: false,
      words: expect.stringMatching(/^Out of square by 3\/16 in/),
    });
    const now = await view();
    expect(now.tack).toMatchObject({
      state: "out",
      checks: [{ passes: false, counts: true, moves: ["Move the left end ahead 3/16 in."] }],
    });
    expect(now.next).toBe("tack");
    await expect(sign("ready")).rejects.toEqual(conflict("The tacked axle is out"));
  });

  it("that passes opens Weld and finishes Mock-up and Tack; every check is kept, newest first", async () => {
    await expect(sign("ready")).rejects.toEqual(conflict("no bracket is welded to a number nobody checked"));
    await checkTack(-1 / 4, 0);
    expect((await stages()).get("tack")?.state).toBe("open");
    expect(await checkTack(0, 1 / 16)).toMatchObject({ passes: true });
    const now = await view();
    expect(now.tack.state).toBe("passes");
    expect(now.tack.checks.map((check) => check.passes)).toEqual([true, false]);
    expect(now.tack.checks[0]?.made.name).toBe(shop.people.tech.name);
    expect(now.next).toBe("weld");
    const after = await stages();
    expect((["mock-up", "tack", "weld"] as const).map((kind) => after.get(kind)?.state)).toEqual([
      "done",
      "done",
      "open",
    ]);
  });

  it("counts once, however often and at once it is sent", async () => {
    const same = tacked(0, 0);
    const answers = await Promise.all([1, 2, 3].map(() => keepTackCheck(tech(), layoutId, same)));
    expect(answers.map((answer) => answer.passes)).toEqual([true, true, true]);
    expect((await view()).tack.checks).toHaveLength(1);
    expect(await keepTackCheck(tech(), layoutId, same)).toMatchObject({ words: "Kept already." });
  });

  it("is not taken without a signature, of another sheet, or as nonsense", async () => {
    await expect(keepTackCheck(tech(), layoutId, tacked(0, 0, { sheet: 7 }))).rejects.toEqual(
      conflict("Sheet 1 was signed meanwhile"),
    );
    await expect(checkTack(-40, 0)).rejects.toMatchObject({
      kind: "invalid",
      message: expect.stringContaining("read from mark A?"),
    });
    await voidLevelByHand(tech(), layoutId, "stand 3 was touched");
    await expect(checkTack(0, 0)).rejects.toEqual(
      conflict("The level is void: stand 3 was touched. Level again, then drop one old point again."),
    );
    expect((await view()).tack.checks).toHaveLength(0);
  });

  it("is refused beside the field that cannot be read", () => {
    const data = new FormData();
    for (const [name, value] of Object.entries({
      leftStation: "46 1/2",
      leftOffset: "-30",
      rightStation: "soon",
      rightOffset: "30",
      clientKey: crypto.randomUUID(),
    }))
      data.set(name, value);
    const read = readTackForm(data, "in");
    expect(read.ok ? [] : Object.keys(read.fields).sort()).toEqual(["leftOffset", "rightStation"]);
  });

  it("is not for the counter, nor for another shop", async () => {
    await expect(checkTack(0, 0, as(shop.people.counter))).rejects.toMatchObject({ kind: "forbidden" });
    const other = await makeTestShop(db);
    await expect(checkTack(0, 0, as(other.people.tech))).rejects.toMatchObject({ kind: "not-found" });
  });

  it("belongs to one approval: signed again, the axle is checked again, and no weld is lost", async () => {
    await checkTack(0, 0);
    await sign("ready");
    await sign("hanger.left", TYPED.weld);
    await voidLevelByHand(tech(), layoutId, "stand 3 was touched");
    await levelAgain();
    await expect(sign("hanger.right", TYPED.weld)).rejects.toEqual(conflict("The approval is void"));
    await approveOption(foreman(), layoutId, null);
    const now = await view();
    expect(now.approval).toMatchObject({ state: "approved", sheetRevision: 2 });
    expect(now.tack).toMatchObject({ state: "none", checks: [{ counts: false }] });
    expect(now.work.progress.weld.done).toBe(1);
    await expect(sign("hanger.right", TYPED.weld)).rejects.toEqual(conflict("Check the tacked axle first"));
    await checkTack(0, 0);
    await sign("hanger.right", TYPED.weld);
    expect((await view()).work.progress.weld.done).toBe(2);
  });

  it("and the weld list begin anew when another option is signed", async () => {
    await checkTack(0, 0);
    await sign("ready");
    await sign("hanger.left", TYPED.weld);
    await chooseOption(foreman(), layoutId, optionKey.replace(/\d+$/, String(shop.holes[1])));
    await approveOption(foreman(), layoutId, null);
    const now = await view();
    expect(now.tack.state).toBe("none");
    expect(now.work).toMatchObject({ progress: { weld: { done: 0 } }, signed: {} });
  });
});

describe("the weld list", () => {
  beforeEach(async () => void (await checkTack(0, 0)));

  it("is for people with the weld skill, foreman or not, and says why", async () => {
    await expect(sign("ready", {}, tech())).rejects.toEqual(conflict(/no weld skill for Tess Tech/));
    await expect(sign("ready", {}, foreman())).rejects.toEqual(conflict(/no weld skill for Fay Foreman/));
    await db
      .update(schema.personSkills)
      .set({ expiresAt: new Date(Date.now() - 1000) })
      .where(
        and(
          eq(schema.personSkills.personId, shop.people.welder.personId ?? 0),
          eq(schema.personSkills.skill, "weld"),
        ),
      );
    await expect(sign("ready")).rejects.toEqual(conflict(/Wim Welder's weld qualification has run out/));
  });

  it("begins with the cautions, and wants to know what the welder is qualified by", async () => {
    await expect(sign("hanger.left", TYPED.weld)).rejects.toEqual(conflict("First the cautions"));
    await sign("ready");
    await expect(sign("hanger.left")).rejects.toMatchObject({
      kind: "invalid",
      fields: { tool: expect.stringContaining("qualified") },
    });
    await sign("hanger.left", TYPED.weld);
    expect((await view()).work.signed["hanger.left"]).toMatchObject([
      { state: "pass", tool: "Card 12, all positions", made: { name: "Wim Welder" } },
    ]);
  });

  it("is counted on the floor and the wall, and finishes Weld with its last line", async () => {
    await sign("ready");
    expect((await stages()).get("weld")).toMatchObject({ state: "under-way", piecesDone: 0, piecesOf: 10 });
    await sign("hanger.left", TYPED.weld);
    await sign("hanger.right", TYPED.weld);
    const board = await readBoard(db, shop.shopId, new Date());
    const vehicle = board.bays.flatMap((bay) => bay.vehicle ?? []).find((one) => one.buildId === buildId);
    expect(vehicle?.stage?.pieces).toEqual({ done: 2, of: 10, word: "brackets" });
    await signList("weld");
    expect((await stages()).get("weld")).toMatchObject({ state: "done", piecesDone: 10 });
  });

  it("counts a signature once that was sent twice", async () => {
    await sign("ready");
    await Promise.all([sign("hanger.left", TYPED.weld), sign("hanger.left", TYPED.weld)]);
    expect((await view()).work.signed["hanger.left"]).toHaveLength(1);
  });

  it("takes a failed line with its words only, and stays open until it passes", async () => {
    await sign("ready");
    await expect(sign("perch.left", { state: "fail" })).rejects.toMatchObject({
      kind: "invalid",
      fields: { words: expect.any(String) },
    });
    await sign("perch.left", { state: "fail", words: "undercut at the toe" });
    for (const { id } of linesOf("weld")) if (id !== "perch.left") await sign(id, TYPED.weld);
    expect(await view()).toMatchObject({
      next: "weld",
      work: { progress: { weld: { done: 9, failed: 1 } } },
    });
    await expect(sign("eye-bolt.left", TYPED.torque)).rejects.toEqual(conflict("First the weld list"));
    await sign("perch.left", TYPED.weld);
    const perch = (await view()).work.signed["perch.left"] ?? [];
    expect(perch.map((signature) => signature.state)).toEqual(["pass", "fail"]);
    expect((await stages()).get("weld")?.state).toBe("done");
  });

  it("opens again when a line is taken back", async () => {
    await signList("weld");
    await sign("hanger.left", { state: "fail", words: "crack found on cooling" });
    expect((await stages()).get("weld")).toMatchObject({
      state: "under-way",
      finishedAt: null,
      piecesDone: 9,
    });
    await expect(sign("eye-bolt.left", TYPED.torque)).rejects.toEqual(conflict("First the weld list"));
  });

  it("is shut by a move half way, with the way back, and the signed welds stay in the record", async () => {
    await sign("ready");
    await sign("hanger.left", TYPED.weld);
    await moveAway();
    expect(await stateOf("tack")).toBe("void");
    expect(await stateOf("weld")).toBe("shut");
    await expect(sign("hanger.right", TYPED.weld)).rejects.toEqual(
      conflict(/The level is void: .*Level again, then drop one old point again\./),
    );
    await expect(checkTack(0, 0)).rejects.toEqual(conflict("The level is void"));
    expect((await view()).work.signed["hanger.left"]).toHaveLength(1);
  });

  it("once whole loses nothing by a move: the rest is done where there is room", async () => {
    await signList("weld");
    await expect(checkTack(0, 0)).rejects.toEqual(conflict("Everything is welded and signed"));
    await moveAway();
    await sign("eye-bolt.left", TYPED.torque, tech());
    expect(await view()).toMatchObject({ next: "weld", work: { progress: { torque: { done: 1 } } } });
  });
});

describe("the torque list and the finish", () => {
  beforeEach(async () => {
    await checkTack(0, 0);
    await signList("weld");
  });

  it("wants the maker's torque, the reading and the wrench, and a day that is still to come", async () => {
    await expect(sign("u-bolts.left", { tool: "Wrench 4" }, tech())).rejects.toMatchObject({
      kind: "invalid",
      fields: { wanted: expect.any(String), read: expect.any(String) },
    });
    const low = { ...TYPED.torque, read: "90 ft lb" };
    await expect(sign("u-bolts.left", low, tech())).rejects.toMatchObject({
      fields: { read: expect.stringContaining("Under the 110 ft lb") },
    });
    await expect(sign("u-bolts.left", { ...TYPED.torque, due: "2001-02-03" }, tech())).rejects.toMatchObject({
      fields: { due: expect.stringContaining("has gone") },
    });
    await sign("u-bolts.left", { ...TYPED.torque, due: "2099-02-03" }, tech());
    expect((await view()).work.signed["u-bolts.left"]).toMatchObject([
      { wanted: "110 ft lb", read: "112 ft lb", tool: "Wrench 4", dueAt: "2099-02-03T23:59:00.000Z" },
    ]);
  });

  it("takes no day that is none, and no line that is none", () => {
    const data = new FormData();
    for (const [name, value] of Object.entries({ item: "halo", state: "pass", due: "2026-02-31" }))
      data.set(name, value);
    const read = readWorkForm(data);
    expect(read.ok ? [] : Object.keys(read.fields).sort()).toEqual(["due", "item"]);
  });

  it("follow one another to the road, each finishing its stage", async () => {
    await expect(sign("road-test", {}, tech())).rejects.toEqual(conflict("Weld and torque first: 10 lines"));
    await signList("torque", tech());
    expect((await stages()).get("torque")?.state).toBe("done");
    expect((await stages()).get("fit")?.state).toBe("done");
    expect((await view()).next).toBe("finish");
    await expect(sign("sign-off", {}, foreman())).rejects.toEqual(conflict("First: alignment, road test"));
    await expect(sign("alignment", { "figure.toe": "wide" }, tech())).rejects.toMatchObject({
      fields: { "figure.toe": expect.any(String) },
    });
    // A clock that goes on at every look: the figures belong to their line all the same.
    let ticks = Date.now();
    const ticking = contextFor(db, shop.people.tech, { now: () => new Date(ticks++) });
    await sign("alignment", { "figure.toe": "0.12", "figure.camber-left": "-0.5" }, ticking);
    await sign("alignment", { "figure.toe": "0.12", "figure.camber-left": "-0.5" }, ticking);
    expect((await view()).work.signed.alignment).toHaveLength(1);
    await sign("road-test", {}, tech());
    await sign("re-torque", {}, tech());
    expect((await stages()).get("road-test")?.state).toBe("under-way");
    await sign("sign-off", {}, foreman());
    const now = await view();
    expect(now.work.signed.alignment?.[0]?.figures).toEqual([
      { id: "toe", typed: "0.12" },
      { id: "camber-left", typed: "-0.5" },
    ]);
    expect(now.steps.filter((step) => ["tack", "weld", "finish"].includes(step.id))).toMatchObject([
      { state: "done" },
      { state: "done" },
      { state: "done" },
    ]);
    expect((await stages()).get("road-test")?.state).toBe("done");
  });

  it("is written in the journal, line by line", async () => {
    await sign("steering", { state: "fail", words: "hose pulls at left lock" }, tech());
    const rows = await db
      .select()
      .from(schema.journal)
      .where(and(eq(schema.journal.shopId, shop.shopId), eq(schema.journal.verb, "fail-work")));
    expect(rows).toMatchObject([
      {
        words: "Steering lock to lock: not good, hose pulls at left lock",
        personId: shop.people.tech.personId,
      },
    ]);
  });
});
