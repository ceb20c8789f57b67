import { type Browser, type BrowserContext, test as base, expect, type Page } from "@playwright/test";
import { createCookie } from "react-router";
import { makeTestShop, type TestPerson, type TestShop } from "#tests/factories";
import { startSession } from "~/auth/sessions.server";
import { type Db, openDatabase, schema } from "~/db/client.server";

const need = (name: string): string => {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing: run the end-to-end tests through npm test -- e2e`);
  return value;
};

type Fixtures = {
  db: Db;
  shop: TestShop;
  /** A browser of somebody's own, signed in. Unexpected messages in its console fail the test. */
  as: (who: TestPerson, options?: Parameters<Browser["newContext"]>[0]) => Promise<Page>;
  /** Signs a browser context in as somebody. */
  signIn: (context: BrowserContext, who: TestPerson) => Promise<void>;
};

/** Messages that a test brings about on purpose, such as a cut connection. */
const EXPECTED = [/Failed to load resource/, /WebSocket connection to .* failed/, /net::ERR_/];

export function watchConsole(page: Page, faults: string[]): void {
  page.on("console", (message) => {
    if (message.type() !== "error" && message.type() !== "warning") return;
    const text = message.text();
    if (!EXPECTED.some((pattern) => pattern.test(text))) faults.push(`${page.url()}: ${text}`);
  });
  page.on("pageerror", (error) => faults.push(`${page.url()}: ${error.stack ?? error.message}`));
}

export const test = base.extend<Fixtures & { faults: string[] }>({
  // biome-ignore lint/correctness/noEmptyPattern: the runner reads the fixture's needs from this pattern
  db: async ({}, use) => {
    const { db, pool } = openDatabase(need("E2E_DATABASE_URL"), 2);
    await use(db);
    await pool.end();
  },
  shop: async ({ db }, use) => {
    await use(await makeTestShop(db));
  },
  // biome-ignore lint/correctness/noEmptyPattern: as above
  faults: async ({}, use) => {
    const faults: string[] = [];
    await use(faults);
    expect(faults, "nothing unexpected in any console").toEqual([]);
  },
  signIn: async ({ db, baseURL }, use) => {
    await use(async (context, who) => {
      let deviceId: number | null = null;
      if (who.role === "display") {
        const [anybody] = await db.select({ id: schema.people.id }).from(schema.people).limit(1);
        const [device] = await db
          .insert(schema.devices)
          .values({
            shopId: who.shopId,
            kind: "wall",
            name: who.name,
            pairedBy: anybody?.id ?? 0,
            pairedAt: new Date(),
          })
          .$returningId();
        deviceId = device?.id ?? null;
      }
      const secret = await startSession(
        db,
        { shopId: who.shopId, personId: who.personId, deviceId, userAgent: "e2e" },
        new Date(),
      );
      const cookie = createCookie("plumbay_session", { secrets: [need("SESSION_SECRET")] });
      const [pair] = (await cookie.serialize(secret)).split(";");
      const [name, value] = (pair ?? "").split("=", 2);
      await context.addCookies([
        {
          name: name ?? "",
          value: (pair ?? "").slice((name ?? "").length + 1) || (value ?? ""),
          url: baseURL ?? "",
        },
      ]);
    });
  },
  as: async ({ browser, signIn, faults, baseURL }, use) => {
    const contexts: BrowserContext[] = [];
    await use(async (who, options = {}) => {
      const context = await browser.newContext({ baseURL, ...options });
      contexts.push(context);
      await signIn(context, who);
      const page = await context.newPage();
      watchConsole(page, faults);
      return page;
    });
    for (const context of contexts) await context.close();
  },
});

export { expect };
