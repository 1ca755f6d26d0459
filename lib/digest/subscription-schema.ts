import { z } from "zod";
import { timeZone } from "@/lib/form/time-zone";
import { writeId } from "@/lib/form/write-id";

/** One's own digest of one project. Weekday as in ISO 8601: 1 is Monday, 7 is Sunday. */
export const updateSubscriptionInput = z.object({
  project: z.string(),
  writeId,
  enabled: z.boolean({ message: "Say whether the mail should come." }),
  weekday: z.coerce
    .number({ message: "Choose a day." })
    .int("Choose a day.")
    .min(1, "Choose a day.")
    .max(7, "Choose a day."),
  hour: z.coerce
    .number({ message: "Choose an hour." })
    .int("Choose an hour.")
    .min(0, "Choose an hour.")
    .max(23, "Choose an hour."),
  zone: timeZone,
  quietWeek: z.enum(["line", "nothing"], { message: "Choose what a quiet week brings." }),
});
export type UpdateSubscriptionInput = z.output<typeof updateSubscriptionInput>;
export type UpdateSubscriptionTyped = z.input<typeof updateSubscriptionInput>;
