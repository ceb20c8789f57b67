import { sql } from "drizzle-orm";
import { check, decimal, mysqlTable, smallint, unique, varchar } from "drizzle-orm/mysql-core";
import { asTyped, id, lengthMm, moment, ref } from "./columns";
import { shops } from "./shop";

/** A leaf spring in the rack, measured flat on the bench: eye centre to eye centre, and front eye to pin. */
export const springs = mysqlTable(
  "springs",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    rackNumber: smallint({ unsigned: true }).notNull(),
    lengthMm: lengthMm().notNull(),
    lengthTyped: asTyped().notNull(),
    frontHalfMm: lengthMm().notNull(),
    frontHalfTyped: asTyped().notNull(),
    leaves: smallint({ unsigned: true }).notNull(),
    leafWidthMm: lengthMm().notNull(),
    leafWidthTyped: asTyped().notNull(),
    note: varchar({ length: 120 }).notNull().default(""),
    /** Thickness of a leaf; NULL: not measured, then no rate is computed. */
    leafThicknessMm: lengthMm(),
    leafThicknessTyped: asTyped(),
    /** The pin below the line of the eyes with no load. NULL: not measured. */
    archMm: lengthMm(),
    archTyped: asTyped(),
    /** Measured on the bench, N/mm. NULL: not measured; a computed rate is never stored here. */
    rateNPerMm: decimal({ mode: "number", precision: 12, scale: 6 }),
    /** Bushings and eyes in words: rubber 1 1/2, bronze … */
    bushings: varchar({ length: 60 }).notNull().default(""),
    /** Where it lies: A3, wall left … */
    place: varchar({ length: 40 }).notNull().default(""),
    /** How many of them; a pair is 2. */
    inStock: smallint({ unsigned: true }).notNull().default(2),
    addedAt: moment().notNull(),
    /** NULL: in the rack. */
    takenOutAt: moment(),
  },
  (t) => [
    unique("springs_rack_number").on(t.shopId, t.rackNumber),
    check("springs_half", sql`${t.frontHalfMm} > 0 and ${t.frontHalfMm} < ${t.lengthMm}`),
  ],
);

/** A spring hanger pattern: its holes lie at fixed distances from hole 1. */
export const hangers = mysqlTable("hangers", {
  id: id(),
  shopId: ref()
    .notNull()
    .references(() => shops.id),
  name: varchar({ length: 60 }).notNull(),
});

export const hangerHoles = mysqlTable(
  "hanger_holes",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    hangerId: ref()
      .notNull()
      .references(() => hangers.id),
    number: smallint({ unsigned: true }).notNull(),
    /** How far ahead of hole 1; hole 1 itself is 0. */
    aheadMm: lengthMm().notNull(),
    aheadTyped: asTyped().notNull(),
  },
  (t) => [unique("hanger_holes_number").on(t.hangerId, t.number)],
);
