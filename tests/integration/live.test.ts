import { io, type Socket } from "socket.io-client";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { contextFor, type MadeBuild, makeBuild, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { cookieFor, startServer, type TestServer } from "#tests/setup/server";
import type { Db } from "~/db/client.server";
import { readBoard } from "~/db/queries/board.server";
import { applyPatch, type Board, type BoardPatch } from "~/domain/floor/board";
import { makePublisher } from "~/realtime/publisher.server";
import { holdBuild } from "~/services/hold-build.server";
import { moveVehicle } from "~/services/move-vehicle.server";

let db: Db;
let shop: TestShop;

beforeAll(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db);
});

let serial = 0;
const build = (over: Partial<Parameters<typeof makeBuild>[2]> = {}): Promise<MadeBuild> =>
  makeBuild(db, shop.shopId, {
    nickname: `Live ${++serial}`,
    code: `L${serial.toString(36).padStart(3, "0")}`,
    kind: "two-door-utility",
    by: shop.people.foreman.personId ?? 0,
    ...over,
  });

const comparable = (board: Board) => ({ ...board, next: [] });

describe("the catch-up cursor under many writers", () => {
  it("misses nothing: a board kept by patches alone equals the board read afresh", async () => {
    const builds = await Promise.all(Array.from({ length: 6 }, () => build()));
    let kept = await readBoard(db, shop.shopId, new Date());
    const gaps: BoardPatch[] = [];
    const publisher = makePublisher(
      db,
      () => new Date(),
      (_shopId, patch) => {
        const next = applyPatch(kept, patch);
        if (next === null) gaps.push(patch);
        else kept = next;
      },
      (error) => {
        throw error;
      },
    );
    await publisher.beat(shop.shopId);

    const WRITERS = 8;
    const CHANGES = 12;
    let committed = 0;
    const publish = publisher.publish;
    const writer = async (n: number) => {
      const person = n % 2 ? shop.people.foreman : shop.people.foreman2;
      const ctx = contextFor(db, person, { publish });
      for (let i = 0; i < CHANGES; i++) {
        const made = builds[(n + i) % builds.length];
        if (!made) continue;
        const board = await readBoard(db, shop.shopId, new Date());
        const standing = [...board.yard, ...board.bays.flatMap((card) => card.vehicle ?? [])].find(
          (vehicle) => vehicle.buildId === made.buildId,
        );
        if (!standing) throw new Error("A vehicle fell off the board");
        const attempt =
          (n + i) % 3 === 0
            ? holdBuild(ctx, {
                buildId: made.buildId,
                place: standing.hold ? null : { kind: "parts", words: `Bolt ${n}-${i}`, dueAt: null },
              })
            : moveVehicle(ctx, {
                buildId: made.buildId,
                placementId: standing.placementId,
                toBayId:
                  [shop.bays[1], shop.bays[2], shop.bays[4], shop.bays[5], null][(n * 3 + i) % 5] ?? null,
                confirmed: true,
              });
        try {
          await attempt;
          committed++;
        } catch (error) {
          // Losing a race is a fair answer here; anything else is not.
          expect((error as { kind?: string }).kind).toBe("conflict");
        }
      }
    };
    await Promise.all(Array.from({ length: WRITERS }, (_, n) => writer(n)));
    await publisher.settled();

    const truth = await readBoard(db, shop.shopId, new Date());
    expect(committed).toBeGreaterThan(WRITERS);
    expect(gaps).toEqual([]);
    expect(kept.revision).toBe(truth.revision);
    expect(comparable(kept)).toEqual(comparable(truth));
  });

  it("reads once for one watcher or two hundred, and only what changed", async () => {
    const made = await build();
    const patches: BoardPatch[] = [];
    const publisher = makePublisher(
      db,
      () => new Date(),
      (_shopId, patch) => patches.push(patch),
      () => {},
    );
    await publisher.beat(shop.shopId);
    const board = await readBoard(db, shop.shopId, new Date());
    const free = board.bays.find((card) => card.vehicle === null && card.bay.kind !== "general");
    await moveVehicle(contextFor(db, shop.people.foreman, { publish: publisher.publish }), {
      buildId: made.buildId,
      placementId: made.placementId,
      toBayId: free?.bay.id ?? 0,
      confirmed: true,
    });
    await publisher.settled();
    expect(patches).toHaveLength(1);
    expect(patches[0]?.bays.map((card) => card.bay.id)).toEqual([free?.bay.id]);
  });
});

