import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { makeBuild, type TestShop } from "#tests/factories";
import { readOnFloor, signedLayout } from "#tests/factories/signed-layout";
import type { Db } from "~/db/client.server";
import { linesOf } from "~/domain/layout/work-list";
import { expect, test } from "./fixtures";

/*
 * From the signature to the road: the tacked axle is out, is moved, passes; a welder signs every bracket, somebody torques,
 * the foreman signs off. And what a move half way does to it.
 */

let serial = 0;
async function signedMule(db: Db, shop: TestShop): Promise<string> {
  const { buildId } = await makeBuild(db, shop.shopId, {
    nickname: "Old Mule",
    code: `U${process.pid.toString(36).slice(-2)}${++serial}`.toUpperCase(),
    by: shop.people.foreman.personId ?? 0,
    bayId: shop.bays[1],
    standsSince: new Date(Date.now() - 60_000),
    at: "level",
  });
  return `/layouts/${(await signedLayout(db, shop, buildId)).layoutId}`;
}

/** Types both ends of the axle, so many inches ahead of the line at 46.50. */
async function typeEnds(page: Page, left: number, right: number) {
  for (const [end, ahead, offset] of [
    ["Left end", left, 30],
    ["Right end", right, -30],
  ] as const) {
    const read = readOnFloor(46.5 + ahead, offset);
    const fields = page.getByRole("group", { name: new RegExp(`^${end}`) });
    await fields.getByLabel(/^Ahead of A/).fill(read.station.typed);
    await fields.getByLabel(/^Off the line/).fill(read.offset.typed);
  }
}
/** A state that only the job itself brings about, looked at as pages.spec.ts looks at pages; phone width too. */
async function looksRight(page: Page, name: string) {
  const size = page.viewportSize();
  for (const width of [size?.width ?? 768, 390]) {
    await page.setViewportSize({ width, height: size?.height ?? 1024 });
    const { violations } = await new AxeBuilder({ page }).analyze();
    const serious = violations.filter(({ impact }) => impact === "serious" || impact === "critical");
    expect
      .soft(
        serious.map(({ id }) => id),
        `${name} at ${width}: axe`,
      )
      .toEqual([]);
    const spill = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect.soft(spill, `${name} at ${width}: spills out sideways`).toBeLessThanOrEqual(1);
  }
  if (size) await page.setViewportSize(size);
}
const hand = (page: Page) => page.getByRole("region", { name: "Line in hand" });
const headed = (page: Page, label: string) =>
  expect(hand(page).getByRole("heading", { name: label })).toBeVisible();

test("tacked out of square, moved, welded by who may, torqued, finished", async ({ as, db, shop }) => {
  test.setTimeout(180_000);
  const layout = await signedMule(db, shop);
  const tech = await as(shop.people.tech, { viewport: { width: 768, height: 1024 } });

  // Weld is shut until the tacked axle was checked.
  await tech.goto(`${layout}/step/weld`);
  await expect(tech.getByText(/no bracket is welded to a number nobody checked/).first()).toBeVisible();
  await tech.getByRole("link", { name: "Go to Tack and square" }).click();

  // The verdict stands before anything is kept.
  await typeEnds(tech, -3 / 16, 0);
  await expect(tech.getByText("Move the left end ahead 3/16 in.")).toBeVisible();
  await expect(tech.getByText(/Not kept yet/).first()).toBeVisible();
  await expect(
    tech.getByRole("img", { name: "Left end 3/16 in back, right end on the line." }),
  ).toBeVisible();
  await looksRight(tech, "tack out of true");
  await tech.getByRole("button", { name: "Keep this check" }).click();
  const checks = tech.getByRole("region", { name: "Checks" }).getByRole("listitem");
  await expect(checks).toHaveCount(1);
  await tech.goto(`${layout}/step/weld`);
  await expect(tech.getByText(/The tacked axle is out/).first()).toBeVisible();
  await tech.goto(`${layout}/step/tack`);
  await expect(tech.getByText("Move the left end ahead 3/16 in.")).toBeVisible();

  // Moved, read again, true.
  await typeEnds(tech, 0, 1 / 16);
  await tech.getByRole("button", { name: "Keep this check" }).click();
  await expect(checks).toHaveCount(2);
  await expect(checks.first()).toContainText("Tess Tech");
  await tech.getByRole("link", { name: "Go to Weld and torque" }).click();

  // Somebody without the weld skill is told why; a welder signs.
  await headed(tech, "The place is ready to weld in");
  await expect(hand(tech)).toContainText("no weld skill for Tess Tech");
  await expect(hand(tech).getByRole("button")).toHaveCount(0);
  const welder = await as(shop.people.welder, { viewport: { width: 1024, height: 768 } });
  await welder.goto(`${layout}/step/weld`);
  await expect(hand(welder)).toContainText("fire watch");
  await looksRight(welder, "cautions");
  await hand(welder)
    .getByRole("button", { name: /^Ready: sign/ })
    .click();
  await headed(welder, "Spring hanger, left");
  await hand(welder)
    .getByRole("button", { name: /^Welded: sign/ })
    .click();
  await expect(hand(welder)).toContainText("Write what you are qualified by");
  await hand(welder).getByLabel("Qualified by").fill("Card 12, all positions");
  await hand(welder)
    .getByRole("button", { name: /^Welded: sign/ })
    .click();
  await headed(welder, "Spring hanger, right");
  // What the welder is qualified by is carried over; a fail wants words and stays in hand.
  await expect(hand(welder).getByLabel("Qualified by")).toHaveValue("Card 12, all positions");
  await hand(welder).getByRole("button", { name: "Not good" }).click();
  await expect(hand(welder)).toContainText("Say in a few words what is not right.");
  await hand(welder).getByLabel("Words").fill("undercut");
  await hand(welder).getByRole("button", { name: "Not good" }).click();
  await expect(welder.getByText("Not good: Spring hanger, right: undercut.")).toBeVisible();
  await expect(tech.getByText("Not good: Spring hanger, right: undercut.")).toBeVisible();
  await looksRight(welder, "a line that failed");
  for (const { label } of linesOf("weld").slice(2)) {
    await headed(welder, label);
    await hand(welder)
      .getByRole("button", { name: /^Welded: sign/ })
      .click();
  }

  // The torque is the maker's, typed; what is under it is not taken.
  await headed(tech, "Spring eye bolt, left");
  for (const { label, kind } of linesOf("torque")) {
    await headed(tech, label);
    if (kind === "bolt") {
      await hand(tech).getByLabel("Asked for").fill("110 ft lb");
      if (label === "Spring eye bolt, left") {
        await hand(tech).getByLabel("Read").fill("90");
        await hand(tech).getByLabel("Wrench").fill("Wrench 4");
        await hand(tech).getByLabel("Torque again by").fill("2099-03-02");
        await hand(tech)
          .getByRole("button", { name: /^Torqued: sign/ })
          .click();
        await expect(hand(tech)).toContainText("Under the 110 ft lb that is asked for");
        await expect(hand(tech).getByLabel("Asked for")).toHaveValue("110 ft lb");
        await looksRight(tech, "a bolt under its torque");
      }
      await hand(tech).getByLabel("Read").fill("112");
    }
    await hand(tech)
      .getByRole("button", { name: /: sign/ })
      .click();
  }
  await expect(tech.getByText("Welded, torqued, free to move.")).toBeVisible();
  await expect(tech.getByRole("region", { name: "Torque list" })).toContainText("10 of 10");
  await tech.getByRole("link", { name: "Go to Finish" }).click();

  // Alignment, the road, torque again, signed off.
  await expect(tech.getByText(/To be torqued again by Mon 2 Mar/)).toBeVisible();
  await looksRight(tech, "alignment");
  await hand(tech).getByLabel("Toe, both together, °").fill("0.12");
  await hand(tech)
    .getByRole("button", { name: /: sign/ })
    .click();
  await expect(tech.getByRole("region", { name: "Before it leaves" })).toContainText("toe 0.12°");
  for (const label of ["Road test", "Torque again after the first miles"]) {
    await headed(tech, label);
    await hand(tech)
      .getByRole("button", { name: /: sign/ })
      .click();
  }
  const foreman = await as(shop.people.foreman, { viewport: { width: 1440, height: 900 } });
  await foreman.goto(layout);
  await expect(foreman).toHaveURL(/\/step\/finish$/);
  await headed(foreman, "Sign off");
  await hand(foreman)
    .getByRole("button", { name: /^Sign off/ })
    .click();
  await expect(foreman.getByText("Finished and signed off.")).toBeVisible();
  await expect(tech.getByText("Finished and signed off.")).toBeVisible();
});

