import { bringUpToDate, HalfAppliedMigration } from "../app/db/migrate.server";

/** Brings the database up to date and says so. Exit 0: done; 3: an earlier run stopped midway; 1: it failed now. */
const url = process.env.DATABASE_URL;
const folder = process.env.MIGRATIONS_DIR ?? "drizzle";
if (!url) {
  console.error("DATABASE_URL is missing.");
  process.exit(1);
}
try {
  const count = await bringUpToDate(url, folder);
  console.log(
    count === 0 ? "Tables: up to date" : `Tables: ${count} change${count === 1 ? "" : "s"} applied`,
  );
} catch (error) {
  if (error instanceof HalfAppliedMigration) {
    console.error(`${error.message}
MariaDB cannot undo half a change of tables, so the shop does not start on it.
What to do: put back the last backup; or, when the data may go, delete the folder .data/mariadb and start again;
or finish the change by hand and then run:  update migration_runs set ended_at = utc_timestamp(3);`);
    process.exit(3);
  }
  const cause = (error as { cause?: { sqlMessage?: string } }).cause?.sqlMessage;
  console.error(
    `The database's tables could not be brought up to date: ${cause ?? (error as Error).message}`,
  );
  process.exit(1);
}
