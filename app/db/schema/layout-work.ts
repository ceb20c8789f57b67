import {
  boolean,
  char,
  index,
  int,
  json,
  mysqlEnum,
  mysqlTable,
  smallint,
  unique,
  varchar,
} from "drizzle-orm/mysql-core";
import { asTyped, id, lengthMm, moment, ref } from "./columns";
import { approvals, choices, dropReadings, drops, layouts, levelChecks } from "./layouts";
import { devices, people } from "./people";
import { shops } from "./shop";

/** A picture taken at a step. The file lies outside the web root under its own random name. */
export const layoutPhotos = mysqlTable(
  "layout_photos",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    step: varchar({ length: 16 }).notNull(),
    /** Name of the stored file, without ending. */
    file: char({ length: 36 }).notNull(),
    widthPx: int({ unsigned: true }).notNull(),
    heightPx: int({ unsigned: true }).notNull(),
    bytes: int({ unsigned: true }).notNull(),
    words: varchar({ length: 160 }).notNull().default(""),
    takenBy: ref()
      .notNull()
      .references(() => people.id),
    deviceId: ref().references(() => devices.id),
    takenAt: moment().notNull(),
    /** Made by the tablet; the same picture sent twice counts once. */
    clientKey: char({ length: 36 }).notNull(),
    /** NULL: shown. Set when it was taken down; row and file stay. */
    removedAt: moment(),
    removedBy: ref().references(() => people.id),
  },
  (t) => [
    unique("layout_photos_file").on(t.file),
    unique("layout_photos_once").on(t.shopId, t.clientKey),
    // The pictures of a layout's step, oldest first.
    index("layout_photos_step").on(t.layoutId, t.step),
  ],
);

/** Something somebody wrote down at a step. Never edited: a newer note stands under it. */
export const stepNotes = mysqlTable(
  "step_notes",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    step: varchar({ length: 16 }).notNull(),
    words: varchar({ length: 400 }).notNull(),
    writtenBy: ref()
      .notNull()
      .references(() => people.id),
    writtenAt: moment().notNull(),
  },
  (t) => [index("step_notes_layout").on(t.layoutId, t.step)],
);

/**
 * A second person's own reading of a point that weighs in the result, taken without seeing the first. It belongs to the
 * option in hand: another option may rest on other points.
 */
export const secondLooks = mysqlTable(
  "second_looks",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    choiceId: ref()
      .notNull()
      .references(() => choices.id),
    dropId: ref()
      .notNull()
      .references(() => drops.id),
    /** The reading it is held against. */
    againstId: ref()
      .notNull()
      .references(() => dropReadings.id),
    levelCheckId: ref()
      .notNull()
      .references(() => levelChecks.id),
    clientKey: char({ length: 36 }).notNull(),
    stationTyped: asTyped().notNull(),
    offsetTyped: asTyped().notNull(),
    xMm: lengthMm().notNull(),
    yMm: lengthMm().notNull(),
    /** How far from the first, and how far it might be: both uncertainties together, k = 2. */
    apartMm: lengthMm().notNull(),
    withinMm: lengthMm().notNull(),
    agrees: boolean().notNull(),
    takenBy: ref()
      .notNull()
      .references(() => people.id),
    deviceId: ref().references(() => devices.id),
    takenAt: moment().notNull(),
    /** NULL: counts. Set when a third reading decided, or the first was taken again. */
    supersededAt: moment(),
    /** Why; NULL while it counts. */
    supersededReason: varchar({ length: 160 }),
  },
  (t) => [
    unique("second_looks_once").on(t.shopId, t.clientKey),
    // The second look of the option in hand.
    index("second_looks_choice").on(t.choiceId, t.supersededAt),
  ],
);

/** The foreman lets a layout go on without a second look, and says why; the sheet prints it. */
export const secondLookWaivers = mysqlTable(
  "second_look_waivers",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    choiceId: ref()
      .notNull()
      .references(() => choices.id),
    reason: varchar({ length: 160 }).notNull(),
    waivedBy: ref()
      .notNull()
      .references(() => people.id),
    waivedAt: moment().notNull(),
  },
  (t) => [unique("second_look_waivers_choice").on(t.choiceId)],
);

/** The axle as it was tacked: both ends dropped again and held against what was approved. */
export const tackChecks = mysqlTable(
  "tack_checks",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    approvalId: ref()
      .notNull()
      .references(() => approvals.id),
    leftStationTyped: asTyped().notNull(),
    leftOffsetTyped: asTyped().notNull(),
    rightStationTyped: asTyped().notNull(),
    rightOffsetTyped: asTyped().notNull(),
    leftXMm: lengthMm().notNull(),
    leftYMm: lengthMm().notNull(),
    rightXMm: lengthMm().notNull(),
    rightYMm: lengthMm().notNull(),
    /** The tolerance of that day. */
    withinMm: lengthMm().notNull(),
    passes: boolean().notNull(),
    /** What was shown, whole: squareness, wheelbases, diagonals, what to move. */
    figures: json().$type<Record<string, unknown>>().notNull(),
    madeBy: ref()
      .notNull()
      .references(() => people.id),
    deviceId: ref().references(() => devices.id),
    madeAt: moment().notNull(),
    clientKey: char({ length: 36 }).notNull(),
  },
  (t) => [unique("tack_checks_once").on(t.shopId, t.clientKey), index("tack_checks_layout").on(t.layoutId)],
);

export const WORK_STEPS = ["weld", "finish"] as const;
export const WORK_STATES = ["pass", "fail"] as const;

/** A line of the weld, torque or finish list, as somebody signed it. Never edited: the newest of an item counts. */
export const workItems = mysqlTable(
  "work_items",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    layoutId: ref()
      .notNull()
      .references(() => layouts.id),
    step: mysqlEnum(WORK_STEPS).notNull(),
    /** Which line: a known item's id, or one that the shop added. */
    item: varchar({ length: 40 }).notNull(),
    state: mysqlEnum(WORK_STATES).notNull(),
    /** What was specified and what was read, as typed; empty where nothing is measured. */
    wantedTyped: varchar({ length: 40 }).notNull().default(""),
    readTyped: varchar({ length: 40 }).notNull().default(""),
    /** The tool or the welder's qualification. */
    tool: varchar({ length: 80 }).notNull().default(""),
    words: varchar({ length: 160 }).notNull().default(""),
    /** NULL: not to be done again. */
    dueAt: moment(),
    signedBy: ref()
      .notNull()
      .references(() => people.id),
    deviceId: ref().references(() => devices.id),
    signedAt: moment().notNull(),
    /** Order of lines signed in one go. */
    position: smallint({ unsigned: true }).notNull().default(0),
  },
  (t) => [index("work_items_layout").on(t.layoutId, t.step, t.item)],
);
