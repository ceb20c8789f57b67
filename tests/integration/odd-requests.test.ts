import { request } from "node:http";
import { connect } from "node:net";
import { and, eq, isNull } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { contextFor, makeBuild, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { cookieFor, startServer, type TestServer } from "#tests/setup/server";
import { type Db, schema } from "~/db/client.server";
import { holdBuild } from "~/services/hold-build.server";
import { startLayout } from "~/services/layouts/start-layout.server";

/* What no screen of ours sends, and what two people send at once. Nothing of it may be a fault. */

const PASSWORD = "hung from a nail";
let db: Db;
let shop: TestShop;
let server: TestServer;
let cookie: string;

beforeAll(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db, { password: PASSWORD });
  server = await startServer();
  cookie = await cookieFor(db, shop.people.foreman);
});
afterAll(() => server.stop());

const post = (path: string, body: BodyInit, origin = server.origin, headers: Record<string, string> = {}) =>
  fetch(`${origin}${path}`, {
    method: "POST",
    redirect: "manual",
    headers: { origin, cookie, "content-type": "application/x-www-form-urlencoded", ...headers },
    body,
  });

describe("limits by address", () => {
  it.each(["/sign-in", "/sign-in/", "/sign-in.data", "/sign-in/_.data", "/sign-in/.data", "/%73ign-in"])(
    "hold for %s",
    async (path) => {
      const strict = await startServer({ env: { SIGN_IN_PER_MINUTE: "2" } });
      try {
        const statuses: number[] = [];
        for (let i = 0; i < 4; i++)
          statuses.push((await post(path, `email=x${i}@test.example&password=x`, strict.origin)).status);
        expect(statuses).toEqual([400, 400, 429, 429]);
      } finally {
        await strict.stop();
      }
    },
  );
  it("hold for codes of displays, and for asking for one", async () => {
    const strict = await startServer({ env: { SIGN_IN_PER_MINUTE: "2" } });
    try {
      const codes: number[] = [];
      for (let i = 0; i < 3; i++)
        codes.push(
          (await post("/devices/_.data", "code=222222222&name=Wall&kind=wall", strict.origin)).status,
        );
      expect(codes).toEqual([400, 400, 429]);
    } finally {
      await strict.stop();
    }
  });
});

describe("signing in", () => {
  it.each(["é", "ｅ", "e\u0001", "e\u200b"])(
    "takes no address that only looks like one (%j)",
    async (sign) => {
      const email = shop.people.tech.email.replace("e", sign);
      const tried = await post("/sign-in", new URLSearchParams({ email, password: PASSWORD }).toString());
      expect(tried.status).toBe(400);
      expect(tried.headers.get("set-cookie")).toBeNull();
    },
  );
});

/** A request as it goes over the wire, and the status of its answer. */
const wire = (text: string) =>
  new Promise<number>((resolve, reject) => {
    const socket = connect(server.port, "127.0.0.1", () => socket.write(text));
    let answer = "";
    socket.on("data", (chunk) => {
      answer += chunk.toString();
      const status = /^HTTP\/1\.1 (\d+)/.exec(answer)?.[1];
      if (status) {
        socket.destroy();
        resolve(Number(status));
      }
    });
    socket.on("error", reject);
    socket.on("end", () => reject(new Error("No answer")));
  });

