import AxeBuilder from "@axe-core/playwright";
import { type Demo, demoShop } from "./demo";
import { expect, test } from "./fixtures";

/*
 * Every page as somebody who works on it sees it, with the demo shop in it: axe finds nothing serious, nothing spills out
 * sideways, nothing unexpected is said in the console. Sizes: desk, tablet both ways, phone, wall.
 */

const DESK = { width: 1440, height: 900 };
const TABLET = { width: 1024, height: 768 };
const UPRIGHT = { width: 768, height: 1024 };
const PHONE = { width: 390, height: 844 };
const WALL = { width: 1920, height: 1080 };

type PageCase = {
  name: string;
  who: "foreman" | "tech" | "counter" | "owner" | "display" | "nobody";
  path: (demo: Demo) => Promise<string> | string;
  sizes: { width: number; height: number }[];
  /** Said on the page, so that an error page does not pass for it. */
  says: RegExp;
};

const step = (nickname: string, id: string) => async (demo: Demo) =>
  `/layouts/${await demo.layout(nickname)}/step/${id}`;

const PAGES: PageCase[] = [
  { name: "sign-in", who: "nobody", path: () => "/sign-in", sizes: [DESK, UPRIGHT, PHONE], says: /Sign in/ },
  { name: "pair", who: "nobody", path: () => "/pair", sizes: [WALL], says: /Pair this display/ },
  {
    name: "floor",
    who: "foreman",
    path: () => "/floor",
    sizes: [DESK, TABLET, UPRIGHT, PHONE],
    says: /Old Mule/,
  },
  { name: "floor-tech", who: "tech", path: () => "/floor", sizes: [TABLET], says: /Old Mule/ },
  { name: "wall", who: "display", path: () => "/wall", sizes: [WALL], says: /Old Mule/ },
  { name: "counter", who: "counter", path: () => "/counter", sizes: [DESK, TABLET, PHONE], says: /Old Mule/ },
  {
    name: "book-in",
    who: "counter",
    path: () => "/counter/book-in",
    sizes: [DESK, UPRIGHT, PHONE],
    says: /Nickname/,
  },
  {
    name: "build",
    who: "counter",
    path: async (demo) => `/builds/${await demo.build("Old Mule")}`,
    sizes: [DESK, UPRIGHT, PHONE],
    says: /Old Mule/,
  },
  {
    name: "asked",
    who: "counter",
    path: async (demo) => `/builds/${await demo.build("Old Mule")}/asked`,
    sizes: [DESK, PHONE],
    says: /measured and asked for/,
  },
  {
    name: "tag",
    who: "counter",
    path: async (demo) => `/builds/${await demo.build("Old Mule")}/tag`,
    sizes: [DESK, UPRIGHT],
    says: /Scan or type this code/,
  },
  {
    name: "tag-sheet",
    who: "counter",
    path: async (demo) => `/builds/${await demo.build("Old Mule")}/tag?size=sheet`,
    sizes: [DESK],
    says: /Scan or type this code/,
  },
  { name: "scan", who: "tech", path: () => "/scan", sizes: [UPRIGHT, PHONE], says: /Code on the tag/ },
  {
    name: "stands",
    who: "tech",
    path: step("Old Mule", "stands"),
    sizes: [UPRIGHT, TABLET],
    says: /Rated stands/,
  },
  {
    name: "level",
    who: "tech",
    path: step("Old Mule", "level"),
    sizes: [UPRIGHT, TABLET, PHONE],
    says: /Level true/,
  },
  {
    name: "level-void",
    who: "tech",
    path: step("Biscuit", "level"),
    sizes: [UPRIGHT, TABLET],
    says: /stand 3 was touched/,
  },
  { name: "marks", who: "tech", path: step("Old Mule", "marks"), sizes: [UPRIGHT], says: /Tape from A to B/ },
  {
    name: "drops",
    who: "tech",
    path: step("Old Mule", "drops"),
    sizes: [UPRIGHT, TABLET, DESK, PHONE],
    says: /Frame datum, rear/,
  },
  {
    name: "drops-void",
    who: "tech",
    path: step("Biscuit", "drops"),
    sizes: [TABLET],
    says: /The level is void: stand 3 was touched/,
  },
  {
    name: "axle-line",
    who: "tech",
    path: step("Sunday", "axle-line"),
    sizes: [UPRIGHT, DESK],
    says: /Square to the frame/,
  },
  {
    name: "options",
    who: "foreman",
    path: step("Sunday", "options"),
    sizes: [DESK, TABLET, UPRIGHT, PHONE],
    says: /In hand/,
  },
  {
    name: "approval",
    who: "foreman",
    path: step("Sunday", "approval"),
    sizes: [DESK, UPRIGHT],
    says: /Approved: sheet 1/,
  },
  {
    name: "second-look",
    who: "tech",
    path: step("Sunday", "second-look"),
    sizes: [UPRIGHT],
    says: /Second look/,
  },
  {
    name: "tack",
    who: "tech",
    path: step("Hatchet", "tack"),
    sizes: [UPRIGHT, TABLET, DESK, PHONE],
    says: /True within/,
  },
  {
    name: "tack-first",
    who: "tech",
    path: step("Sunday", "tack"),
    sizes: [UPRIGHT, TABLET, DESK, PHONE],
    says: /Read both ends of the tacked axle/,
  },
  {
    name: "weld",
    who: "tech",
    path: step("Hatchet", "weld"),
    sizes: [UPRIGHT, TABLET, DESK, PHONE],
    says: /4 of 10 brackets/,
  },
  {
    name: "finish-shut",
    who: "foreman",
    path: step("Hatchet", "finish"),
    sizes: [UPRIGHT, PHONE],
    says: /Weld and torque first/,
  },
  {
    name: "sheet",
    who: "foreman",
    path: async (demo) => `/layouts/${await demo.layout("Sunday")}/sheet`,
    sizes: [{ width: 900, height: 1180 }],
    says: /revision 1/,
  },
  {
    name: "history",
    who: "foreman",
    path: async (demo) => `/layouts/${await demo.layout("Sunday")}/history`,
    sizes: [DESK, PHONE],
    says: /Approved: axle line/,
  },
  {
    name: "springs",
    who: "foreman",
    path: () => "/springs",
    sizes: [DESK, UPRIGHT, PHONE],
    says: /Spring rack/,
  },
  { name: "setup", who: "owner", path: () => "/setup", sizes: [DESK, UPRIGHT, PHONE], says: /Slope allowed/ },
  { name: "devices", who: "foreman", path: () => "/devices", sizes: [DESK, PHONE], says: /Pair a display/ },
  { name: "tokens", who: "owner", path: () => "/tokens", sizes: [DESK, PHONE], says: /Make a token/ },
  {
    name: "calculations",
    who: "nobody",
    path: () => "/api/docs",
    sizes: [DESK, UPRIGHT, PHONE],
    says: /Leaf spring/i,
  },
  {
    name: "not-found",
    who: "foreman",
    path: () => "/no/such/page",
    sizes: [DESK, PHONE],
    says: /Nothing hangs here|not/i,
  },
  { name: "forbidden", who: "tech", path: () => "/counter", sizes: [UPRIGHT], says: /Not for your role/ },
];

