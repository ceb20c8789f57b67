import {
  boolean,
  char,
  index,
  int,
  json,
  mysqlEnum,
  mysqlTable,
  unique,
  varchar,
} from "drizzle-orm/mysql-core";
import { bays } from "./bays";
import { builds } from "./builds";
import { angleDeg, asTyped, id, lengthMm, moment, ref } from "./columns";
import { devices, people } from "./people";
import { shops } from "./shop";
import { hangerHoles, hangers, springs } from "./springs";

export const LAYOUT_KINDS = ["front-leaf"] as const;
export const FIXED_EYES = ["ahead", "behind"] as const;
export const AXLE_METHODS = ["square", "through-centres", "asked"] as const;
export const LEVEL_METHODS = ["heights", "gauge"] as const;
export const DROP_SIDES = ["left", "right", "centre"] as const;
export const DROP_METHODS = ["offset", "ties"] as const;

/** The guided measuring session of one end of one vehicle. */
export const layouts = mysqlTable(
  "layouts",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    buildId: ref()
      .notNull()
      .references(() => builds.id),
    kind: mysqlEnum(LAYOUT_KINDS).notNull(),
    fixedEye: mysqlEnum(FIXED_EYES).notNull(),
    /** The bay it is laid out in; the marks are that bay's. */
    bayId: ref()
      .notNull()
      .references(() => bays.id),
    hangerId: ref()
      .notNull()
      .references(() => hangers.id),
    startedBy: ref()
      .notNull()
      .references(() => people.id),
    startedAt: moment().notNull(),
    /** NULL until the caution about stands was acknowledged. Cleared never: a new level asks again by itself. */
    standsAt: moment(),
    standsBy: ref().references(() => people.id),
    /** A to B as taped; NULL until the marks were checked. */
    marksAt: moment(),
    marksBy: ref().references(() => people.id),
    marksTapedMm: lengthMm(),
    marksTapedTyped: asTyped(),
    /** NULL until chosen. `axleAsked*` only with the method `asked`. */
    axleMethod: mysqlEnum(AXLE_METHODS),
    axleAskedMm: lengthMm(),
    axleAskedTyped: asTyped(),
    axleAt: moment(),
    axleBy: ref().references(() => people.id),
    /** Counts the printed sheets: one more with every approval. */
    sheetRevision: int({ unsigned: true }).notNull().default(0),
  },
  (t) => [index("layouts_build").on(t.buildId)],
);

/** One round of levelling. Never edited: a new round is a new row. */
export const levelChecks = mysqlTable(
  "level_checks",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    /** The bay it was levelled in: drops of another bay lie in another floor frame and are never carried over. */
    bayId: ref()
      .notNull()
      .references(() => bays.id),
    method: mysqlEnum(LEVEL_METHODS).notNull(),
    noseHighDeg: angleDeg().notNull(),
    rightHighDeg: angleDeg().notNull(),
    twistMm: lengthMm(),
    twistDeg: angleDeg(),
    allowedDeg: angleDeg().notNull(),
    isTrue: boolean().notNull(),
    madeBy: ref()
      .notNull()
      .references(() => people.id),
    madeAt: moment().notNull(),
    /** NULL: not void. */
    voidedAt: moment(),
    voidedBy: ref().references(() => people.id),
    voidReason: varchar({ length: 160 }),
    /** The older level whose drops stand under this one too, since an old point was dropped again and fell within tolerance. NULL: none. */
    carriesId: ref(),
    /** How far the old point fell from where it was. NULL: not dropped again yet. */
    carryOffMm: lengthMm(),
  },
  (t) => [index("level_checks_layout").on(t.layoutId)],
);

/** A height at a stand (`stand`), or a gauge read both ways round at a place on the frame (`gauge`). */
export const levelReadings = mysqlTable(
  "level_readings",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    levelCheckId: ref()
      .notNull()
      .references(() => levelChecks.id),
    place: varchar({ length: 20 }).notNull(),
    /** Heights only; NULL with the gauge. */
    xMm: lengthMm(),
    yMm: lengthMm(),
    xTyped: asTyped(),
    yTyped: asTyped(),
    heightMm: lengthMm(),
    heightTyped: asTyped(),
    /** Gauge only; NULL with heights. */
    firstDeg: angleDeg(),
    turnedDeg: angleDeg(),
  },
  (t) => [unique("level_readings_place").on(t.levelCheckId, t.place)],
);