describe("what no browser sends", () => {
  it.each([
    ["another method", `TRACE / HTTP/1.1\r\nHost: x\r\n\r\n`, 405],
    ["a whole address as target", `GET http://evil.example/floor HTTP/1.1\r\nHost: x\r\n\r\n`, 400],
    ["a Host with a space", `GET /floor HTTP/1.1\r\nHost: a b\r\n\r\n`, 400],
    ["a Host with an open bracket", `GET /floor HTTP/1.1\r\nHost: [::1\r\n\r\n`, 400],
    ["a Host with no port of this world", `GET /floor HTTP/1.1\r\nHost: x:99999\r\n\r\n`, 400],
  ])("%s", async (_what, text, status) => expect(await wire(text)).toBe(status));

  it("a form with more fields than any of ours, at once", async () => {
    const many = Array.from({ length: 100_000 }, (_, i) => `f${i}=1`).join("&");
    const response = await post("/floor/hold", many);
    expect(response.status).toBe(400);
  });
  it("bodies that are no form, too long, or of no said length", async () => {
    expect((await post("/floor/hold", "{}", undefined, { "content-type": "application/json" })).status).toBe(
      400,
    );
    expect((await post("/floor/hold", "a".repeat(1_100_000))).status).toBe(413);
    const chunked = await new Promise<number | undefined>((resolve, reject) => {
      const ask = request(
        `${server.origin}/floor/hold`,
        { method: "POST", headers: { origin: server.origin, cookie, "transfer-encoding": "chunked" } },
        (response) => resolve(response.statusCode),
      );
      ask.on("error", reject);
      ask.end("a=1");
    });
    expect(chunked).toBe(411);
  });
  it.each(["/builds/1e0", "/builds/0x1/tag", "/layouts/9999999999999999999", "/builds/-1"])(
    "%s as a row's address",
    async (path) =>
      expect(
        (await fetch(`${server.origin}${path}`, { headers: { cookie, accept: "text/html" } })).status,
      ).toBe(404),
  );
  it("stands whose names the database takes for one", async () => {
    const made = await makeBuild(db, shop.shopId, {
      nickname: "Doubled",
      code: "DXBL",
      by: shop.people.foreman.personId ?? 0,
      bayId: shop.bays[1],
    });
    const { layoutId } = await startLayout(contextFor(db, shop.people.tech), {
      buildId: made.buildId,
      fixedEye: "ahead",
    });
    for (const names of [
      ["a", "A", "b"],
      ["e", "é", "b"],
      ["a", "a ", "b"],
    ]) {
      const body = new URLSearchParams({ method: "heights" });
      for (const name of names)
        for (const [field, value] of [
          ["x", "1"],
          ["y", "2"],
          ["height", "24"],
        ] as const)
          body.append(`${field}.${name}`, value);
      expect((await post(`/layouts/${layoutId}/level`, body.toString())).status).toBe(400);
    }
  });
  it.each([
    ["/springs", `do=take-out&springId=${"9".repeat(400)}`],
    ["/floor/hold", "action=nonsense"],
    ["/floor/hold", "action=place&buildId=1&kind=parts"],
    ["/tokens", ""],
  ])("%s with %s: a sentence, not the library's words", async (path, body) => {
    const owner = await cookieFor(db, shop.people.owner);
    const response = await post(`${path}.data`, body, undefined, { cookie: owner });
    expect(response.status).toBe(400);
    expect(await response.text()).not.toMatch(/Invalid|expected|received|Too small/);
  });
});

describe("two at once", () => {
  it("hold a build once, and lift it once", async () => {
    const made = await makeBuild(db, shop.shopId, {
      nickname: "Held",
      code: "HXLD",
      by: shop.people.foreman.personId ?? 0,
    });
    const hold = () =>
      holdBuild(contextFor(db, shop.people.foreman), {
        buildId: made.buildId,
        place: { kind: "parts", words: "Bolts short", dueAt: null },
      });
    const lift = () =>
      holdBuild(contextFor(db, shop.people.foreman2), { buildId: made.buildId, place: null });
    const won = (all: PromiseSettledResult<unknown>[]) =>
      all.filter((one) => one.status === "fulfilled").length;
    expect(won(await Promise.allSettled([hold(), hold(), hold(), hold()]))).toBe(1);
    expect(won(await Promise.allSettled([lift(), lift(), lift()]))).toBe(1);
    const standing = await db
      .select()
      .from(schema.holds)
      .where(and(eq(schema.holds.buildId, made.buildId), isNull(schema.holds.liftedAt)));
    expect(standing).toHaveLength(0);
  });
});
