import { index, mysqlEnum, mysqlTable } from "drizzle-orm/mysql-core";
import { bays } from "./bays";
import { builds, stages } from "./builds";
import { id, moment, ref } from "./columns";
import { people } from "./people";
import { shops } from "./shop";

/*
 * Four tables hold a period each, and MariaDB itself refuses an overlap (PERIOD FOR … WITHOUT OVERLAPS, added by
 * hand in the migration 0001_no_double_booking; the generator does not know periods, so never `push`):
 *   placements  where a vehicle stands: one vehicle a bay, one bay a vehicle
 *   spells      who is on a vehicle: one vehicle a person
 *   stints      the plan: one stint a bay
 *   stint_crew  the plan: one stint a person
 * A period that has not ended yet ends at OPEN_END. Periods are half open: 08-10 and 10-12 do not overlap.
 */

/** Where a vehicle really stood, from when until when. */
export const placements = mysqlTable(
  "placements",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    buildId: ref()
      .notNull()
      .references(() => builds.id),
    /** NULL: in the yard, where many stand. */
    bayId: ref().references(() => bays.id),
    fromAt: moment().notNull(),
    untilAt: moment().notNull(),
    movedBy: ref()
      .notNull()
      .references(() => people.id),
  },
  // Where does each vehicle of the shop stand now?
  (t) => [index("placements_now").on(t.shopId, t.untilAt)],
);

/** A person's time on a vehicle as it really was. */
export const spells = mysqlTable(
  "spells",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    personId: ref()
      .notNull()
      .references(() => people.id),
    buildId: ref()
      .notNull()
      .references(() => builds.id),
    fromAt: moment().notNull(),
    untilAt: moment().notNull(),
  },
  (t) => [index("spells_now").on(t.shopId, t.untilAt)],
);

export const STINT_STATES = ["planned", "cancelled"] as const;

/** A stage's planned time in one bay. */
export const stints = mysqlTable(
  "stints",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    stageId: ref()
      .notNull()
      .references(() => stages.id),
    /** NULL: taken off the plan (a cancelled stint keeps its history without keeping its bay). */
    bayId: ref().references(() => bays.id),
    startsAt: moment().notNull(),
    endsAt: moment().notNull(),
    state: mysqlEnum(STINT_STATES).notNull().default("planned"),
  },
  // What is planned next in the shop?
  (t) => [index("stints_next").on(t.shopId, t.startsAt)],
);

/** Who is planned on a stint; the times are the stint's own, repeated so that the database can refuse an overlap. */
export const stintCrew = mysqlTable(
  "stint_crew",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    stintId: ref()
      .notNull()
      .references(() => stints.id),
    personId: ref()
      .notNull()
      .references(() => people.id),
    startsAt: moment().notNull(),
    endsAt: moment().notNull(),
  },
  (t) => [index("stint_crew_stint").on(t.stintId)],
);