/** A point carried to the floor. Its place is that of its newest reading that was not superseded. */
export const drops = mysqlTable(
  "drops",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    point: varchar({ length: 24 }).notNull(),
    side: mysqlEnum(DROP_SIDES).notNull(),
  },
  (t) => [unique("drops_point").on(t.layoutId, t.point, t.side)],
);

export const dropReadings = mysqlTable(
  "drop_readings",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    dropId: ref()
      .notNull()
      .references(() => drops.id),
    /** The level that stood when it was taken. */
    levelCheckId: ref()
      .notNull()
      .references(() => levelChecks.id),
    /** Made by the tablet; the same reading sent twice counts once. */
    clientKey: char({ length: 36 }).notNull(),
    method: mysqlEnum(DROP_METHODS).notNull(),
    /** Offsets only; NULL with ties. */
    stationTyped: asTyped(),
    offsetTyped: asTyped(),
    /** Where it fell, in the floor frame. */
    xMm: lengthMm().notNull(),
    yMm: lengthMm().notNull(),
    /** Height above the floor at ride; NULL where it was not asked for. */
    heightMm: lengthMm(),
    heightTyped: asTyped(),
    /** Ties only, and only with a spare tape: the tapes do not meet. */
    suspect: boolean().notNull().default(false),
    /** Two tapes: nothing checks it. Offsets count as checked by their pair. */
    checked: boolean().notNull().default(true),
    /** Why it was taken again; NULL for a first reading. */
    reason: varchar({ length: 160 }),
    takenBy: ref()
      .notNull()
      .references(() => people.id),
    deviceId: ref().references(() => devices.id),
    takenAt: moment().notNull(),
    /** NULL: counts. Set when a newer reading takes its place; the row itself stays as it was. */
    supersededAt: moment(),
  },
  (t) => [
    unique("drop_readings_once").on(t.shopId, t.clientKey),
    // The reading that counts, of each drop.
    index("drop_readings_drop").on(t.dropId, t.supersededAt),
  ],
);

export const tieReadings = mysqlTable(
  "tie_readings",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    readingId: ref()
      .notNull()
      .references(() => dropReadings.id),
    mark: varchar({ length: 2 }).notNull(),
    distanceMm: lengthMm().notNull(),
    distanceTyped: asTyped().notNull(),
  },
  (t) => [unique("tie_readings_mark").on(t.readingId, t.mark)],
);

/** A spring in a hole that somebody put in hand, with the figures as they were then. */
export const choices = mysqlTable(
  "choices",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    springId: ref()
      .notNull()
      .references(() => springs.id),
    holeId: ref()
      .notNull()
      .references(() => hangerHoles.id),
    /** The spring sits end for end: its halves swap. */
    turned: boolean().notNull(),
    levelCheckId: ref()
      .notNull()
      .references(() => levelChecks.id),
    axleStationMm: lengthMm().notNull(),
    /** What was shown when it was chosen, whole, so that the record never depends on today's code. */
    figures: json().$type<Record<string, unknown>>().notNull(),
    chosenBy: ref()
      .notNull()
      .references(() => people.id),
    chosenAt: moment().notNull(),
    /** NULL: this is the one in hand. */
    droppedAt: moment(),
  },
  (t) => [index("choices_layout").on(t.layoutId)],
);

/** A signature under a choice. Void when a number under it changes; never deleted. */
export const approvals = mysqlTable(
  "approvals",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    choiceId: ref()
      .notNull()
      .references(() => choices.id),
    sheetRevision: int({ unsigned: true }).notNull(),
    approvedBy: ref()
      .notNull()
      .references(() => people.id),
    approvedAt: moment().notNull(),
    /** NULL: the approval stands. */
    voidedAt: moment(),
    voidReason: varchar({ length: 160 }),
  },
  (t) => [index("approvals_choice").on(t.choiceId)],
);
