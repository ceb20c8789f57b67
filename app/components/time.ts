/*
 * Moments in words. Everything takes the moment it counts from and the shop's time zone, so that the server's picture
 * and the browser's are the same.
 */

const MINUTE_MS = 60_000;

type Parts = { day: string; date: string; time: string; key: string };

const formats = new Map<string, Intl.DateTimeFormat>();
function formatIn(timeZone: string): Intl.DateTimeFormat {
  const known = formats.get(timeZone);
  if (known) return known;
  const format = new Intl.DateTimeFormat("en-GB", {
    timeZone,
    hourCycle: "h23",
    weekday: "short",
    day: "numeric",
    month: "short",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
  });
  formats.set(timeZone, format);
  return format;
}

function partsIn(at: string | Date, timeZone: string): Parts {
  const part: Partial<Record<Intl.DateTimeFormatPartTypes, string>> = {};
  for (const { type, value } of formatIn(timeZone).formatToParts(new Date(at))) part[type] = value;
  // "Sept" is four letters in British English; every other month is three.
  const month = (part.month ?? "").slice(0, 3);
  return {
    day: part.weekday ?? "",
    date: `${part.day} ${month}`,
    time: `${part.hour}:${part.minute}`,
    key: `${part.year} ${month} ${part.day}`,
  };
}

/**
 * A length of time in words: "under a minute", "44 min", "2 h 10", "1 day", "3 days". Whole units, rounded down; days from 24
 * hours on. A negative length counts as none.
 * @param ms milliseconds
 */
export function spanInWords(ms: number): string {
  const minutes = Math.floor(Math.max(0, ms) / MINUTE_MS);
  if (minutes < 1) return "under a minute";
  if (minutes < 60) return `${minutes} min`;
  if (minutes < 24 * 60) return `${Math.floor(minutes / 60)} h ${String(minutes % 60).padStart(2, "0")}`;
  const days = Math.floor(minutes / (24 * 60));
  return days === 1 ? "1 day" : `${days} days`;
}

/** How long ago that was, in words as `spanInWords`. */
export function ageInWords(at: string | Date, now: string | Date): string {
  return spanInWords(new Date(now).getTime() - new Date(at).getTime());
}

/** The time of day in the shop's zone: "15:30". */
export function clock(at: string | Date, timeZone: string): string {
  return partsIn(at, timeZone).time;
}

/** The day and the time of day in the shop's zone: "Wed 07:00". */
export function dayAndClock(at: string | Date, timeZone: string): string {
  const { day, time } = partsIn(at, timeZone);
  return `${day} ${time}`;
}

/** The day in the shop's zone: "Tue 1 Dec". */
export function dayAndDate(at: string | Date, timeZone: string): string {
  const { day, date } = partsIn(at, timeZone);
  return `${day} ${date}`;
}

/** Do two moments fall on one day in the shop's zone? */
export function sameDay(a: string | Date, b: string | Date, timeZone: string): boolean {
  return partsIn(a, timeZone).key === partsIn(b, timeZone).key;
}

/**
 * A moment in as few words as say it: "15:30" today, "Wed 07:00" within six days either way, "Tue 1 Dec 15:30" further
 * away.
 */
export function whenInWords(at: string | Date, now: string | Date, timeZone: string): string {
  const there = partsIn(at, timeZone);
  if (sameDay(at, now, timeZone)) return there.time;
  const away = Math.abs(new Date(at).getTime() - new Date(now).getTime());
  return away < 6 * 24 * 60 * MINUTE_MS
    ? `${there.day} ${there.time}`
    : `${there.day} ${there.date} ${there.time}`;
}
