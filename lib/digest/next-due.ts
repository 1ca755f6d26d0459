import { TZDate } from "@date-fns/tz";
import { addDays, getISODay } from "date-fns";

export type DueRule = { weekday: number; hour: number; zone: string };

/** The first instant after `after` at which it is that hour of that weekday in that zone. */
export function nextDue(rule: DueRule, after: Date): Date {
  const here = new TZDate(after, rule.zone);
  const days = (rule.weekday - getISODay(here) + 7) % 7;
  for (const ahead of [days, days + 7]) {
    const day = addDays(here, ahead);
    const due = new Date(
      new TZDate(day.getFullYear(), day.getMonth(), day.getDate(), rule.hour, 0, 0, rule.zone).getTime(),
    );
    if (due > after) return due;
  }
  throw new RangeError("there is a due instant in every eight days");
}