describe("the live channel", () => {
  let server: TestServer;
  const sockets: Socket[] = [];
  beforeAll(async () => {
    server = await startServer();
  });
  afterEach(() => {
    for (const socket of sockets.splice(0)) socket.close();
  });
  afterAll(() => server?.stop());

  const open = (headers: Record<string, string>) => {
    const socket = io(server.origin, {
      transports: ["websocket"],
      reconnection: false,
      extraHeaders: headers,
    });
    sockets.push(socket);
    return socket;
  };
  const outcome = (socket: Socket) =>
    new Promise<string>((resolve) => {
      socket.once("connect", () => resolve("connected"));
      socket.once("connect_error", (error) => resolve(`refused: ${error.message}`));
    });

  it("lets in whoever has a session, from our own pages only", async () => {
    const cookie = await cookieFor(db, shop.people.tech);
    expect(await outcome(open({ cookie }))).toBe("connected");
    expect(await outcome(open({ cookie, origin: server.origin }))).toBe("connected");
    expect(await outcome(open({ cookie, origin: "https://elsewhere.example" }))).toMatch(/^refused/);
    expect(await outcome(open({}))).toBe("refused: sign-in");
  });

  it("tells a change to those of the shop and to nobody of another", async () => {
    const other = await makeTestShop(db);
    const here = open({ cookie: await cookieFor(db, shop.people.tech) });
    const there = open({ cookie: await cookieFor(db, other.people.tech) });
    // With its first beat a screen is in its room and the server knows what it has sent: from here on changes are patches.
    await Promise.all([here, there].map((socket) => new Promise((resolve) => socket.once("beat", resolve))));
    const heardThere: string[] = [];
    there.on("patch", (patch: BoardPatch) => heardThere.push(JSON.stringify(patch)));
    const made = await build({ nickname: "Only here" });
    const heard = new Promise<BoardPatch>((resolve) => here.once("patch", resolve));
    const form = new URLSearchParams({
      buildId: String(made.buildId),
      action: "place",
      kind: "parts",
      words: "Pins short",
    });
    const response = await fetch(`${server.origin}/floor/hold`, {
      method: "POST",
      headers: { cookie: await cookieFor(db, shop.people.foreman), origin: server.origin },
      body: form,
    });
    expect(response.status).toBe(200);
    expect(JSON.stringify(await heard)).toContain("Pins short");
    const beat = new Promise((resolve) => there.once("beat", resolve));
    await beat;
    expect(heardThere.join()).not.toContain("Pins short");
  });

  it("answers a screen that was away with the board as it is, and nothing when it is up to date", async () => {
    const socket = open({ cookie: await cookieFor(db, shop.people.tech) });
    await outcome(socket);
    const board = (await socket.timeout(5000).emitWithAck("catchUp", { revision: 0 })) as Board;
    expect(comparable(board)).toEqual(comparable(await readBoard(db, shop.shopId, new Date())));
    expect(await socket.timeout(5000).emitWithAck("catchUp", { revision: board.revision })).toBeNull();
  });

  it("cuts a session off when it signs out", async () => {
    const cookie = await cookieFor(db, shop.people.tech);
    const socket = open({ cookie });
    await outcome(socket);
    const gone = new Promise<string>((resolve) => socket.once("disconnect", resolve));
    const response = await fetch(`${server.origin}/sign-out`, {
      method: "POST",
      redirect: "manual",
      headers: { cookie, origin: server.origin },
    });
    expect(response.status).toBe(302);
    expect(await gone).toBe("io server disconnect");
    expect(await outcome(open({ cookie }))).toBe("refused: sign-in");
  });
});
