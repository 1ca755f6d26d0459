import { z } from "zod";

/** Whether this computer's time zone data knows the name. */
export function isTimeZone(value: string): boolean {
  try {
    return new Intl.DateTimeFormat("en-GB", { timeZone: value }).resolvedOptions().timeZone.length > 0;
  } catch {
    return false;
  }
}

export const timeZone = z
  .string({ message: "Choose a time zone." })
  .max(64, "This is no time zone. Choose one from the list.")
  .refine(isTimeZone, "This is no time zone. Choose one from the list.");
