import type { CDPSession, Locator, Page } from "@playwright/test";
import { contextFor, makeBuild, type TestShop } from "#tests/factories";
import type { Db } from "~/db/client.server";
import { parseLength } from "~/domain/units/length";
import { acknowledgeStands } from "~/services/layouts/acknowledge-stands.server";
import { checkLevel } from "~/services/layouts/check-level.server";
import { startLayout } from "~/services/layouts/start-layout.server";
import { expect, test } from "./fixtures";

/* Every way to move a vehicle, and what is said when it may not, costs something, or somebody was faster. */

const DESK = { width: 1440, height: 900 };

const standing = (page: Page, nickname: string, where: string) =>
  page.getByRole("button", { name: new RegExp(`^${nickname}, \\w+, ${where}`) });
const bay = (page: Page, n: number) => page.getByRole("region", { name: new RegExp(`^Bay ${n}\\b`) });

/** The Floor, once it is live. */
async function open(page: Page) {
  await page.goto("/floor");
  await expect(page.getByRole("status").getByText("Live", { exact: true })).toBeVisible();
}

let serial = 0;
const inYard = (db: Db, shop: TestShop, nickname: string) =>
  makeBuild(db, shop.shopId, {
    nickname,
    code: `F${(++serial).toString(36).toUpperCase().padStart(3, "X")}`,
    by: shop.people.foreman.personId ?? 0,
  });

const length = (typed: string) => {
  const read = parseLength(typed, "in");
  if (!read.ok) throw new Error(read.problem);
  return { mm: read.value, typed };
};

/** A vehicle that stands true in Bay 1. */
async function levelled(db: Db, shop: TestShop, nickname: string) {
  const made = await makeBuild(db, shop.shopId, {
    nickname,
    code: `L${(++serial).toString(36).toUpperCase().padStart(3, "X")}`,
    by: shop.people.foreman.personId ?? 0,
    bayId: shop.bays[1],
    at: "layout",
  });
  const tech = contextFor(db, shop.people.tech);
  const { layoutId } = await startLayout(tech, { buildId: made.buildId, fixedEye: "ahead" });
  await acknowledgeStands(tech, layoutId);
  await checkLevel(tech, layoutId, {
    method: "heights",
    stands: (["left-front", "right-front", "left-rear", "right-rear"] as const).map((place) => ({
      place,
      x: length(place.endsWith("front") ? "70" : "-40"),
      y: length(place.startsWith("left") ? "15" : "-15"),
      height: length("24"),
    })),
  });
  return made;
}

const centre = async (what: Locator) => {
  const box = await what.boundingBox();
  if (!box) throw new Error("It is not on the screen");
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
};

test("by keyboard: picked up, walked from place to place, put down; and put back by Escape", async ({
  as,
  db,
  shop,
}) => {
  await inYard(db, shop, "Keyed");
  const page = await as(shop.people.foreman, { viewport: DESK });
  await open(page);
  const yard = page.locator('[data-place="yard"]');
  await standing(page, "Keyed", "Yard").focus();
  await page.keyboard.press("Space");
  // In hand, over the place where it stands: from here on keys are taken.
  await expect(yard).toHaveAttribute("data-over", "true");
  await expect(page.getByText("Keyed stood here")).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(page.getByText("Keyed stood here")).toBeHidden();
  await expect(standing(page, "Keyed", "Yard")).toBeFocused();

  await page.keyboard.press("Space");
  await expect(page.getByText("Keyed stood here")).toBeVisible();
  await expect(yard).toHaveAttribute("data-over", "true");
  // From the yard, which comes last, the places come round in their order.
  for (const n of [1, 2]) {
    await page.keyboard.press("ArrowDown");
    await expect(bay(page, n)).toHaveAttribute("data-over", "true");
  }
  await expect(page.getByText("Bay 2: takes it.")).toBeAttached();
  await page.keyboard.press("Space");
  await expect(standing(page, "Keyed", "Bay 2")).toBeFocused();
});

/** One finger, as a touch screen tells it. */
class Finger {
  private constructor(private readonly cdp: CDPSession) {}
  static async on(page: Page) {
    return new Finger(await page.context().newCDPSession(page));
  }
  private touch(type: "touchStart" | "touchMove" | "touchEnd", at?: { x: number; y: number }) {
    return this.cdp.send("Input.dispatchTouchEvent", { type, touchPoints: at ? [at] : [] });
  }
  down = (at: { x: number; y: number }) => this.touch("touchStart", at);
  up = () => this.touch("touchEnd");
  async slide(from: { x: number; y: number }, to: { x: number; y: number }) {
    for (let i = 1; i <= 10; i++)
      await this.touch("touchMove", {
        x: from.x + ((to.x - from.x) * i) / 10,
        y: from.y + ((to.y - from.y) * i) / 10,
      });
  }
}

test("by finger: held, slid into a bay, let go", async ({ as, db, shop }) => {
  await inYard(db, shop, "Fingered");
  const page = await as(shop.people.foreman, { viewport: { width: 1024, height: 768 }, hasTouch: true });
  await open(page);
  const vehicle = standing(page, "Fingered", "Yard");
  await expect(vehicle).toBeVisible();
  const [from, to] = [await centre(vehicle), await centre(bay(page, 2))];
  const finger = await Finger.on(page);
  await finger.down(from);
  // Held long enough, it comes off the floor.
  await expect(page.getByText("Fingered stood here")).toBeVisible();
  await finger.slide(from, to);
  await finger.up();
  await expect(standing(page, "Fingered", "Bay 2")).toBeVisible();
});

