import { boolean, mysqlEnum, mysqlTable, smallint, unique, varchar } from "drizzle-orm/mysql-core";
import { BAY_KINDS, BAY_MOUTHS } from "../../domain/floor/bays";
import { id, lengthMm, ref } from "./columns";
import { shops } from "./shop";

/** The building: walls drawn on the plan. One row a shop. */
export const buildings = mysqlTable("buildings", {
  shopId: ref()
    .primaryKey()
    .references(() => shops.id),
  lengthMm: lengthMm().notNull(),
  widthMm: lengthMm().notNull(),
});

/** A bay at its place on the plan: x to the east, y to the south of the building's north-west inside corner. */
export const bays = mysqlTable(
  "bays",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    number: smallint({ unsigned: true }).notNull(),
    kind: mysqlEnum(BAY_KINDS).notNull(),
    xMm: lengthMm().notNull(),
    yMm: lengthMm().notNull(),
    /** Along the vehicle: usable length. */
    lengthMm: lengthMm().notNull(),
    widthMm: lengthMm().notNull(),
    mouth: mysqlEnum(BAY_MOUTHS).notNull(),
    /** The floor has been found good enough to lay out on. */
    ratedForLayout: boolean().notNull().default(false),
    outside: boolean().notNull().default(false),
  },
  (t) => [unique("bays_number").on(t.shopId, t.number)],
);

/** Permanent points let into a bay's floor. A is the origin, A to B is the floor frame's x. */
export const controlMarks = mysqlTable(
  "control_marks",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    bayId: ref()
      .notNull()
      .references(() => bays.id),
    label: varchar({ length: 2 }).notNull(),
    xMm: lengthMm().notNull(),
    yMm: lengthMm().notNull(),
  },
  (t) => [unique("control_marks_label").on(t.bayId, t.label)],
);