for (const one of PAGES)
  test(`${one.name}: axe, width, console`, async ({ browser, as, db, baseURL }) => {
    const demo = await demoShop(db);
    const path = await one.path(demo);
    const page =
      one.who === "nobody"
        ? await (await browser.newContext({ baseURL })).newPage()
        : await as(one.who === "display" ? demo.display : await demo.person(one.who));
    for (const size of one.sizes) {
      await page.setViewportSize(size);
      await page.goto(path);
      await expect(page.getByText(one.says).filter({ visible: true }).first()).toBeVisible();
      // Fonts in, live channel joined: the page as it stays.
      await page.evaluate(() => document.fonts.ready);
      const name = `${one.name}-${size.width}x${size.height}`;
      if (process.env.SHOTS) await page.screenshot({ path: `${process.env.SHOTS}/${name}.png` });
      const { violations } = await new AxeBuilder({ page }).analyze();
      const serious = violations
        .filter(({ impact }) => impact === "serious" || impact === "critical")
        .map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html.slice(0, 160)).join(" | ")}`);
      expect.soft(serious, `${name}: axe`).toEqual([]);
      const spill = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect.soft(spill, `${name}: spills out sideways`).toBeLessThanOrEqual(1);
    }
    if (one.who === "nobody") await page.context().close();
  });