test("without dragging: Move… says of every place what would happen, in words", async ({ as, db, shop }) => {
  await inYard(db, shop, "Longbed");
  await makeBuild(db, shop.shopId, {
    nickname: "Sitter",
    code: "SXTR",
    by: shop.people.foreman.personId ?? 0,
    bayId: shop.bays[4],
  });
  const page = await as(shop.people.foreman, { viewport: DESK });
  await open(page);
  await page.getByRole("button", { name: "Move Longbed…" }).click();
  const places = page.getByRole("list", { name: "Places" });
  await expect(places.getByRole("button", { name: /^Bay 3: .*Bay 3 is 12 ft: vehicle is / })).toHaveAttribute(
    "aria-disabled",
    "true",
  );
  await expect(places.getByRole("button", { name: /^Bay 4: .*Bay 4 is taken by Sitter\./ })).toHaveAttribute(
    "aria-disabled",
    "true",
  );
  await places.getByRole("button", { name: /^Bay 2:/ }).click();
  await expect(standing(page, "Longbed", "Bay 2")).toBeVisible();
});

test("a levelled vehicle: the question names what is lost, keeping it keeps it, undo brings the place back and never the level", async ({
  as,
  db,
  shop,
}) => {
  await levelled(db, shop, "Trueheart");
  const page = await as(shop.people.foreman, { viewport: DESK });
  await open(page);
  await expect(bay(page, 1)).toContainText("Level true");
  const ask = async () => {
    await page.getByRole("button", { name: "Move Trueheart…" }).click();
    await page
      .getByRole("list", { name: "Places" })
      .getByRole("button", { name: /^Bay 2:/ })
      .click();
    await expect(page.getByRole("dialog", { name: "Move Trueheart to Bay 2?" })).toContainText(
      "The level (true",
    );
  };
  await ask();
  await expect(page.getByRole("button", { name: "Keep it in Bay 1" })).toBeFocused();
  await page.keyboard.press("Enter");
  await expect(bay(page, 1)).toContainText("Level true");

  await ask();
  await page.getByRole("button", { name: "Move and void" }).click();
  await expect(standing(page, "Trueheart", "Bay 2")).toBeVisible();
  await expect(bay(page, 2)).not.toContainText("Level true");
  await page.getByRole("button", { name: /^Undo Trueheart to Bay 2/ }).click();
  await expect(standing(page, "Trueheart", "Bay 1")).toBeVisible();
  await expect(bay(page, 1)).toContainText("Level void");
});

test("two foremen, one vehicle: one wins, the other is told and sees the truth", async ({ as, db, shop }) => {
  await inYard(db, shop, "Wanted");
  const first = await as(shop.people.foreman, { viewport: DESK });
  const second = await as(shop.people.foreman2, { viewport: DESK });
  await open(first);
  await open(second);
  // The second lets go before the first, and is on the way while the first arrives.
  let letThrough = () => {};
  const held = new Promise<void>((resolve) => {
    letThrough = resolve;
  });
  await second.route("**/floor/move-vehicle*", async (route) => {
    await held;
    await route.continue();
  });
  const move = async (page: Page, n: number) => {
    await page.getByRole("button", { name: "Move Wanted…" }).click();
    await page
      .getByRole("list", { name: "Places" })
      .getByRole("button", { name: new RegExp(`^Bay ${n}:`) })
      .click();
  };
  await move(second, 2);
  await move(first, 1);
  await expect(standing(first, "Wanted", "Bay 1")).toBeVisible();
  letThrough();
  await expect(second.getByText("Put back.").first()).toBeVisible();
  await expect(second.getByText(/Wanted.*Fay Foreman|Fay Foreman.*Wanted/).first()).toBeVisible();
  await expect(standing(second, "Wanted", "Bay 1")).toBeVisible();
  await expect(bay(second, 2)).not.toContainText("Wanted");
});

test("a full yard: the newest stands in front, the rest is a press away", async ({ as, db, shop }) => {
  for (const nickname of ["Eldest", "Second", "Third", "Fourth", "Fifth", "Newest"])
    await makeBuild(db, shop.shopId, {
      nickname,
      code: `Y${(++serial).toString(36).toUpperCase().padStart(3, "X")}`,
      by: shop.people.foreman.personId ?? 0,
      standsSince: new Date(Date.now() - 3_600_000 + serial * 60_000),
    });
  const page = await as(shop.people.foreman, { viewport: { width: 1024, height: 768 } });
  await open(page);
  await expect(standing(page, "Newest", "Yard")).toBeInViewport({ ratio: 0.9 });
  await expect(standing(page, "Eldest", "Yard")).not.toBeInViewport();
  const more = page.getByRole("button", { name: "More in the yard →" });
  await more.click();
  await expect(standing(page, "Newest", "Yard")).not.toBeInViewport({ ratio: 0.9 });
  for (let presses = 0; presses < 4 && (await more.count()) > 0; presses++) await more.click();
  await expect(standing(page, "Eldest", "Yard")).toBeInViewport({ ratio: 0.9 });
  await page.getByRole("button", { name: "← Back to the first" }).click();
  await expect(standing(page, "Newest", "Yard")).toBeInViewport({ ratio: 0.9 });
});
