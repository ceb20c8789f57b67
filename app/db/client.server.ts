import { drizzle, type MySql2Database } from "drizzle-orm/mysql2";
import mysql from "mysql2/promise";
import * as schema from "./schema";

export type Db = MySql2Database<Record<string, never>>;
/** A transaction, or the database itself: whatever can be read from. */
export type Tx = Parameters<Parameters<Db["transaction"]>[0]>[0];
export type Reader = Db | Tx;

/** Opens a pool. Dates travel as UTC both ways. The caller ends the pool. */
export function openDatabase(url: string, connections = 12): { db: Db; pool: mysql.Pool } {
  const pool = mysql.createPool({
    uri: url,
    timezone: "Z",
    connectionLimit: connections,
    supportBigNumbers: true,
    charset: "utf8mb4_unicode_ci",
  });
  const db = drizzle(pool, { casing: "snake_case" }) as unknown as Db;
  return { db, pool };
}

export { schema };

const errno = (error: unknown): number | undefined => {
  for (let at = error; at instanceof Error; at = at.cause as unknown)
    if ("errno" in at && typeof at.errno === "number") return at.errno;
  return undefined;
};

// By number: the driver's own names are wrong for numbers that only MariaDB has.
/** A key that may exist once exists already, an overlap of two periods included. */
export const isDuplicate = (error: unknown) => errno(error) === 1062;
/** The server chose this transaction to break a deadlock, or it waited too long for a lock: try again. */
export const isLockConflict = (error: unknown) => {
  const n = errno(error);
  return n === 1213 || n === 1205 || n === 1020;
};
/** A CHECK constraint refused the row. */
export const isCheckFailure = (error: unknown) => errno(error) === 4025;