test("a move half way voids it and shuts the steps, with the way back", async ({ as, db, shop }) => {
  const layout = await signedMule(db, shop);
  const welder = await as(shop.people.welder, { viewport: { width: 768, height: 1024 } });
  await welder.goto(`${layout}/step/tack`);
  await typeEnds(welder, 0, 0);
  await welder.getByRole("button", { name: "Keep this check" }).click();
  await welder.getByRole("link", { name: "Go to Weld and torque" }).click();
  await hand(welder)
    .getByRole("button", { name: /^Ready: sign/ })
    .click();
  await hand(welder).getByLabel("Qualified by").fill("Card 12, all positions");
  await hand(welder)
    .getByRole("button", { name: /^Welded: sign/ })
    .click();
  await headed(welder, "Spring hanger, right");

  const foreman = await as(shop.people.foreman, { viewport: { width: 1440, height: 900 } });
  await foreman.goto("/floor");
  await foreman.getByRole("button", { name: /^Old Mule, \w+, Bay 1/ }).click();
  await foreman.getByRole("button", { name: "Move Old Mule…" }).click();
  await foreman.getByRole("list", { name: "Places" }).getByRole("button", { name: /yard/i }).click();
  await foreman.getByRole("button", { name: "Move and void" }).click();

  await expect(welder.getByText(/The level is void: .*Level again/).first()).toBeVisible();
  await expect(hand(welder).getByRole("button")).toHaveCount(0);
  // What was signed stays in the record, and the way back is a press away.
  await expect(welder.getByRole("button", { name: /^Spring hanger, left Wim Welder/ })).toBeVisible();
  await welder.getByRole("link", { name: "Go to Level" }).click();
  await expect(welder).toHaveURL(/\/step\/level$/);
});

test("the number pad goes through both ends and keeps the check", async ({ as, db, shop }) => {
  const layout = await signedMule(db, shop);
  const tech = await as(shop.people.tech, {
    viewport: { width: 768, height: 1024 },
    hasTouch: true,
    isMobile: true,
  });
  await tech.goto(`${layout}/step/tack`);
  await tech
    .getByRole("group", { name: /^Left end/ })
    .getByLabel(/^Ahead of A/)
    .tap();
  const dock = tech.getByRole("region", { name: "Reading in hand" });
  for (const [what, typed] of [
    ["Left end: ahead of A", "66 1/2"],
    ["Left end: off the line", "30"],
    ["Right end: ahead of A", "66 1/2"],
    ["Right end: off the line", "30"],
  ] as const) {
    await expect(dock).toContainText(what, { ignoreCase: true });
    await tech.locator(":focus").fill(typed);
    await dock.getByRole("button", { name: /^Keep/ }).tap();
  }
  await expect(tech.getByRole("region", { name: "Checks" }).getByRole("listitem")).toHaveCount(1);
});
