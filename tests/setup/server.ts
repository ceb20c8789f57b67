import { type ChildProcess, spawn } from "node:child_process";
import { createServer } from "node:net";
import { createCookie } from "react-router";
import type { TestPerson } from "#tests/factories";
import { startSession } from "~/auth/sessions.server";
import type { Db } from "~/db/client.server";
import { workerUrl } from "./database";

const SECRET = "a secret for tests only, thirty-two letters and more";

/** A port that nothing listens on. */
export async function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once("error", reject);
    probe.listen(0, "127.0.0.1", () => {
      const address = probe.address();
      probe.close(() =>
        address && typeof address === "object" ? resolve(address.port) : reject(new Error("no port")),
      );
    });
  });
}

export type TestServer = {
  origin: string;
  port: number;
  child: ChildProcess;
  stop: (signal?: NodeJS.Signals) => Promise<number | null>;
};

/** Starts the built server on this worker's database. The build is made before the integration tests run. */
export async function startServer(
  over: { port?: number; env?: Record<string, string> } = {},
): Promise<TestServer> {
  const port = over.port ?? (await freePort());
  const child = spawn(process.execPath, ["server/launch.js"], {
    env: {
      ...process.env,
      NODE_ENV: "production",
      PORT: String(port),
      HOST: "127.0.0.1",
      DATABASE_URL: over.env?.DATABASE_URL ?? workerUrl(),
      SESSION_SECRET: SECRET,
      LOG_LEVEL: "error",
      SIGN_IN_PER_MINUTE: "1000",
      ...over.env,
    },
    stdio: ["ignore", "inherit", "inherit", "ipc"],
  });
  const exited = new Promise<number | null>((resolve) => child.once("exit", resolve));
  await new Promise<void>((resolve, reject) => {
    child.once("message", () => resolve());
    void exited.then((code) => reject(new Error(`The server ended with ${code}`)));
  });
  return {
    origin: `http://127.0.0.1:${port}`,
    port,
    child,
    stop: (signal = "SIGTERM") => {
      child.kill(signal);
      return exited;
    },
  };
}

/** The Cookie header of somebody who is signed in. A display needs its device's id. */
export async function cookieFor(db: Db, person: TestPerson, deviceId: number | null = null): Promise<string> {
  const secret = await startSession(
    db,
    { shopId: person.shopId, personId: person.personId, deviceId, userAgent: "test" },
    new Date(),
  );
  const cookie = createCookie("plumbay_session", { secrets: [SECRET] });
  return (await cookie.serialize(secret)).split(";")[0] ?? "";
}
