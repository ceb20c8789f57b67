import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { sql } from "drizzle-orm";
import { migrate } from "drizzle-orm/mysql2/migrator";
import type { RowDataPacket } from "mysql2";
import type { Pool } from "mysql2/promise";
import { type Db, openDatabase } from "./client.server";

/** A migration began and never ended: MariaDB cannot roll table changes back, so nothing may go on by itself. */
export class HalfAppliedMigration extends Error {}

type JournalFile = { entries: { idx: number; when: number; tag: string }[] };

/** Reads the list of migrations and makes sure that their times grow (a migration with an older time is skipped silently). */
export function listMigrations(folder: string): { tag: string; when: number }[] {
  const file = JSON.parse(readFileSync(join(folder, "meta", "_journal.json"), "utf8")) as JournalFile;
  let last = 0;
  for (const entry of file.entries) {
    if (entry.when <= last) throw new Error(`Migration ${entry.tag} is dated before the one ahead of it.`);
    last = entry.when;
    if (!readdirSync(folder).includes(`${entry.tag}.sql`))
      throw new Error(`drizzle/${entry.tag}.sql is missing.`);
  }
  return file.entries;
}

const rows = async (pool: Pool, text: string) => (await pool.query<RowDataPacket[]>(text))[0];

/** How many migrations the database has had; 0 for an empty one. */
async function applied(pool: Pool): Promise<number> {
  const found = await rows(pool, "show tables like '__drizzle_migrations'");
  if (found.length === 0) return 0;
  const [row] = await rows(pool, "select count(*) as n from __drizzle_migrations");
  return Number(row?.n ?? 0);
}

/** True when the database has every migration of the folder. */
export async function isUpToDate(pool: Pool, folder: string): Promise<boolean> {
  return (await applied(pool)) >= listMigrations(folder).length;
}

/**
 * Brings the database up to date, one process at a time.
 * @returns how many migrations were applied
 * @throws HalfAppliedMigration when an earlier run stopped midway
 */
export async function bringUpToDate(url: string, folder: string): Promise<number> {
  const { db, pool } = openDatabase(url, 2);
  const guard = await pool.getConnection();
  try {
    await guard.query("select get_lock(concat(database(), '.migrate'), 60)");
    await guard.query(
      "create table if not exists migration_runs (id int auto_increment primary key, began_at datetime(3) not null, ended_at datetime(3) null, first_tag varchar(120) not null)",
    );
    const [stopped] = (
      await guard.query<RowDataPacket[]>("select * from migration_runs where ended_at is null limit 1")
    )[0];
    if (stopped)
      throw new HalfAppliedMigration(
        `A change to the database's tables began on ${new Date(stopped.began_at).toISOString()} (from ${stopped.first_tag}) and did not end.`,
      );
    const before = await applied(pool);
    const todo = listMigrations(folder).slice(before);
    if (todo.length === 0) return 0;
    await guard.query("insert into migration_runs (began_at, first_tag) values (utc_timestamp(3), ?)", [
      todo[0]?.tag,
    ]);
    await migrate(db as unknown as Parameters<typeof migrate>[0], { migrationsFolder: folder });
    await guard.query("update migration_runs set ended_at = utc_timestamp(3) where ended_at is null");
    return todo.length;
  } finally {
    await guard.query("select release_lock(concat(database(), '.migrate'))").catch(() => {});
    guard.release();
    await pool.end();
  }
}

/** True when the database holds no shop yet. */
export async function isEmpty(db: Db): Promise<boolean> {
  const [result] = (await db.execute(sql`select count(*) as n from shops`)) as unknown as [{ n: number }[]];
  return Number(result?.[0]?.n ?? 0) === 0;
}
