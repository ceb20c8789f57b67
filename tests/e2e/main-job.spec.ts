import { chromium, type Locator, type Page } from "@playwright/test";
import { floorPoint, framePoint } from "~/domain/geometry/point";
import { frameFromDatums, toFloor } from "~/domain/layout/frame";
import { formatDecimalInches, inches, mm } from "~/domain/units/length";
import { filmPage } from "./fake-camera";
import { expect, test, watchConsole } from "./fixtures";

/*
 * The whole main job as a shop does it: the counter books in and prints a tag, the foreman moves the vehicle and puts
 * somebody on it, the technician scans the printed tag with the tablet's camera and measures, the foreman signs, the
 * sheet is printed; and the wall shows each change. The figures are those of the measured case
 * (app/domain/layout/measured-case.test.ts).
 */

const STANDS = ["Left front", "Right front", "Left rear", "Right rear"] as const;
const PLACES: Record<(typeof STANDS)[number], [string, string]> = {
  "Left front": ["70", "15"],
  "Right front": ["70", "15"],
  "Left rear": ["-40", "15"],
  "Right rear": ["-40", "15"],
};
const AS_FOUND = ["24 1/16", "24 5/16", "23 13/16", "24 3/16"];
const RAISED = ["24 3/8", "24 5/16", "24 5/16", "24 3/8"];

async function typeHeights(page: Page, heights: string[]) {
  for (const [i, stand] of STANDS.entries())
    await page.getByLabel(`${stand} stand height`).fill(heights[i] ?? "");
}

/** Drops the point in hand by offset, as typed on the tape. */
async function dropPoint(page: Page, title: string, entries: Record<string, string>) {
  const hand = page.getByRole("region", { name: "Drop in hand" });
  await expect(hand.getByRole("heading", { name: title })).toBeVisible();
  const way = hand.getByRole("button", { name: /^Along and off/ });
  // A point on the centre has only one way.
  if ((await way.count()) > 0 && (await way.getAttribute("aria-pressed")) !== "true") await way.click();
  for (const [label, value] of Object.entries(entries))
    await hand.getByLabel(label, { exact: true }).fill(value);
  await hand.getByRole("button", { name: /^Keep this drop/ }).click();
  await expect(hand.getByRole("heading", { name: title })).toBeHidden();
}

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
/** A place on the frame as floor entries, in decimal inches. */
function entriesAt(station: number, offset: number) {
  const p = toFloor(frame, framePoint(inches(station), inches(offset)));
  return {
    "Ahead of A": formatDecimalInches(p.x, 4),
    "Off the line": formatDecimalInches(mm(Math.abs(p.y)), 4),
  };
}

async function drag(page: Page, what: Locator, to: Locator) {
  const [from, target] = [await what.boundingBox(), await to.boundingBox()];
  if (!from || !target) throw new Error("Nothing to drag, or nowhere to");
  await page.mouse.move(from.x + from.width / 2, from.y + from.height / 2);
  await page.mouse.down();
  await page.mouse.move(from.x + from.width / 2 + 12, from.y + from.height / 2 - 12, { steps: 4 });
  await page.mouse.move(target.x + target.width / 2, target.y + target.height / 2, { steps: 12 });
  await page.mouse.up();
}

