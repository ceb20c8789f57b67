import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { cookieFor, startServer, type TestServer } from "#tests/setup/server";
import { actorFromSecret, endSession, hashOf, SESSION_LIMITS, startSession } from "~/auth/sessions.server";
import { type Db, schema } from "~/db/client.server";

const PASSWORD = "a plumb line and a level";
const MINUTE = 60_000;

let db: Db;
let shop: TestShop;
let server: TestServer;

beforeAll(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db, { password: PASSWORD });
  server = await startServer();
});
afterAll(() => server.stop());

/** Posts the form as the page does without its script. */
function post(
  fields: Record<string, string>,
  options: { to?: string; cookie?: string; headers?: Record<string, string>; origin?: string } = {},
) {
  const base = options.origin ?? server.origin;
  return fetch(`${base}/sign-in${options.to ?? ""}`, {
    method: "POST",
    redirect: "manual",
    headers: {
      origin: base,
      "content-type": "application/x-www-form-urlencoded",
      ...(options.cookie ? { cookie: options.cookie } : {}),
      ...options.headers,
    },
    body: new URLSearchParams(fields),
  });
}
const cookieOf = (response: Response) => response.headers.get("set-cookie")?.split(";")[0] ?? "";
const good = () => ({ email: shop.people.foreman.email, password: PASSWORD });
const sees = async (cookie: string, path = "/floor") =>
  (await fetch(`${server.origin}${path}`, { redirect: "manual", headers: { cookie, accept: "text/html" } }))
    .status;

describe("signing in", () => {
  it("lets the person in, with a cookie that scripts and other sites do not get", async () => {
    const response = await post(good());
    expect(response.status).toBe(302);
    expect(response.headers.get("location")).toBe("/");
    const set = response.headers.get("set-cookie") ?? "";
    expect(set).toMatch(/HttpOnly/i);
    expect(set).toMatch(/SameSite=(Lax|Strict)/i);
    expect(await sees(cookieOf(response))).toBe(200);
  });

  it("goes on to a page of ours that was asked for, never to another site", async () => {
    const where = async (to: string) => (await post(good(), { to })).headers.get("location");
    expect(await where("?to=/springs")).toBe("/springs");
    for (const bad of ["//evil.example", "https://evil.example", "/\\evil.example", "javascript:alert(1)"])
      expect(await where(`?to=${encodeURIComponent(bad)}`)).toBe("/");
  });

  it("answers one sentence to a wrong password, an unknown address and somebody who left", async () => {
    const leaver = shop.people.tech2;
    await db
      .update(schema.people)
      .set({ leftAt: new Date() })
      .where(eq(schema.people.id, leaver.personId ?? 0));
    const tries = [
      { email: shop.people.foreman.email, password: "wrong" },
      { email: "nobody@test.example", password: PASSWORD },
      { email: leaver.email, password: PASSWORD },
    ];
    for (const fields of tries) {
      const response = await post(fields);
      const page = await response.text();
      expect(response.status).toBe(400);
      expect(response.headers.get("set-cookie")).toBeNull();
      expect(page).toContain("That address and password do not belong together.");
      expect(page).toContain(`value="${fields.email}"`);
      expect(page).not.toContain(fields.password);
    }
  });

  it("stops after ten failures on one account, known or not, even with the right password", async () => {
    for (const email of [shop.people.counter.email, "stranger@test.example"]) {
      for (let i = 0; i < 10; i++) expect((await post({ email, password: `no ${i}` })).status).toBe(400);
      const response = await post({ email, password: PASSWORD });
      expect(response.status).toBe(429);
      expect(await response.text()).toContain("Too many tries on this account.");
    }
    expect((await post(good())).status, "other accounts go on").toBe(302);
  });

  it("stops an address that tries too often, in words on the page and with what was typed", async () => {
    const strict = await startServer({ env: { SIGN_IN_PER_MINUTE: "3" } });
    try {
      for (let i = 0; i < 3; i++)
        expect(
          (await post({ email: `x${i}@test.example`, password: "x" }, { origin: strict.origin })).status,
        ).toBe(400);
      const response = await post(good(), { origin: strict.origin });
      expect(response.status).toBe(429);
      const page = await response.text();
      expect(page).toContain("Too many tries from this address. Wait a minute.");
      expect(page).toContain(`value="${shop.people.foreman.email}"`);
    } finally {
      await strict.stop();
    }
  });

  it("gives a new session at every sign-in and ends the one before", async () => {
    const first = cookieOf(await post(good()));
    const second = cookieOf(await post(good(), { cookie: first }));
    expect(second).not.toBe(first);
    expect(await sees(second)).toBe(200);
    expect(await sees(first)).toBe(302);
  });

  it("signs out for good", async () => {
    const cookie = cookieOf(await post(good()));
    const out = await fetch(`${server.origin}/sign-out`, {
      method: "POST",
      redirect: "manual",
      headers: { cookie, origin: server.origin },
    });
    expect(out.status).toBe(302);
    expect(await sees(cookie)).toBe(302);
  });

  it("leaves a paired display a display when a person signs out on it", async () => {
    const [device] = await db
      .insert(schema.devices)
      .values({
        shopId: shop.shopId,
        kind: "wall",
        name: "Wall",
        pairedBy: shop.people.foreman.personId ?? 0,
        pairedAt: new Date(),
      })
      .$returningId();
    const display = await cookieFor(db, shop.display, device?.id ?? null);
    const person = cookieOf(await post(good(), { cookie: display }));
    expect(await sees(person, "/springs")).toBe(200);
    const out = await fetch(`${server.origin}/sign-out`, {
      method: "POST",
      redirect: "manual",
      headers: { cookie: person, origin: server.origin },
    });
    expect(out.headers.get("location")).toBe("/wall");
    const again = cookieOf(out);
    expect(await sees(again, "/wall")).toBe(200);
    expect(await sees(again, "/springs")).toBe(403);
  });

  it("refuses a form that comes from another site", async () => {
    expect((await post(good(), { headers: { origin: "https://evil.example" } })).status).toBe(403);
    expect((await post(good(), { headers: { origin: "null" } })).status).toBe(403);
  });

  it("takes a cookie that somebody made up for nobody", async () => {
    expect(await sees("plumbay_session=eyJhIjoxfQ%3D%3D.c2lnbmF0dXJl")).toBe(302);
  });
});

