import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { contextFor, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { cookieFor, startServer, type TestServer } from "#tests/setup/server";
import { CALCS } from "~/calc/registry";
import { type Db, schema } from "~/db/client.server";
import { makeToken, revokeToken } from "~/services/api-tokens.server";

let db: Db;
let shop: TestShop;
let server: TestServer;
let token: string;

beforeAll(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db);
  server = await startServer();
  token = (await makeToken(contextFor(db, shop.people.owner), "Rack sheet")).token;
});
afterAll(() => server.stop());

type Ask = { token?: string; cookie?: string; headers?: Record<string, string>; origin?: string };
const ask = (name: string, body: unknown, { token: key, cookie, headers, origin }: Ask = {}) =>
  fetch(`${origin ?? server.origin}/api/v1/calc/${name}`, {
    method: "POST",
    headers: {
      "content-type": "application/json",
      ...(key ? { authorization: `Bearer ${key}` } : {}),
      ...(cookie ? { cookie } : {}),
      ...headers,
    },
    body: typeof body === "string" ? body : JSON.stringify(body),
  });
const some = () => {
  const [calc] = CALCS;
  const example = calc?.examples[0];
  if (!calc || !example) throw new Error("There is no calculation");
  return { name: calc.name, input: example.input };
};

describe("asking for a calculation", () => {
  it.each(CALCS.map((calc) => [calc.name, calc] as const))("answers %s to a token", async (name, calc) => {
    for (const { input } of calc.examples) {
      const response = await ask(name, input, { token });
      expect(response.status).toBe(200);
      expect(await response.json()).toMatchObject({ calc: name, result: expect.anything() });
    }
  });

  it("answers somebody who is signed in, from our own pages only", async () => {
    const { name, input } = some();
    const cookie = await cookieFor(db, shop.people.tech);
    expect((await ask(name, input, { cookie, headers: { origin: server.origin } })).status).toBe(200);
    expect((await ask(name, input, { cookie, headers: { origin: "https://evil.example" } })).status).toBe(
      403,
    );
    expect((await ask(name, input, { cookie })).status).toBe(403);
  });

  it("refuses nobody's and made-up tokens, and does not look at cookies beside one", async () => {
    const { name, input } = some();
    const cookie = await cookieFor(db, shop.people.owner);
    expect((await ask(name, input, { headers: { origin: server.origin } })).status).toBe(401);
    expect((await ask(name, input, { token: "plumbay_madeup" })).status).toBe(401);
    expect((await ask(name, input, { token: "plumbay_madeup", cookie })).status).toBe(401);
  });

  it("lets a token do nothing else", async () => {
    for (const path of ["/floor", "/springs", "/api/v1/board"])
      expect(
        (await fetch(`${server.origin}${path}`, { headers: { authorization: `Bearer ${token}` } })).status,
      ).toBe(403);
    const post = await fetch(`${server.origin}/tokens`, {
      method: "POST",
      headers: { authorization: `Bearer ${token}`, "content-type": "application/x-www-form-urlencoded" },
      body: "name=more",
    });
    expect(post.status).toBe(403);
  });

  it("names what cannot be read", async () => {
    const { name } = some();
    const nonsense = await ask(name, { nonsense: 1 }, { token });
    expect(nonsense.status).toBe(400);
    const { fields } = (await nonsense.json()) as { fields: { path: string; message: string }[] };
    expect(fields.length).toBeGreaterThan(0);
    expect((await ask(name, "{ not json", { token })).status).toBe(400);
    expect((await ask("no-such-sum", {}, { token })).status).toBe(404);
    expect((await ask(name, `"${"x".repeat(1_200_000)}"`, { token })).status).toBe(413);
  });

  it("slows a token down, and only that one", async () => {
    const strict = await startServer({ env: { CALC_PER_MINUTE: "2" } });
    try {
      const { name, input } = some();
      const other = (await makeToken(contextFor(db, shop.people.owner), "Other")).token;
      const status = async (key: string) =>
        (await ask(name, input, { token: key, origin: strict.origin })).status;
      expect([await status(token), await status(token), await status(token)]).toEqual([200, 200, 429]);
      expect(await status(other)).toBe(200);
    } finally {
      await strict.stop();
    }
  });
});

describe("tokens", () => {
  it("are kept as a hash, journalled without the token, and stop at once when revoked", async () => {
    const owner = contextFor(db, shop.people.owner);
    const made = await makeToken(owner, "Short-lived");
    const rows = await db.select().from(schema.apiTokens).where(eq(schema.apiTokens.shopId, shop.shopId));
    const journal = await db.select().from(schema.journal).where(eq(schema.journal.shopId, shop.shopId));
    expect(JSON.stringify([rows, journal])).not.toContain(made.token);
    const { name, input } = some();
    expect((await ask(name, input, { token: made.token })).status).toBe(200);
    const id = rows.find((row) => row.name === "Short-lived")?.id ?? 0;
    await revokeToken(owner, id);
    expect((await ask(name, input, { token: made.token })).status).toBe(401);
    await expect(revokeToken(owner, id)).rejects.toMatchObject({ kind: "not-found" });
  });

  it("are the owner's to make, and another shop's are not theirs to revoke", async () => {
    await expect(makeToken(contextFor(db, shop.people.foreman), "x")).rejects.toMatchObject({
      kind: "forbidden",
    });
    const other = await makeTestShop(db);
    const [row] = await db.select().from(schema.apiTokens).where(eq(schema.apiTokens.shopId, shop.shopId));
    await expect(revokeToken(contextFor(db, other.people.owner), row?.id ?? 0)).rejects.toMatchObject({
      kind: "not-found",
    });
  });
});

describe("the description", () => {
  it("is OpenAPI 3.1, open to anyone, and lists every calculation", async () => {
    const response = await fetch(`${server.origin}/api/v1/openapi.json`);
    expect(response.status).toBe(200);
    const { openapi, paths } = (await response.json()) as { openapi: string; paths: Record<string, unknown> };
    expect(openapi).toBe("3.1.0");
    expect(Object.keys(paths).sort()).toEqual(CALCS.map((calc) => `/calc/${calc.name}`).sort());
  });
});
