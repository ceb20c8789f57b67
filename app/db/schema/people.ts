import {
  boolean,
  char,
  index,
  mysqlEnum,
  mysqlTable,
  primaryKey,
  unique,
  varchar,
} from "drizzle-orm/mysql-core";
import { ROLES, SKILLS } from "../../domain/people/roles";
import { id, moment, ref } from "./columns";
import { shops } from "./shop";

export const people = mysqlTable(
  "people",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    name: varchar({ length: 80 }).notNull(),
    initials: varchar({ length: 3 }).notNull(),
    role: mysqlEnum(ROLES).notNull(),
    /** Lower case. NULL: the person does not sign in with a password (a technician on posts only). */
    email: varchar({ length: 190 }),
    passwordHash: varchar({ length: 100 }),
    /** Away today: drawn as an empty check on the crew board. NULL: here. */
    awayUntil: moment(),
    /** NULL: works here. Kept for the journal after that. */
    leftAt: moment(),
    createdAt: moment().notNull(),
  },
  // Sign-in looks a person up by address alone, before the shop is known.
  (t) => [unique("people_email").on(t.email), index("people_shop").on(t.shopId)],
);

export const personSkills = mysqlTable(
  "person_skills",
  {
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    personId: ref()
      .notNull()
      .references(() => people.id),
    skill: mysqlEnum(SKILLS).notNull(),
    /** NULL: does not run out (only some skills, such as a weld qualification, do). */
    expiresAt: moment(),
  },
  (t) => [primaryKey({ columns: [t.personId, t.skill] })],
);

export const DEVICE_KINDS = ["wall", "post"] as const;

/** A paired display: a wall or a post. It holds a random credential; only its hash is kept here. */
export const devices = mysqlTable("devices", {
  id: id(),
  shopId: ref()
    .notNull()
    .references(() => shops.id),
  kind: mysqlEnum(DEVICE_KINDS).notNull(),
  name: varchar({ length: 60 }).notNull(),
  pairedBy: ref()
    .notNull()
    .references(() => people.id),
  pairedAt: moment().notNull(),
  /** NULL: still trusted. */
  revokedAt: moment(),
});

/** A display that asks to be paired: it shows a code, a foreman types it in. */
export const devicePairings = mysqlTable(
  "device_pairings",
  {
    id: id(),
    /** NULL until somebody of a shop confirms: the display does not know whose it is. */
    shopId: ref().references(() => shops.id),
    codeHash: char({ length: 64 }).notNull(),
    /** Hash of the secret in the asking display's cookie: only that display may collect the session. */
    claimHash: char({ length: 64 }).notNull(),
    createdAt: moment().notNull(),
    expiresAt: moment().notNull(),
    /** NULL until confirmed. */
    deviceId: ref().references(() => devices.id),
    /** NULL until the display has collected its session; a pairing is used once. */
    collectedAt: moment(),
  },
  (t) => [unique("pairings_code").on(t.codeHash), unique("pairings_claim").on(t.claimHash)],
);

/** Signed-in browsers and paired displays. The cookie holds a random id; here lies only its SHA-256. */
export const sessions = mysqlTable(
  "sessions",
  {
    idHash: char({ length: 64 }).primaryKey(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    /** NULL for a display's own session. */
    personId: ref().references(() => people.id),
    /** NULL in a browser that is not a paired device. */
    deviceId: ref().references(() => devices.id),
    createdAt: moment().notNull(),
    lastSeenAt: moment().notNull(),
    expiresAt: moment().notNull(),
    /** NULL: still good. Set at sign-out, at rotation and when somebody revokes it. */
    endedAt: moment(),
    userAgent: varchar({ length: 200 }).notNull().default(""),
    remember: boolean().notNull().default(false),
  },
  (t) => [index("sessions_person").on(t.personId)],
);

/** Failed sign-ins, counted per account whether or not the account exists, so that nothing is given away. */
export const signInFailures = mysqlTable(
  "sign_in_failures",
  { id: id(), accountHash: char({ length: 64 }).notNull(), at: moment().notNull() },
  // Counts the failures of one account in the last minutes.
  (t) => [index("failures_account").on(t.accountHash, t.at)],
);
