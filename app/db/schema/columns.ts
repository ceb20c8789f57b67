import { bigint, datetime, decimal, varchar } from "drizzle-orm/mysql-core";

/** Surrogate key. */
export const id = () => bigint({ mode: "number", unsigned: true }).autoincrement().primaryKey();

/** A reference to another row's id. */
export const ref = () => bigint({ mode: "number", unsigned: true });

/** A moment, in UTC, to the millisecond. */
export const moment = () => datetime({ mode: "date", fsp: 3 });

/** A length in millimetres. Six decimals hold 1/64 in (0.396875 mm) without loss. */
export const lengthMm = () => decimal({ mode: "number", precision: 14, scale: 6 });

/** An angle in degrees. */
export const angleDeg = () => decimal({ mode: "number", precision: 10, scale: 6 });

/** A length as the person typed it, kept beside the stored value. */
export const asTyped = () => varchar({ length: 40 });

/** Hours of work. */
export const hours = () => decimal({ mode: "number", precision: 6, scale: 2 });

/** Where a period that has not ended yet ends: later than any clock the shop will read. */
export const OPEN_END = new Date("9999-12-31T00:00:00.000Z");