describe("a session", () => {
  const start = (at: Date) =>
    startSession(
      db,
      { shopId: shop.shopId, personId: shop.people.tech.personId, deviceId: null, userAgent: "" },
      at,
    );
  const later = (from: Date, ms: number) => new Date(from.getTime() + ms);
  const t0 = new Date("2026-12-01T07:00:00Z");

  it("is kept as a hash only", async () => {
    const secret = await start(t0);
    const rows = await db
      .select()
      .from(schema.sessions)
      .where(eq(schema.sessions.idHash, hashOf(secret)));
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(secret);
  });

  it("ends when it was not used for long", async () => {
    const secret = await start(t0);
    const { idle } = SESSION_LIMITS.person;
    expect(await actorFromSecret(db, secret, later(t0, idle - MINUTE))).not.toBeNull();
    // That was a use: the limit counts from it.
    expect(await actorFromSecret(db, secret, later(t0, 2 * idle - 3 * MINUTE))).not.toBeNull();
    const other = await start(t0);
    expect(await actorFromSecret(db, other, later(t0, idle + MINUTE))).toBeNull();
  });

  it("is not used by a screen that only listens", async () => {
    const secret = await start(t0);
    const { idle } = SESSION_LIMITS.person;
    for (let at = 0; at < idle; at += 60 * MINUTE)
      expect(await actorFromSecret(db, secret, later(t0, at), { used: false })).not.toBeNull();
    expect(await actorFromSecret(db, secret, later(t0, idle + MINUTE), { used: false })).toBeNull();
  });

  it("ends at the latest after its day, however much it is used", async () => {
    const secret = await start(t0);
    const { absolute } = SESSION_LIMITS.person;
    for (let at = 0; at < absolute; at += 60 * MINUTE)
      expect(await actorFromSecret(db, secret, later(t0, at))).not.toBeNull();
    expect(await actorFromSecret(db, secret, later(t0, absolute + MINUTE))).toBeNull();
  });

  it("ends when it is revoked or the person leaves", async () => {
    const secret = await start(t0);
    await endSession(db, hashOf(secret), later(t0, MINUTE));
    expect(await actorFromSecret(db, secret, later(t0, 2 * MINUTE))).toBeNull();
    const other = await start(t0);
    expect(await actorFromSecret(db, other, later(t0, MINUTE))).toMatchObject({ role: "tech" });
    await db
      .update(schema.people)
      .set({ leftAt: t0 })
      .where(eq(schema.people.id, shop.people.tech.personId ?? 0));
    expect(await actorFromSecret(db, other, later(t0, 2 * MINUTE))).toBeNull();
  });
});