test("from booking in to the layout sheet, with the wall showing each change", async ({
  as,
  shop,
  signIn,
  faults,
  baseURL,
}, info) => {
  test.setTimeout(180_000);

  // The counter books a vehicle in and prints its tag.
  const counter = await as(shop.people.counter, { viewport: { width: 1280, height: 900 } });
  await counter.goto("/counter");
  await counter.getByRole("link", { name: "Book in" }).first().click();
  await counter.getByRole("combobox", { name: "Customer", exact: true }).fill("R. Castellane");
  await counter.getByLabel("Kind").selectOption({ label: "Long-bed pickup" });
  await counter.getByLabel("Nickname").fill("Old Mule");
  await counter.getByLabel("Length", { exact: true }).fill("19' 2\"");
  await counter.getByLabel("Width", { exact: true }).fill("76");
  await counter.getByLabel("In the customer's words").fill("Front axle ahead, a steeper bank, no rub.");
  await counter.getByLabel("Loaded radius").fill("16 1/2");
  await counter.getByLabel("Wheelbase").fill("133");
  await counter.getByLabel("Approach at least").fill("40");
  await counter.getByRole("checkbox", { name: "Strip" }).uncheck();
  await counter.getByRole("button", { name: "Book in" }).click();
  await expect(counter.getByText("Old Mule is booked in")).toBeVisible();
  await counter.getByRole("link", { name: "Print the tag" }).click();
  await expect(counter.getByRole("img", { name: "QR code of Old Mule" })).toBeVisible();
  const printed = await counter.screenshot();

  // The wall hangs there and shows the empty bay.
  const wall = await as(shop.display, { viewport: { width: 1920, height: 1080 } });
  await wall.goto("/wall");
  const onWall = wall.getByRole("region", { name: "Bay 1" });
  await expect(onWall).toContainText("Empty");

  // The foreman drags it from the yard into Bay 1 and puts Tess on it.
  const foreman = await as(shop.people.foreman, { viewport: { width: 1440, height: 900 } });
  await foreman.goto("/floor");
  await drag(
    foreman,
    foreman.getByRole("button", { name: /^Old Mule, \w+, Yard/ }),
    foreman.getByRole("region", { name: /^Bay 1\b/ }),
  );
  await expect(foreman.getByRole("button", { name: /^Old Mule, \w+, Bay 1/ })).toBeVisible();
  await expect(onWall).toContainText("Old Mule");
  await drag(
    foreman,
    foreman.getByRole("button", { name: /^Tess Tech, free/ }),
    foreman.getByRole("region", { name: /^Bay 1\b/ }),
  );
  await expect(onWall.getByRole("img", { name: "Tess Tech" })).toBeVisible();
  await foreman.getByRole("button", { name: /^Old Mule, \w+, Bay 1/ }).click();
  await foreman.getByRole("button", { name: "Start layout" }).click();
  await expect(foreman).toHaveURL(/\/layouts\/\d+/);

  // The technician scans the printed tag with the tablet's camera, and lands on the next open step.
  const film = info.outputPath("tag.y4m");
  await filmPage(printed, film);
  const tablet = await chromium.launch({
    executablePath: process.env.CHROMIUM_PATH ?? "/usr/bin/chromium",
    args: [
      "--no-sandbox",
      "--disable-gpu",
      "--disable-background-networking",
      "--use-fake-ui-for-media-stream",
      "--use-fake-device-for-media-stream",
      `--use-file-for-fake-video-capture=${film}`,
    ],
  });
  const context = await tablet.newContext({
    baseURL,
    viewport: { width: 768, height: 1024 },
    hasTouch: true,
    permissions: ["camera"],
  });
  await signIn(context, shop.people.tech);
  const tech = await context.newPage();
  watchConsole(tech, faults);
  await tech.goto("/scan");
  await expect(tech).toHaveURL(/\/layouts\/\d+\/step\/stands$/, { timeout: 30_000 });
  const layout = new URL(tech.url()).pathname.replace(/\/step\/.*/, "");

  // A later step is shut, and says why.
  await tech.goto(`${layout}/step/drops`);
  await expect(tech.getByText("Set the vehicle on stands first.").first()).toBeVisible();
  await tech.goto(`${layout}/step/stands`);
  await tech.getByRole("button", { name: "On stands, wheels chocked" }).click();

  // Level: not true, raise the stands, read again, true.
  await tech.goto(`${layout}/step/level`);
  const places = tech.locator("details", { hasText: "Where the stands are" });
  if ((await places.getAttribute("open")) === null) await places.locator("summary").click();
  for (const stand of STANDS) {
    const side = stand.startsWith("Left") ? "left" : "right";
    await tech.getByLabel(`${stand}: ahead`).fill(PLACES[stand][0]);
    await tech.getByLabel(`${stand}: out to the ${side}`).fill(PLACES[stand][1]);
  }
  await typeHeights(tech, AS_FOUND);
  await tech.getByRole("button", { name: "Check level" }).click();
  await expect(tech.getByText("Right side high 0.60°, nose high 0.10°.").first()).toBeVisible();
  await expect(onWall).toContainText("Not true yet");
  await typeHeights(tech, RAISED);
  await tech.getByRole("button", { name: "Check level" }).click();
  await expect(onWall).toContainText("Level true");

  // Control marks, then the drops, typed as on the tape.
  await tech.goto(`${layout}/step/marks`);
  await tech.getByLabel("Tape from A to B").fill("10'");
  await tech.getByLabel("Tape from A to B").press("Enter");
  await expect(tech).toHaveURL(/\/step\/drops$/);
  await tech.goto(`${layout}/step/drops`);
  await dropPoint(tech, "Opening, front edge, left", { "Ahead of A": "82 3/8", "Off the line": "30 1/4" });
  await dropPoint(tech, "Opening, front edge, right", {
    "Ahead of A": "6' 10 1/8\"",
    "Off the line": "30 3/8",
  });
  await dropPoint(tech, "Opening, rear edge, left", { "Ahead of A": "46 5/8", "Off the line": "30-1/8" });
  await dropPoint(tech, "Opening, rear edge, right", { "Ahead of A": "46.5", "Off the line": "30 3/16" });
  await dropPoint(tech, "Frame datum, front, left", { "Ahead of A": "100", "Off the line": "16" });
  await dropPoint(tech, "Frame datum, front, right", {
    "Ahead of A": "2540 mm",
    "Off the line": "412.75 mm",
  });
  await dropPoint(tech, "Frame datum, rear, left", { "Ahead of A": "20", "Off the line": "16 1/4" });
  await dropPoint(tech, "Frame datum, rear, right", { "Ahead of A": "20", "Off the line": "16" });
  await expect(onWall).toContainText("8 drops");
  const cell = (row: string, side: "left" | "right") =>
    tech
      .getByRole("region", { name: "Drops", exact: true })
      .getByRole("button", { name: new RegExp(`${row}.*${side}`, "i") });
  await cell("Hanger hole 1", "left").click();
  await dropPoint(tech, "Hanger hole 1, left", entriesAt(70.5, 15.5));
  await cell("Hanger hole 1", "right").click();
  await dropPoint(tech, "Hanger hole 1, right", entriesAt(70.5, -15.5));
  const low = toFloor(frame, framePoint(inches(76), inches(0)));
  await tech
    .getByRole("region", { name: "Drops", exact: true })
    .getByRole("button", { name: /Lowest point in front/i })
    .click();
  await dropPoint(tech, "Lowest point in front", {
    "Ahead of A": formatDecimalInches(low.x, 4),
    "Off the line": formatDecimalInches(low.y, 4).replace("−", "-"),
    "Height above the ground at ride": "22",
  });

  // Axle line, options.
  await tech.goto(`${layout}/step/axle-line`);
  await tech.getByRole("radio", { name: /Square to the frame/ }).click();
  await tech.getByRole("button", { name: /^Lay it/ }).click();
  await expect(tech.getByText("Axle line at 44.41, square to the frame.")).toBeVisible();
  await tech.goto(`${layout}/step/options`);
  for (const [station, approach] of [
    ["44.50", "40.97°"],
    ["45.50", "42.39°"],
    ["46.50", "43.92°"],
    ["48.50", "47.35°"],
  ] as const)
    await expect(
      tech.getByRole("row").filter({ hasText: station }).filter({ hasText: approach }).first(),
    ).toBeVisible();
  await expect(tech.getByText("Approach 38.40°, asked at least 40°.")).toBeVisible();
  await tech.getByRole("button", { name: /^Hole 1, axle line 46\.50/ }).click();
  await tech.getByRole("button", { name: "Put in hand: 46.50, hole 1" }).click();
  await expect(tech.getByText(/^In hand: 52 in pin 2 in ahead, hole 1\. Axle line 46\.50\.$/)).toBeVisible();
  // Nobody signs before a second person has read again what weighs most, without seeing the first figures.
  await tech.goto(`${layout}/step/second-look`);
  await expect(tech.getByText("You read this one first: somebody else looks again.").first()).toBeVisible();
  const second = await as(shop.people.tech2, { viewport: { width: 768, height: 1024 } });
  await second.goto(`${layout}/step/second-look`);
  for (const [side, offset] of [
    ["left", 15.5],
    ["right", -15.5],
  ] as const) {
    const point = second.getByRole("listitem").filter({ hasText: `Hanger hole 1, ${side}` });
    const read = entriesAt(70.5, offset);
    await expect(point).not.toContainText(read["Ahead of A"]);
    await point.getByLabel("Ahead of A").fill(read["Ahead of A"]);
    await point.getByLabel("Off the line").fill(read["Off the line"]);
    await point.getByRole("button", { name: "Keep my reading" }).click();
    await expect(point.getByText("agrees", { exact: false })).toBeVisible();
  }
  await expect(second.getByText("Two people read the same.")).toBeVisible();
  await tech.goto(`${layout}/step/approval`);
  await expect(tech.getByText("Waiting for the foreman.")).toBeVisible();

  // The foreman signs; the technician's tablet sees it; the sheet is there to print.
  await foreman.goto(`${layout}/step/approval`);
  await foreman.getByRole("button", { name: "Approve 46.50, hole 1" }).click();
  await expect(foreman.getByText("Approved: sheet 1.")).toBeVisible();
  await expect(tech.getByText("Approved: sheet 1.")).toBeVisible();
  await tech.goto(`${layout}/sheet`);
  const sheet = tech.getByRole("article", { name: "Layout sheet" });
  await expect(sheet).toContainText("46 1/2");
  await expect(sheet).toContainText("70 1/2");
  await expect(sheet.getByRole("img", { name: "QR code of Old Mule" })).toBeVisible();

  // Moving it now asks first, names what goes, and voids it when told to; everyone sees that.
  await foreman.goto("/floor");
  await foreman.getByRole("button", { name: "Move Old Mule…" }).click();
  await foreman.getByRole("list", { name: "Places" }).getByRole("button", { name: /yard/i }).click();
  await expect(foreman.getByRole("dialog")).toContainText("11 drops");
  await foreman.getByRole("button", { name: "Move and void" }).click();
  await expect(onWall).toContainText("Empty");
  await tech.goto(`${layout}/step/approval`);
  await expect(
    tech
      .getByText(/The level is void: rolled out to the yard\. Level again, then drop one old point again\./)
      .first(),
  ).toBeVisible();
  await tech.goto(`${layout}/sheet`);
  await expect(tech.getByRole("alert")).toContainText("VOID");
  await expect(tech.getByRole("article", { name: "Layout sheet" })).toContainText("46 1/2");
  await tablet.close();
});
