import { contextFor, makeBuild } from "#tests/factories";
import { startServer } from "#tests/setup/server";
import { moveVehicle } from "~/services/move-vehicle.server";
import { Cable } from "./cable";
import { expect, test } from "./fixtures";

test("the wall says when it is not live, never shows an old level as true, and is right again by itself", async ({
  as,
  db,
  shop,
  baseURL,
}) => {
  const cable = await Cable.to(baseURL ?? "");
  const by = shop.people.foreman.personId ?? 0;
  const mule = await makeBuild(db, shop.shopId, {
    nickname: "Old Mule",
    code: "WAXK",
    by,
    bayId: shop.bays[1],
    at: "layout",
    standsSince: new Date(Date.now() - 60_000),
  });
  const wall = await as(shop.display, { viewport: { width: 1920, height: 1080 }, baseURL: cable.origin });
  await wall.goto("/wall");
  const bay = (n: number) => wall.getByRole("region", { name: `Bay ${n}` });
  await expect(bay(1)).toContainText("Old Mule");
  await expect(wall.getByRole("main")).toHaveAttribute("data-live", "live");
  await expect(wall.getByText("Live", { exact: true })).toBeVisible();

  cable.pull();
  await expect(wall.getByRole("alert")).toContainText("NOT LIVE", { timeout: 30_000 });
  await expect(bay(1)).toContainText("was: Layout");
  await expect(bay(1)).toContainText("Level not known: ask at the bay");

  // While it hears nothing another vehicle comes, and this one moves.
  await makeBuild(db, shop.shopId, {
    nickname: "Latecomer",
    code: "WBXK",
    kind: "open-top",
    by,
    bayId: shop.bays[4],
    at: "torque",
  });
  await moveVehicle(contextFor(db, shop.people.foreman), {
    buildId: mule.buildId,
    placementId: mule.placementId,
    toBayId: shop.bays[2],
    confirmed: true,
  });
  await expect(bay(1)).toContainText("was: Layout");

  cable.plugIn();
  await expect(wall.getByRole("alert")).toHaveCount(0, { timeout: 30_000 });
  await expect(bay(2)).toContainText("Old Mule");
  await expect(bay(1)).toContainText("Empty");
  await expect(bay(4)).toContainText("Latecomer");
  await cable.remove();
});

test("the wall is right again by itself after the server was restarted", async ({ as, db, shop }) => {
  const env = {
    DATABASE_URL: process.env.E2E_DATABASE_URL ?? "",
    SESSION_SECRET: process.env.SESSION_SECRET ?? "",
  };
  const by = shop.people.foreman.personId ?? 0;
  const overnight = await makeBuild(db, shop.shopId, { nickname: "Overnight", code: "WCXK", by });
  const before = await startServer({ env });
  const wall = await as(shop.display, {
    viewport: { width: 1920, height: 1080 },
    baseURL: before.origin,
  });
  await wall.goto("/wall");
  const bay = (n: number) => wall.getByRole("region", { name: `Bay ${n}` });
  await expect(wall.getByText("Live", { exact: true })).toBeVisible();
  await expect(bay(2)).toContainText("Empty");
  let loads = 0;
  wall.on("load", () => loads++);

  expect(await before.stop()).toBe(0);
  await expect(wall.getByRole("alert")).toContainText("NOT LIVE", { timeout: 30_000 });
  await moveVehicle(contextFor(db, shop.people.foreman), {
    buildId: overnight.buildId,
    placementId: overnight.placementId,
    toBayId: shop.bays[2],
    confirmed: false,
  });

  const after = await startServer({ env, port: before.port });
  await expect(wall.getByRole("alert")).toHaveCount(0, { timeout: 30_000 });
  await expect(bay(2)).toContainText("Overnight");
  expect(loads, "nobody reloaded it").toBe(0);
  await after.stop();
});

test("a display is paired by the code it shows, and let go", async ({ as, browser, shop, baseURL }) => {
  const context = await browser.newContext({ baseURL, viewport: { width: 1920, height: 1080 } });
  const display = await context.newPage();
  await display.goto("/wall");
  await expect(display).toHaveURL(/\/sign-in/);
  await display.goto("/pair");
  const code = ((await display.locator("main p").first().textContent()) ?? "").replace(
    /Pairing code:|\s/g,
    "",
  );
  expect(code).toMatch(/^[A-Z0-9]{9}$/);

  const foreman = await as(shop.people.foreman);
  await foreman.goto("/devices");
  await foreman.getByLabel("Name").fill("Wall by the door");
  await foreman.getByLabel("Code on the display").fill("222222222");
  await foreman.getByRole("button", { name: "Pair it" }).click();
  await expect(foreman.getByText(/No display shows that code now\. Codes last ten minutes/)).toBeVisible();
  await expect(foreman.getByLabel("Name")).toHaveValue("Wall by the door");
  await foreman.getByLabel("Code on the display").fill(code.toLowerCase());
  await foreman.getByRole("button", { name: "Pair it" }).click();
  await expect(foreman.getByText("Wall by the door is paired.", { exact: false })).toBeVisible();

  await expect(display).toHaveURL(/\/wall$/, { timeout: 15_000 });
  await expect(display.getByText("Live", { exact: true })).toBeVisible();
  // It may look at the wall and at nothing else.
  expect((await display.request.get("/counter", { headers: { accept: "text/html" } })).status()).toBe(403);

  await foreman.getByRole("button", { name: "Let Wall by the door go" }).click();
  await expect(foreman.getByText("No display is paired yet.")).toBeVisible();
  await expect(display.getByRole("alert")).toContainText("NOT LIVE", { timeout: 30_000 });
  await display.reload();
  await expect(display).toHaveURL(/\/(sign-in|pair)/);
  await context.close();
});
