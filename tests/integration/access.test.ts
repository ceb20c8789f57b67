import type { RouteConfigEntry } from "@react-router/dev/routes";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { contextFor, makeBuild, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { cookieFor, startServer, type TestServer } from "#tests/setup/server";
import { ACCESS, type Need } from "~/auth/access";
import { may } from "~/auth/permissions";
import { schema } from "~/db/client.server";
import { ACTOR_ROLES, type ActorRole } from "~/domain/people/roles";
import routes from "~/routes";
import { makeToken } from "~/services/api-tokens.server";

/** Every path of routes.ts, nested ones joined. */
function pathsOf(entries: readonly RouteConfigEntry[], above = ""): string[] {
  return entries.flatMap((entry) => {
    const path = entry.index ? above : `${above}/${entry.path ?? ""}`;
    return [path === "" ? "/" : path, ...pathsOf(entry.children ?? [], path)];
  });
}

describe("the access table", () => {
  it("knows every route, and no route that is not there", () => {
    expect([...ACCESS.map((row) => row.path)].sort()).toEqual(pathsOf(routes).sort());
  });
});

type Who = ActorRole | "nobody";
let server: TestServer;
let shop: TestShop;
let ids: Record<string, string>;
const cookies: Partial<Record<Who, string>> = {};
let token: string;

beforeAll(async () => {
  const db = await testDatabase();
  shop = await makeTestShop(db);
  const build = await makeBuild(db, shop.shopId, {
    nickname: "Walked",
    code: "WXK3",
    by: shop.people.foreman.personId ?? 0,
  });
  ids = { buildId: String(build.buildId), layoutId: "999999", code: "WXK3", step: "level", name: "leaf" };
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
  cookies.owner = await cookieFor(db, shop.people.owner);
  cookies.foreman = await cookieFor(db, shop.people.foreman);
  cookies.tech = await cookieFor(db, shop.people.tech);
  cookies.counter = await cookieFor(db, shop.people.counter);
  cookies.display = await cookieFor(db, shop.display, device?.id ?? null);
  token = (await makeToken(contextFor(db, shop.people.owner), "Walker")).token;
  server = await startServer();
});
afterAll(() => server?.stop());

const ask = (method: string, path: string, who: Who) =>
  fetch(`${server.origin}${path}`, {
    method,
    redirect: "manual",
    headers: {
      accept: "text/html",
      ...(cookies[who] ? { cookie: cookies[who] } : {}),
      ...(who === "token" ? { authorization: `Bearer ${token}` } : {}),
      ...(method === "POST"
        ? { origin: server.origin, "content-type": "application/x-www-form-urlencoded" }
        : {}),
    },
    body: method === "POST" ? "" : undefined,
  });

const toSignIn = (response: Response) =>
  response.status === 302 && (response.headers.get("location") ?? "").startsWith("/sign-in");

function verdict(need: Need | undefined, who: Who): "none" | "sign-in" | "forbidden" | "in" {
  if (need === undefined) return "none";
  if (need === "anyone") return "in";
  if (who === "nobody") return "sign-in";
  if (need === "signed-in") return "in";
  return may(who, need) ? "in" : "forbidden";
}

const cells = ACCESS.flatMap((row) =>
  (["GET", "POST"] as const).flatMap((method) =>
    ([...ACTOR_ROLES, "nobody"] as Who[]).map((who) => ({
      row,
      method,
      who,
      want: verdict(row[method], who),
    })),
  ),
).filter(
  // Signing out ends the session that the other cells need; it has its own test.
  ({ row, method, who }) => !(row.path === "/sign-out" && method === "POST" && who !== "nobody"),
);

describe("every route × method × role", () => {
  it.each(cells)("$method $row.path as $who: $want", async ({ row, method, who, want }) => {
    const path = row.path
      .replace(/:(\w+)/g, (_, name: string) => ids[name] ?? "1")
      .replace("*", "no/such/page");
    const response = await ask(method, path, who);
    await response.arrayBuffer();
    expect(response.status).toBeLessThan(500);
    if (want === "none") expect(response.status).toBe(405);
    else if (want === "forbidden") expect(response.status).toBe(403);
    else if (want === "sign-in") expect(toSignIn(response) || response.status === 401).toBe(true);
    else {
      expect([401, 403, 405]).not.toContain(response.status);
      if (row.path !== "/") expect(toSignIn(response)).toBe(false);
    }
  });

  it.each(ACCESS.filter((row) => row.GET && row.GET !== "anyone"))(
    "the data of $path is guarded like its page",
    async (row) => {
      const path = row.path.replace(/:(\w+)/g, (_, name: string) => ids[name] ?? "1");
      const response = await fetch(`${server.origin}${path}.data`, { redirect: "manual" });
      const text = await response.text();
      expect(response.status === 202 || response.status === 302 || response.status === 401).toBe(true);
      expect(text).not.toContain("Walked");
    },
  );
});

describe("requests from elsewhere", () => {
  const post = (path: string, headers: Record<string, string>) =>
    fetch(`${server.origin}${path}`, {
      method: "POST",
      redirect: "manual",
      headers: {
        cookie: cookies.foreman ?? "",
        "content-type": "application/x-www-form-urlencoded",
        ...headers,
      },
      body: "",
    });

  it.each(["/sign-in", "/floor/move-vehicle", "/counter/book-in", "/api/v1/board", "/layouts/1/drop"])(
    "a post to %s from another site is refused, and so is one that does not say where it comes from",
    async (path) => {
      expect((await post(path, { origin: "https://elsewhere.example" })).status).toBe(403);
      expect((await post(path, { "sec-fetch-site": "cross-site" })).status).toBe(403);
      expect((await post(path, {})).status).toBe(403);
      expect((await post(path, { origin: "null" })).status).toBe(403);
    },
  );

  it.each(["PUT", "PATCH", "DELETE"])("%s is guarded too", async (method) => {
    const response = await fetch(`${server.origin}/floor`, {
      method,
      headers: { cookie: cookies.foreman ?? "" },
    });
    expect(response.status).toBe(405);
  });

  it("sends the headers that keep a page to itself", async () => {
    const response = await ask("GET", "/floor", "foreman");
    await response.arrayBuffer();
    const csp = response.headers.get("content-security-policy") ?? "";
    expect(csp).toMatch(/script-src 'self' 'wasm-unsafe-eval' 'nonce-[\w+/=]+'/);
    expect(csp).toContain("frame-ancestors 'none'");
    expect(response.headers.get("x-content-type-options")).toBe("nosniff");
    expect(response.headers.get("cache-control")).toBe("no-store");
    expect(response.headers.get("x-powered-by")).toBeNull();
  });

  it("gives every page another nonce", async () => {
    const nonce = async () => {
      const response = await ask("GET", "/sign-in", "nobody");
      await response.arrayBuffer();
      return /'nonce-([^']+)'/.exec(response.headers.get("content-security-policy") ?? "")?.[1];
    };
    expect(await nonce()).not.toBe(await nonce());
  });
});
