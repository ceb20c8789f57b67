import { bigint, boolean, mysqlEnum, mysqlTable, varchar } from "drizzle-orm/mysql-core";
import { angleDeg, id, lengthMm, moment, ref } from "./columns";

export const shops = mysqlTable("shops", {
  id: id(),
  name: varchar({ length: 80 }).notNull(),
  /** True for the made-up shop that a new database is filled with; every screen says so. */
  isDemo: boolean().notNull().default(false),
  createdAt: moment().notNull(),
});

/** What a shop may set for itself. One row a shop. */
export const shopSettings = mysqlTable("shop_settings", {
  shopId: ref()
    .primaryKey()
    .references(() => shops.id),
  /** IANA name; every time is stored in UTC and shown in this zone. */
  timeZone: varchar({ length: 64 }).notNull(),
  /** What a bare number on a length field means. */
  unit: mysqlEnum(["in", "mm"]).notNull().default("in"),
  /** Level: the slope allowed in either direction. */
  allowedSlopeDeg: angleDeg().notNull(),
  /** Smallest shim under a stand. */
  shimMm: lengthMm().notNull(),
  /** How far an old point may land from where it was for the old drops to stand after a new level. */
  redropToleranceMm: lengthMm().notNull(),
  /** How far A to B as taped may be from what Setup says. */
  markToleranceMm: lengthMm().notNull(),
  /** Standard uncertainties. */
  tapeSigmaMm: lengthMm().notNull(),
  dropSigmaMm: lengthMm().notNull(),
  springSigmaMm: lengthMm().notNull(),
});

/**
 * The shop's catch-up cursor: one more with every committed change, taken as the last lock of its transaction,
 * so that a reader who sees revision n sees every change up to n. (Auto-increment ids do not promise that:
 * a row with a lower id may be committed later.)
 */
export const shopRevisions = mysqlTable("shop_revisions", {
  shopId: ref()
    .primaryKey()
    .references(() => shops.id),
  revision: bigint({ mode: "number", unsigned: true }).notNull().default(0),
});
