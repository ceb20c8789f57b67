import { sql } from "drizzle-orm";
import {
  check,
  index,
  int,
  mysqlEnum,
  mysqlTable,
  smallint,
  text,
  unique,
  varchar,
} from "drizzle-orm/mysql-core";
import { HOLD_KINDS, STAGE_KINDS, STAGE_STATES } from "../../domain/builds/stages";
import { VEHICLE_KINDS } from "../../domain/builds/vehicle-kinds";
import { BAY_KINDS } from "../../domain/floor/bays";
import { SKILLS } from "../../domain/people/roles";
import { asTyped, hours, id, lengthMm, moment, ref } from "./columns";
import { people } from "./people";
import { shops } from "./shop";

export const customers = mysqlTable(
  "customers",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    name: varchar({ length: 80 }).notNull(),
    /** Empty when not given. */
    phone: varchar({ length: 40 }).notNull().default(""),
    email: varchar({ length: 190 }).notNull().default(""),
    createdAt: moment().notNull(),
  },
  (t) => [index("customers_name").on(t.shopId, t.name)],
);

export const vehicles = mysqlTable(
  "vehicles",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    customerId: ref()
      .notNull()
      .references(() => customers.id),
    kind: mysqlEnum(VEHICLE_KINDS).notNull(),
    nickname: varchar({ length: 24 }).notNull(),
    lengthMm: lengthMm().notNull(),
    lengthTyped: asTyped().notNull(),
    widthMm: lengthMm().notNull(),
    widthTyped: asTyped().notNull(),
    createdAt: moment().notNull(),
  },
  (t) => [
    check("vehicles_length", sql`${t.lengthMm} between 500 and 30000`),
    check("vehicles_width", sql`${t.widthMm} between 300 and 5000`),
  ],
);

/** The label hung on a vehicle. A lost tag is replaced, not reused. */
export const tags = mysqlTable(
  "tags",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    vehicleId: ref()
      .notNull()
      .references(() => vehicles.id),
    code: varchar({ length: 8 }).notNull(),
    issuedAt: moment().notNull(),
    /** NULL: this tag hangs on the vehicle. */
    replacedAt: moment(),
  },
  (t) => [unique("tags_code").on(t.shopId, t.code)],
);

export const BUILD_STATES = ["here", "gone"] as const;

/** One vehicle's visit. */
export const builds = mysqlTable(
  "builds",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    vehicleId: ref()
      .notNull()
      .references(() => vehicles.id),
    state: mysqlEnum(BUILD_STATES).notNull().default("here"),
    /** What the customer asked for, in their words. */
    wanted: text().notNull(),
    /** Asked for at booking in; NULL when the customer did not say. Lengths as typed beside the value. */
    tyreTyped: varchar({ length: 40 }),
    loadedRadiusMm: lengthMm(),
    loadedRadiusTyped: asTyped(),
    tyreRadiusMm: lengthMm(),
    tyreRadiusTyped: asTyped(),
    tyreWidthMm: lengthMm(),
    tyreWidthTyped: asTyped(),
    wheelbaseMm: lengthMm(),
    wheelbaseTyped: asTyped(),
    /** Least approach angle asked for, in degrees. NULL: not asked for. */
    approachAskedDeg: smallint({ unsigned: true }),
    /** NULL: no promise given. */
    promisedAt: moment(),
    /** Estimate in cents. NULL: none written yet. */
    estimateCents: int({ unsigned: true }),
    bookedInBy: ref()
      .notNull()
      .references(() => people.id),
    bookedInAt: moment().notNull(),
    /** NULL while the vehicle is here. */
    leftAt: moment(),
  },
  (t) => [index("builds_here").on(t.shopId, t.state), index("builds_vehicle").on(t.vehicleId)],
);

export const stages = mysqlTable(
  "stages",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    buildId: ref()
      .notNull()
      .references(() => builds.id),
    position: smallint({ unsigned: true }).notNull(),
    kind: mysqlEnum(STAGE_KINDS).notNull(),
    hours: hours().notNull(),
    /** NULL: anyone may do it. */
    skill: mysqlEnum(SKILLS),
    heads: smallint({ unsigned: true }).notNull().default(1),
    /** NULL: not part of a stay. Stages of a build with the same letter are one unbroken stay. */
    stay: varchar({ length: 1 }),
    state: mysqlEnum(STAGE_STATES).notNull().default("open"),
    /** Pieces done of pieces to do, in the stage's own word (bolts, brackets). NULL: the stage is not counted. */
    piecesDone: smallint({ unsigned: true }),
    piecesOf: smallint({ unsigned: true }),
    piecesWord: varchar({ length: 20 }),
    startedAt: moment(),
    finishedAt: moment(),
  },
  (t) => [unique("stages_position").on(t.buildId, t.position)],
);

/** Which bays a stage may be done in. No row: any bay. */
export const stageBayKinds = mysqlTable(
  "stage_bay_kinds",
  {
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    stageId: ref()
      .notNull()
      .references(() => stages.id),
    kind: mysqlEnum(BAY_KINDS).notNull(),
  },
  (t) => [unique("stage_bay_kinds_once").on(t.stageId, t.kind)],
);

export const holds = mysqlTable(
  "holds",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    buildId: ref()
      .notNull()
      .references(() => builds.id),
    kind: mysqlEnum(HOLD_KINDS).notNull(),
    words: varchar({ length: 160 }).notNull(),
    /** When it should be over. NULL: nobody knows. */
    dueAt: moment(),
    placedBy: ref()
      .notNull()
      .references(() => people.id),
    placedAt: moment().notNull(),
    /** NULL: the hold stands. */
    liftedAt: moment(),
    liftedBy: ref().references(() => people.id),
  },
  // The standing holds of the vehicles on the floor.
  (t) => [index("holds_build").on(t.buildId, t.liftedAt)],
);
