import { request } from "node:http";
import { describe, expect, it } from "vitest";
import { makeTestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { startServer, type TestServer } from "#tests/setup/server";

/** A sign-in whose body arrives in two halves: in flight until the second is sent. */
function slowSignIn(server: TestServer) {
  const body = new URLSearchParams({ email: "nobody@test.example", password: "x".repeat(40) }).toString();
  const half = body.length / 2;
  const ask = request(`${server.origin}/sign-in`, {
    method: "POST",
    headers: {
      origin: server.origin,
      "content-type": "application/x-www-form-urlencoded",
      "content-length": body.length,
    },
  });
  const status = new Promise<number | undefined>((resolve, reject) => {
    ask.on("response", (response) => {
      response.resume();
      response.on("end", () => resolve(response.statusCode));
    });
    ask.on("error", reject);
  });
  const begun = new Promise<void>((resolve) => ask.write(body.slice(0, half), () => resolve()));
  return { begun, finish: () => ask.end(body.slice(half)), status };
}

/** Resolves once nobody can connect any more. */
async function untilClosed(server: TestServer): Promise<void> {
  for (;;) {
    try {
      await (await fetch(`${server.origin}/healthz`, { headers: { connection: "close" } })).text();
    } catch {
      return;
    }
  }
}

describe("stopping the server", () => {
  it.each(["SIGTERM", "SIGINT"] as const)("lets a request under way finish on %s", async (signal) => {
    await makeTestShop(await testDatabase());
    const server = await startServer();
    const slow = slowSignIn(server);
    await slow.begun;
    // Its turn has come once a later request is answered.
    await (await fetch(`${server.origin}/healthz`)).text();
    const ended = server.stop(signal);
    await untilClosed(server);
    slow.finish();
    expect(await slow.status).toBe(400);
    expect(await ended).toBe(0);
  });
});
