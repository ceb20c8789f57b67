import { bigint, index, json, mysqlTable, varchar } from "drizzle-orm/mysql-core";
import { id, moment, ref } from "./columns";
import { devices, people } from "./people";
import { shops } from "./shop";

/** What a change touched, for those who watch: a bay by id, the yard, the crew board, a layout by id … */
export type Touch =
  | { kind: "bay" | "layout" | "build"; id: number }
  | { kind: "yard" | "crew" | "springs" | "setup" };

/** Who changed what. Written in the same transaction as the change; never updated or deleted (a trigger refuses). */
export const journal = mysqlTable(
  "journal",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    /** The shop's revision that this change made. */
    revision: bigint({ mode: "number", unsigned: true }).notNull(),
    at: moment().notNull(),
    /** NULL: the shop's own doing (the seed). */
    personId: ref().references(() => people.id),
    /** NULL: not on a paired device. */
    deviceId: ref().references(() => devices.id),
    /** A service's name: move-vehicle, keep-drop … */
    verb: varchar({ length: 40 }).notNull(),
    subjectKind: varchar({ length: 24 }).notNull(),
    subjectId: bigint({ mode: "number", unsigned: true }).notNull(),
    /** One line in words, for people. */
    words: varchar({ length: 240 }).notNull(),
    before: json().$type<Record<string, unknown> | null>(),
    after: json().$type<Record<string, unknown> | null>(),
    touches: json().$type<Touch[]>().notNull(),
  },
  (t) => [
    // What changed since revision n?
    index("journal_revision").on(t.shopId, t.revision),
    // The story of one thing.
    index("journal_subject").on(t.shopId, t.subjectKind, t.subjectId),
  ],
);
