import { tz } from "@date-fns/tz";
import { format } from "date-fns";

/** "Tue 3 Feb 2026, 19:40" in the reader's zone. */
export const writeMoment = (at: Date, zone: string): string => format(at, "EEE d MMM yyyy, HH:mm", { in: tz(zone) });

/** "Tue 3 Feb" */
export const writeDay = (at: Date, zone: string): string => format(at, "EEE d MMM", { in: tz(zone) });
