import { tzOffset } from "@date-fns/tz";

const MINUTE = 60_000;
const DAY = 86_400_000;

/** Month from 1 to 12; a day beyond the month's last runs on into the next month. */
export type LocalTime = { year: number; month: number; day: number; hour: number; minute?: number };

/**
 * The instant of a local time, as RFC 5545 section 3.3.5 has it: a time that comes twice is the first of the two, a time
 * that the clocks skip is counted with the offset before the gap. (Section 3.3.10 says in one paragraph that skipped times
 * are left out; a weekly mail that is left out would be a lost week, so 3.3.5 it is.)
 */
export function localInstant({ year, month, day, hour, minute = 0 }: LocalTime, zone: string): Date {
  const asIfUtc = Date.UTC(year, month - 1, day, hour, minute);
  const offsetAt = (instant: number) => tzOffset(zone, new Date(instant)) * MINUTE;
  const before = offsetAt(asIfUtc - DAY);
  const after = offsetAt(asIfUtc + DAY);
  const first = asIfUtc - before;
  if (offsetAt(first) === before) return new Date(first);
  const second = asIfUtc - after;
  return new Date(offsetAt(second) === after ? second : first);
}
