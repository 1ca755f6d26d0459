import { tz } from "@date-fns/tz";
import { format } from "date-fns";

export type DateForm = "full" | "day" | "short" | "time";

/** Never ambiguous: the month is a word. "short" leaves the year out, for lists within one year. */
const FORMS: Record<DateForm, string> = {
  full: "EEE d MMM yyyy, HH:mm",
  day: "EEE d MMM yyyy",
  short: "EEE d MMM, HH:mm",
  time: "HH:mm",
};

export function writeDate(at: string | Date, zone: string, form: DateForm = "full"): string {
  const instant = new Date(at);
  return Number.isNaN(instant.getTime()) ? "unknown" : format(instant, FORMS[form], { in: tz(zone) });
}

export type DateTimeProps = {
  at: string | Date;
  /** IANA zone of the reader, e.g. "Europe/Berlin"; the same on server and client. */
  zone: string;
  form?: DateForm;
  className?: string;
};

export function DateTime({ at, zone, form = "full", className }: DateTimeProps) {
  const instant = new Date(at);
  const machine = Number.isNaN(instant.getTime()) ? undefined : instant.toISOString();
  const isShort = form === "short" || form === "time";
  return (
    <time dateTime={machine} title={isShort ? writeDate(at, zone) : undefined} className={className}>
      {writeDate(at, zone, form)}
    </time>
  );
}
