import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { saveConditionsInput } from "@/lib/plan-conditions/schema";
import type { PowerLineItem } from "@/lib/power/line-item";
import type { removePowerLineInput, savePowerLineInput } from "@/lib/power/schema";
import type { removeRailInput, saveRailInput } from "@/lib/rail/schema";

type Act<Schema extends z.ZodType, Value> = (input: z.input<Schema>) => Promise<Reply<Value>>;

/** What the power page can do; the page hands in its server actions. */
export type PowerActs = {
  saveConditions: Act<typeof saveConditionsInput, { version: number }>;
  saveRail: Act<typeof saveRailInput, { id: string; version: number }>;
  removeRail: Act<typeof removeRailInput, { name: string }>;
  saveLine: Act<typeof savePowerLineInput, { line: string; item: PowerLineItem }>;
  removeLine: Act<typeof removePowerLineInput, { what: string }>;
};
