import { contextFor, makeBuild } from "#tests/factories";
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

  // While it hears nothing the vehicle moves, and another comes.
  await moveVehicle(contextFor(db, shop.people.foreman), {
    buildId: mule.buildId,
    placementId: mule.placementId,
    toBayId: shop.bays[2],
    confirmed: true,
  });
  await makeBuild(db, shop.shopId, {
    nickname: "Latecomer",
    code: "WBXK",
    kind: "open-top",
    by,
    bayId: shop.bays[4],
    at: "torque",
  });
  await expect(bay(1)).toContainText("was: Layout");

  cable.plugIn();
  await expect(wall.getByRole("alert")).toHaveCount(0, { timeout: 30_000 });
  await expect(bay(2)).toContainText("Old Mule");
  await expect(bay(1)).toContainText("Empty");
  await expect(bay(4)).toContainText("Latecomer");
  await cable.remove();
});
