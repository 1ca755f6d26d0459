import { TZDate } from "@date-fns/tz";
import { getISODay } from "date-fns";
import { localInstant } from "./local-instant";

/** Weekday as in ISO 8601: 1 is Monday, 7 is Sunday. */
export type DueRule = { weekday: number; hour: number; zone: string };

/** The first instant after `after` at which it is that hour of that weekday in that zone. */
export function nextDue(rule: DueRule, after: Date): Date {
  const here = new TZDate(after, rule.zone);
  const days = (rule.weekday - getISODay(here) + 7) % 7;
  for (const ahead of [days, days + 7]) {
    const local = {
      year: here.getFullYear(),
      month: here.getMonth() + 1,
      day: here.getDate() + ahead,
      hour: rule.hour,
    };
    const due = localInstant(local, rule.zone);
    if (due > after) return due;
  }
  throw new RangeError("there is a due instant in every eight days");
}
