import { TZDate } from "@date-fns/tz";
import { addDays, addHours, startOfDay } from "date-fns";

const OPENS = 7;
const CLOSES = 17;
const MINUTE = 60_000;

/** The moment so many minutes of open shop before another: nights are skipped, so that nobody measures at three. */
export function workingTimeBefore(moment: Date, minutes: number, zone: string): Date {
  let left = minutes * MINUTE;
  let end = moment.getTime();
  for (;;) {
    const day = startOfDay(new TZDate(end, zone));
    const opens = addHours(day, OPENS).getTime();
    end = Math.min(end, addHours(day, CLOSES).getTime());
    if (end - left >= opens) return new Date(end - left);
    left -= Math.max(0, end - opens);
    end = addHours(addDays(day, -1), CLOSES).getTime();
  }
}
