import mysql from "mysql2/promise";
import { type Db, openDatabase } from "~/db/client.server";
import { bringUpToDate } from "~/db/migrate.server";

let open: Promise<{ db: Db; close: () => Promise<void> }> | undefined;

/** Where this worker's database is: its own name on the test server. */
function workerUrl(): string {
  const url = new URL(process.env.TEST_DATABASE_URL ?? "");
  url.pathname = `/plumbay_test_${process.env.VITEST_POOL_ID ?? "1"}`;
  return url.href;
}

async function make() {
  const url = workerUrl();
  const { pathname } = new URL(url);
  const server = new URL(url);
  server.pathname = "/";
  const connection = await mysql.createConnection({ uri: server.href });
  await connection.query(
    `create database if not exists \`${pathname.slice(1)}\` character set utf8mb4 collate utf8mb4_unicode_ci`,
  );
  await connection.end();
  await bringUpToDate(url, "drizzle");
  const { db, pool } = openDatabase(url, 16);
  return { db, close: () => pool.end() };
}

/**
 * The worker's database, up to date. Tests do not clean it: each makes its own shop, and rows of one shop are never
 * seen by another.
 */
export async function testDatabase(): Promise<Db> {
  open ??= make();
  return (await open).db;
}

export async function closeTestDatabase(): Promise<void> {
  if (open) await (await open).close();
  open = undefined;
}

export { workerUrl };
